/*
 * CHECKS section 13: stock.
 * [C] read in a copy of the source · [D] by arithmetic.
 */
import poissonQuantile from '@stdlib/stats-base-dists-poisson-quantile'
import { describe, expect, it } from 'vitest'
import {
  demandAtMost,
  fillRate,
  orderUpTo,
  orderUpToForFill,
  orderUpToNormal,
} from '@/lib/domain/part'

describe('the Poisson order-up-to stock', () => {
  const means = [0.5, 1, 2, 3.5, 4, 6, 10, 24]

  // Smallest S with P(D ≤ S) ≥ chance [D]
  it.each([
    [0.9, [1, 2, 4, 6, 7, 9, 14, 30]],
    [0.95, [2, 3, 5, 7, 8, 10, 15, 32]],
    [0.99, [3, 4, 6, 8, 9, 12, 18, 36]],
  ])('for a chance of %d is the table’s', (chance, stocks) => {
    expect(means.map((mean) => orderUpTo({ mean, chance }))).toEqual(stocks)
  })

  // Oracle: @stdlib/stats-base-dists-poisson-quantile
  it('agrees with another library over the range a depot sees', () => {
    for (let mean = 0.1; mean < 40; mean += 0.37) {
      for (const chance of [0.5, 0.8, 0.9, 0.95, 0.98, 0.99, 0.999]) {
        expect(orderUpTo({ mean, chance })).toBe(poissonQuantile(chance, mean) + 0) // its 0 may be -0
      }
    }
  })
})

// Worked example of a mean of 6: 1.5 a day over 4 days [C statement, D]
describe('two meanings of 90 %', () => {
  it('eight are not enough for either', () => {
    expect(demandAtMost({ mean: 6, upTo: 8 })).toBeCloseTo(0.847237, 6)
  })

  it('in-stock nine times in ten needs nine', () => {
    expect(orderUpTo({ mean: 6, chance: 0.9 })).toBe(9)
  })

  it('nine tenths of the demands met from the shelf needs ten', () => {
    expect(orderUpToForFill({ mean: 6, share: 0.9 })).toBe(10)
    expect(fillRate({ mean: 6, stock: 9 })).toBeLessThan(0.9)
    expect(fillRate({ mean: 6, stock: 10 })).toBeGreaterThanOrEqual(0.9)
  })
})

// Periodic review: every 7 days, lead 3 days, N(20, 4) a day, 98 % [C statement, D]
describe('the steady demand of a large depot', () => {
  it('reviewed weekly orders up to 225.98', () => {
    const stock = orderUpToNormal({
      dailyMean: 20,
      dailyDeviation: 4,
      days: 7 + 3,
      chance: 0.98,
    })
    expect(stock).toBeCloseTo(225.98, 2)
  })
})
