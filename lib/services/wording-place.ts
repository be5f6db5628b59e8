import { isLanguage, type Language } from '@/lib/domain/language'
import { momentInfo, type MomentInfo } from '@/lib/domain/moments'

/** Where a wording stands, as an address names it. */
export type PlaceName = { moment: string; language: string }

export type Place = { info: MomentInfo; moment: MomentInfo['moment']; language: Language }

/** The place of that name, or null where there is no such moment or language. */
export function placeOf({ moment, language }: PlaceName): Place | null {
  const info = momentInfo(moment)
  if (!info || !isLanguage(language)) return null
  return { info, moment: info.moment, language }
}
