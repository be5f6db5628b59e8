import type { Locale } from 'date-fns'

/**
 * What the sentence of the shift is put together from, in one language. `house` and `people` are
 * such phrases themselves, `since` a moment in words, figures are rounded already.
 */
export type HarmPhrases = {
  /** Names of days and months. */
  locale: Locale
  /** Figures as the language writes them. */
  digits: (text: string) => string
  people: (count: number) => string
  infant: string
  pregnant: string
  elderly: string
  ill: string
  yesterday: (clock: string) => string
  hours: (whole: number, minutes: string) => string
  dangerSign: (house: string) => string
  toldToGo: string
  notToldToGo: string
  unwell: (house: string, since: string) => string
  nothingSafe: (house: string, since: string) => string
  unsafe: (house: string, since: string) => string
  noWater: (house: string, since: string) => string
  untimed: (people: string, litresPerDay: string) => string
  /** `time` is null where the day's water does not come in a day. */
  flow: (figures: {
    people: string
    flow: string
    litresPerDay: string
    time: string | null
    enough: boolean
  }) => string
  unread: (people: string, since: string) => string
  silent: (people: string, since: string) => string
}
