import { shareOf, type Share } from './measure'

/** What the ladder asks of a household's source. */
export type WaterSource = {
  kind: 'improved' | 'unimproved' | 'surface water'
  onPremises: boolean
  availableWhenNeeded: boolean
  freeOfContamination: boolean
  /** There, queue and back. */
  roundTripMinutes: number
}

export type ServiceLevel = 'safely managed' | 'basic' | 'limited' | 'unimproved' | 'surface water'

/**
 * The rung of the WHO/UNICEF (JMP) drinking-water ladder that a household's source stands on. It
 * asks about the source only: a filter at home moves nobody up, and is reported apart.
 */
export function serviceLevel(source: WaterSource): ServiceLevel {
  if (source.kind !== 'improved') return source.kind
  if (source.onPremises && source.availableWhenNeeded && source.freeOfContamination) {
    return 'safely managed'
  }
  return source.onPremises || source.roundTripMinutes <= 30 ? 'basic' : 'limited'
}

/** One targeted household; counts are colony-forming units of E. coli in 100 mL, null if untested. */
export type TargetedHouse = {
  sourceCount: number | null
  treats: boolean
  treatedCount: number | null
}

/**
 * Effective use (Lantagne and Clasen 2012): households whose source was contaminated and whose
 * treated water is below 1 CFU, of everybody targeted. Those who do not treat, and those nobody
 * tested, stay in the denominator.
 */
export function effectiveUse(targeted: readonly TargetedHouse[]): Share {
  const effective = targeted.filter(
    ({ sourceCount, treats, treatedCount }) =>
      treats &&
      sourceCount !== null &&
      sourceCount >= 1 &&
      treatedCount !== null &&
      treatedCount < 1,
  )
  return shareOf(effective.length, targeted.length)
}
