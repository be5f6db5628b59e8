import { format } from 'date-fns'
import { TZDate } from '@date-fns/tz'
import { daysBetween } from './day'
import { bnHarmPhrases } from './harm-phrases/bn'
import { enHarmPhrases } from './harm-phrases/en'
import { esHarmPhrases } from './harm-phrases/es'
import { frHarmPhrases } from './harm-phrases/fr'
import type { HarmPhrases } from './harm-phrases/phrases'
import type { Language } from './language'
import type { House } from './need'
import { localDay } from './round-window'

/** The phrases of the shift's sentence in each language that staff may have. */
export const harmPhrases: Record<Language, HarmPhrases> = {
  en: enHarmPhrases,
  es: esHarmPhrases,
  fr: frHarmPhrases,
  bn: bnHarmPhrases,
}

/** "6 people, an infant": who is in the house, the vulnerable named. */
export function houseInWords(house: House, language: Language = 'en'): string {
  const phrases = harmPhrases[language]
  const vulnerable = [
    house.infant && phrases.infant,
    house.pregnant && phrases.pregnant,
    house.elderly && phrases.elderly,
    house.ill && phrases.ill,
  ].filter((words) => words !== false)
  return [peopleInWords(house.people, language), ...vulnerable].join(', ')
}

export function peopleInWords(people: number, language: Language = 'en'): string {
  return harmPhrases[language].people(people)
}

/**
 * A past moment as the shift says it, on the area's own clock: "07:40" today, "yesterday 18:20",
 * "Friday 18:20" within the week, "3 March" before that.
 */
export function sinceInWords(
  at: number,
  { now, timeZone, language = 'en' }: { now: number; timeZone: string; language?: Language },
): string {
  const { locale, yesterday } = harmPhrases[language]
  const local = new TZDate(at, timeZone)
  const days = daysBetween(localDay(at, timeZone), localDay(now, timeZone))
  const clock = format(local, 'HH:mm')
  if (days <= 0) return clock
  if (days === 1) return yesterday(clock)
  return format(local, days < 7 ? 'EEEE HH:mm' : 'd MMMM', { locale })
}

/** "8 h 05"; whole minutes, rounded. */
export function hoursInWords(hours: number, language: Language = 'en'): string {
  const minutes = Math.round(hours * 60)
  return harmPhrases[language].hours(
    Math.floor(minutes / 60),
    String(minutes % 60).padStart(2, '0'),
  )
}
