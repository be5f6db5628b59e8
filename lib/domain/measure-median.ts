import { upperTail95 } from './quantile'

/** A quantile of a sample; an end of the interval is null where the sample is too small for it. */
export type Spread = { n: number; value: number; low: number | null; high: number | null }

/**
 * A quantile of the values with a 95 % interval by order statistics, which asks nothing of their
 * shape. Null for no values.
 */
export function quantileInterval(values: readonly number[], chance: number): Spread | null {
  if (!(chance > 0 && chance < 1)) throw new RangeError('a chance lies between 0 and 1')
  const sorted = [...values].sort((one, other) => one - other)
  const n = sorted.length
  if (n === 0) return null
  const tail = 1 - upperTail95
  let low: number | null = null
  let high: number | null = null
  // Chance that fewer than `rank` of the values lie under the quantile, rank by rank (binomial).
  let logTerm = n * Math.log(1 - chance)
  let fewer = 0
  for (const [under, value] of sorted.entries()) {
    if (under > 0) logTerm += Math.log(((n - under + 1) / under) * (chance / (1 - chance)))
    fewer += Math.exp(logTerm)
    if (fewer <= tail) low = value
    if (high === null && 1 - fewer <= tail) high = value
  }
  return { n, value: valueAt(sorted, chance), low, high }
}

/** The quantile as most programs give it: linear between the two nearest values. */
function valueAt(sorted: readonly number[], chance: number): number {
  const place = (sorted.length - 1) * chance
  const [below = NaN, above = below] = sorted.slice(Math.floor(place), Math.floor(place) + 2)
  return below + (place - Math.floor(place)) * (above - below)
}

/** The median with its 95 % interval. Null for no values. */
export function medianInterval(values: readonly number[]): Spread | null {
  return quantileInterval(values, 0.5)
}
