import { normalQuantile, upperTail95 } from './quantile'

export { medianInterval, quantileInterval } from './measure-median'
export { survival, survivalQuantile, type LifeTime } from './measure-survival'

/**
 * Wilson's 95 % interval of a proportion, `count` of `n`. Unlike the school-book interval it stays
 * within 0 and 1 and says something for 0 of 20. Of nothing nothing is known: 0 to 1.
 */
export function wilson(count: number, n: number): { low: number; high: number } {
  if (!(count >= 0 && count <= n)) throw new RangeError('a count lies between 0 and n')
  if (n === 0) return { low: 0, high: 1 }
  const z = normalQuantile(upperTail95)
  const share = count / n
  const centre = share + (z * z) / (2 * n)
  const reach = z * Math.sqrt((share * (1 - share)) / n + (z * z) / (4 * n * n))
  const scale = 1 + (z * z) / n
  // The ends are exact where all or none counted, whatever rounding makes of them.
  return {
    low: count === 0 ? 0 : (centre - reach) / scale,
    high: count === n ? 1 : (centre + reach) / scale,
  }
}

/** A share with what it was counted from and its 95 % interval. `share` is null of nothing. */
export type Share = { count: number; n: number; share: number | null; low: number; high: number }

/** `count` of `n` as a share with its interval. */
export function shareOf(count: number, n: number): Share {
  return { count, n, share: n === 0 ? null : count / n, ...wilson(count, n) }
}

/** How a thing is known. The three are never added up: what is said flatters. */
export type Known = 'said' | 'measured' | 'seen'

export const knownKinds: readonly Known[] = ['said', 'measured', 'seen']
