import type { OddsOrigin } from './walk-history'

/** Where the odds of a walk began, as staff read it; null is the catalogue. */
export function originWords(origin: OddsOrigin | null): string {
  if (origin === null) return 'The odds began from the catalogue.'
  const { area, season, tickets, priorTickets } = origin
  const closed = `${tickets} closed ${tickets === 1 ? 'ticket' : 'tickets'}`
  return `The odds began from ${closed} of ${area} in ${season} months, the catalogue weighing ${priorTickets}.`
}

/** A chance as staff read it: `5 in 10`, `1 in 20`, `1 in 50`. */
export function oddsInWords(chance: number): string {
  if (chance >= 0.95) return 'almost sure'
  if (chance >= 0.075) return `${Math.round(chance * 10)} in 10`
  return chance >= 0.035 ? '1 in 20' : '1 in 50'
}
