import { monthOf } from './day'
import { countCauses, oddsFromHistory } from './walk-odds'
import { defaultPriors, suspectIds, type Odds, type SuspectId } from './walk-suspects'

/** What a coordinator may set about the odds that walks start from. */
export type WalkSettings = {
  /** Whether the causes of closed tickets are counted, or the catalogue's odds stand alone. */
  fromClosedTickets: boolean
  /** How many closed tickets the catalogue's odds weigh. */
  priorTickets: number
}

/** Off until the coordinator looks at the counts. The weight: common practice, no source. */
export const walkDefaults: WalkSettings = { fromClosedTickets: false, priorTickets: 20 }

/** Tickets that are closed as flowing count for so long, in days. */
export const historyDays = 365

export type Season = 'wet' | 'dry'

/** The season of a day in an area. */
export function seasonOf(day: string, wetMonths: readonly number[]): Season {
  return wetMonths.includes(monthOf(day)) ? 'wet' : 'dry'
}

/** Troubles whose walk starts from counted odds. */
export type CountedTrouble = keyof typeof defaultPriors

export const countedTroubles = Object.keys(defaultPriors) as readonly CountedTrouble[]

/** How many tickets were closed with a cause. */
export type CauseCount = { cause: string; tickets: number }

/** Where the odds of a walk began, as it was then: counted tickets beside the catalogue's weight. */
export type OddsOrigin = { area: string; season: Season; tickets: number; priorTickets: number }

/** The odds that the counted causes give, with how many tickets told of one; null where none did. */
export function countedOdds(
  counted: readonly CauseCount[],
  { trouble, priorTickets }: { trouble: CountedTrouble; priorTickets: number },
): { odds: Odds; tickets: number } | null {
  const counts = countCauses(counted)
  const tickets = suspectIds.reduce((sum, id) => sum + (counts[id] ?? 0), 0)
  if (tickets === 0) return null
  return { odds: oddsFromHistory(counts, defaultPriors[trouble], priorTickets), tickets }
}

/** The suspects by their odds, likeliest first. */
export function byOdds(odds: Odds): SuspectId[] {
  return [...suspectIds].sort((one, other) => odds[other] - odds[one])
}
