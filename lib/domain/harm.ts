import { harmPhrases, houseInWords, hoursInWords, peopleInWords, sinceInWords } from './harm-words'
import type { HarmPhrases } from './harm-phrases/phrases'
import type { Language } from './language'
import type { House } from './need'
import type { Trouble } from './trouble'

/**
 * 1 is worst: 1 unwell with a danger sign · 2 unwell · 3 no safe water, with someone vulnerable ·
 * 4 no safe water · 5 unsafe filter still in use · 6 no water at all · 7 slow below need ·
 * 8 slow above need · 9 unread words · 10 silent.
 */
export type HarmClass = 1 | 2 | 3 | 4 | 5 | 6 | 7 | 8 | 9 | 10

export type Band = 'Unwell' | 'No safe water' | 'Slow' | 'Unread words' | 'Silent'

/** Times are epoch milliseconds; flows L/h at 20 °C and full head. */
export type HarmInput = {
  trouble: Trouble
  house: House
  outOfService: boolean
  noSafeWaterSince: number | null
  /** What the last flow gives this house; null while nobody has timed it. */
  need: 'enough' | 'slow' | 'short' | null
  litresPerHour: number | null
  errorLitresPerHour?: number | null
  litresPerDay: number
  /** Hours the filter takes for the day's need. */
  hours: number | null
  openedAt: number
  now: number
  timeZone: string
  /** The unwell were told to go to the health worker. */
  toldToGo?: boolean
  /** Of the person who reads the sentence. */
  language?: Language
}

export type Harm = {
  harmClass: HarmClass
  band: Band
  /** People times hours since the last safe water, or since the ticket opened. */
  personHours: number
  sentence: string
  sinceAt: number
}

const bands: Record<HarmClass, Band> = {
  1: 'Unwell',
  2: 'Unwell',
  3: 'No safe water',
  4: 'No safe water',
  5: 'No safe water',
  6: 'No safe water',
  7: 'Slow',
  8: 'Slow',
  9: 'Unread words',
  10: 'Silent',
}

/** Where a ticket stands in the shift, and the sentence that explains it. */
export function harmOf(input: HarmInput): Harm {
  const harmClass = classOf(input)
  const sinceAt = input.noSafeWaterSince ?? input.openedAt
  const hours = Math.max(0, input.now - sinceAt) / 3_600_000
  return {
    harmClass,
    band: bands[harmClass],
    personHours: input.house.people * hours,
    sentence: sentenceOf(input, { harmClass, sinceAt }),
    sinceAt,
  }
}

/** Order of the shift: class first, never traded; then the most person-hours. */
export function compareHarm(
  a: Pick<Harm, 'harmClass' | 'personHours'>,
  b: Pick<Harm, 'harmClass' | 'personHours'>,
): number {
  return a.harmClass - b.harmClass || b.personHours - a.personHours
}

function classOf({ trouble, house, outOfService, need }: HarmInput): HarmClass {
  if (trouble === 'danger sign') return 1
  if (trouble === 'unwell') return 2
  const isVulnerable = house.infant || house.pregnant || house.elderly || house.ill
  if (outOfService) return isVulnerable ? 3 : 4
  if (trouble === 'unsafe') return 5
  if (trouble === 'no flow') return 6
  // Until somebody has timed a litre the worse is assumed.
  if (trouble === 'slow') return need === 'enough' ? 8 : 7
  return trouble === 'unread' ? 9 : 10
}

function sentenceOf(
  input: HarmInput,
  { harmClass, sinceAt }: { harmClass: HarmClass; sinceAt: number },
): string {
  const phrases = harmPhrases[input.language ?? 'en']
  return phrases.digits(phrased(input, { phrases, harmClass, sinceAt }))
}

function phrased(
  input: HarmInput,
  { phrases, harmClass, sinceAt }: { phrases: HarmPhrases; harmClass: HarmClass; sinceAt: number },
): string {
  const { toldToGo, language } = input
  const house = houseInWords(input.house, language)
  const people = peopleInWords(input.house.people, language)
  const since = sinceInWords(sinceAt, input)
  const opened = sinceInWords(input.openedAt, input)
  switch (harmClass) {
    case 1:
      return `${phrases.dangerSign(house)} ${toldToGo ? phrases.toldToGo : phrases.notToldToGo}`
    case 2:
      return phrases.unwell(house, opened)
    case 3:
    case 4:
      return phrases.nothingSafe(house, since)
    case 5:
      return phrases.unsafe(house, since)
    case 6:
      return phrases.noWater(house, since)
    case 7:
    case 8:
      return flowInWords(input, people)
    case 9:
      return phrases.unread(people, opened)
    case 10:
      return phrases.silent(people, opened)
  }
}

/** "4.6 L an hour at 20 °C, needs 37 L a day: 8 h 05." */
function flowInWords(input: HarmInput, people: string): string {
  const { litresPerHour, errorLitresPerHour, hours, need, language = 'en' } = input
  const phrases = harmPhrases[language]
  const litresPerDay = String(Math.round(input.litresPerDay))
  if (litresPerHour === null || hours === null) return phrases.untimed(people, litresPerDay)
  const error = errorLitresPerHour ? ` ± ${errorLitresPerHour.toFixed(1)}` : ''
  return phrases.flow({
    people,
    flow: `${litresPerHour.toFixed(1)}${error}`,
    litresPerDay,
    time: hours > 24 ? null : hoursInWords(hours, language),
    enough: need === 'enough',
  })
}
