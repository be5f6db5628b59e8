import { flowDefaults, flowErrorShare, type FlowSettings } from './flow-settings'
import { waterViscosity } from './flow-water'

export { flowDefaults, flowErrorShare, type FlowSettings } from './flow-settings'
export { shortOn, trend, type Forecast, type Reading } from './flow-trend'
export { waterDensity, waterViscosity } from './flow-water'

/** A bottle-fill time as litres per hour, as read. No time or no litres is no flow: 0. */
export function litresPerHour({ litres, seconds }: { litres: number; seconds: number }): number {
  return litres > 0 && seconds > 0 ? (litres / seconds) * 3600 : 0
}

/** Water runs thinner when warm; flows are compared as if all were read at this temperature. */
export const referenceCelsius = 20

/** A flow that is wanted of water at `celsius`, in L/h, as the filter would give it at 20 °C. */
export function asAtReference(litresPerHour: number, celsius: number): number {
  return (litresPerHour * waterViscosity(celsius)) / waterViscosity(referenceCelsius)
}

/**
 * A bottle-fill time as litres per hour at 20 °C and full head. `headRatio` is the water's height
 * in the container over its height when full (0 to 1). Darcy: flow goes with head over viscosity.
 */
export function normalisedFlow({
  litres,
  seconds,
  celsius,
  headRatio,
}: {
  litres: number
  seconds: number
  celsius: number
  headRatio: number
}): number {
  if (!(headRatio > 0)) throw new RangeError('head ratio must be above 0')
  return asAtReference(litresPerHour({ litres, seconds }), celsius) / headRatio
}

export type RecoveryKind = 'restored' | 'partly' | 'not' | 'too-fast' | 'ask-again'

export type Recovery = {
  kind: RecoveryKind
  share: number
  lowShare: number
  highShare: number
  against: 'first reading' | 'nominal'
  /** The line it was judged by, kept so that a later setting judges it no other way. */
  partlyShare?: number
}

/**
 * How much of a filter's first flow is back, all flows in L/h normalised. Without a first reading
 * the kit model's nominal flow stands in, and `against` says so. A quotient of two readings errs by
 * both; the nominal is taken as exact, which is one reason to want a first reading.
 */
export function recovery({
  flow,
  first,
  nominal,
  settings = flowDefaults,
}: {
  flow: number
  first?: number | null
  nominal: number
  settings?: FlowSettings
}): Recovery {
  const hasFirst = typeof first === 'number' && first > 0
  const reference = hasFirst ? first : nominal
  if (!(reference > 0)) throw new RangeError('nothing to set the flow against')
  const share = flow / reference
  const readingError = flowErrorShare(settings)
  const error = hasFirst ? Math.hypot(readingError, readingError) : readingError
  return {
    kind: verdictOf(share, settings),
    share,
    lowShare: share * (1 - error),
    highShare: share * (1 + error),
    against: hasFirst ? 'first reading' : 'nominal',
    partlyShare: settings.partlyShare,
  }
}

function verdictOf(share: number, settings: FlowSettings): RecoveryKind {
  if (share > settings.tooFastShare) return 'too-fast'
  if (share >= settings.restoredShare) return 'restored'
  return share >= settings.partlyShare ? 'partly' : 'not'
}

/** The share under which a wash had not worked when this reading was judged. */
export function partlyLine({ partlyShare = flowDefaults.partlyShare }: Recovery): number {
  return partlyShare
}

/**
 * Whether a stage is past washing, from its washes in order. Two in a row that did not bring the
 * flow back, with both error bars wholly below the line: spent, whatever its age. If a bar
 * straddles the line the readings cannot tell: ask again. The line is that of each reading's own day,
 * unless `settings` gives another.
 */
export function isSpent(
  results: readonly Recovery[],
  settings?: Pick<FlowSettings, 'partlyShare'>,
): 'spent' | 'ask again' | 'no' {
  const lastTwo = results.slice(-2)
  if (lastTwo.length < 2 || lastTwo.some(({ kind }) => kind !== 'not')) return 'no'
  const lineOf = (result: Recovery) => settings?.partlyShare ?? partlyLine(result)
  return lastTwo.every((result) => result.highShare < lineOf(result)) ? 'spent' : 'ask again'
}
