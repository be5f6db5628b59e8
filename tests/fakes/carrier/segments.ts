// The oracle here, because the product counts with another package.
import { split } from 'split-sms'

/** Parts the text needs on the air (GSM-7 160/153, UCS-2 70/67); at least one, as an empty text with media costs one. */
export function countSegments(text: string): number {
  return Math.max(1, split(text).parts.length)
}
