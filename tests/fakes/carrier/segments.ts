import { createRequire } from 'node:module'

// split-sms ships no types. It is the oracle here because the product counts with another package.
type SplitSms = { split(text: string): { parts: unknown[] } }
const splitSms = createRequire(import.meta.url)('split-sms') as SplitSms

/** Parts the text needs on the air (GSM-7 160/153, UCS-2 70/67); at least one, as an empty text with media costs one. */
export function countSegments(text: string): number {
  return Math.max(1, splitSms.split(text).parts.length)
}
