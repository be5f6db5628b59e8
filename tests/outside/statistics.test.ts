/*
 * CHECKS section 12: intervals and survival.
 * [M] from memory of a published source · [D] by arithmetic.
 */
import { jStat } from 'jstat'
import { describe, expect, it } from 'vitest'
import { survival, survivalQuantile, wilson, type LifeTime } from '@/lib/domain/measure'
import { normalQuantile, studentQuantile } from '@/lib/domain/quantile'

describe('Wilson’s interval', () => {
  // Newcombe 1998, Statistics in Medicine 17:857, method 3 [M], ±1e-4
  it.each([
    [81, 263, 0.2553, 0.3662],
    [15, 148, 0.0624, 0.1605],
    [0, 20, 0, 0.1611],
    [1, 29, 0.0061, 0.1718],
    // 107 of 452 worked out [D]
    [107, 452, 0.1999, 0.278],
  ])('of %d in %d is %d to %d', (count, n, low, high) => {
    const found = wilson(count, n)
    expect(Math.abs(found.low - low)).toBeLessThanOrEqual(1e-4)
    expect(Math.abs(found.high - high)).toBeLessThanOrEqual(1e-4)
  })
})

const followed = (failed: readonly number[], lost: readonly number[]): LifeTime[] => [
  ...failed.map((days) => ({ days, failed: true })),
  ...lost.map((days) => ({ days, failed: false })),
]

describe('Kaplan and Meier', () => {
  // Freireich et al. 1963, Blood 21:699, the 6-mercaptopurine arm, weeks [M], ±1e-4
  it('on the remissions of 1963', () => {
    const steps = survival(
      followed([6, 6, 6, 7, 10, 13, 16, 22, 23], [6, 9, 10, 11, 17, 19, 20, 25, 32, 32, 34, 35]),
    )
    const expected = [
      [6, 0.8571],
      [7, 0.8067],
      [10, 0.7529],
      [13, 0.6902],
      [16, 0.6275],
      [22, 0.5378],
      [23, 0.4482],
    ]
    expect(steps.map(({ days }) => days)).toEqual(expected.map(([days]) => days))
    for (const [index, [, share]] of expected.entries()) {
      expect(Math.abs((steps[index]?.survival ?? 0) - (share ?? 1))).toBeLessThanOrEqual(1e-4)
    }
    expect(steps.map(({ atRisk }) => atRisk)).toEqual([21, 17, 15, 12, 11, 7, 6])
    expect(survivalQuantile(steps, 0.5).days).toBe(23)
  })

  // The maintained arm of the data set `aml` of R's survival package [M], ±1e-4
  it('on the leukaemia set that every textbook has', () => {
    const steps = survival(followed([9, 13, 18, 23, 31, 34, 48], [13, 28, 45, 161]))
    const expected = [0.9091, 0.8182, 0.7159, 0.6136, 0.4909, 0.3682, 0.1841]
    expect(steps.map(({ days }) => days)).toEqual([9, 13, 18, 23, 31, 34, 48])
    for (const [index, share] of expected.entries()) {
      expect(Math.abs((steps[index]?.survival ?? 0) - share)).toBeLessThanOrEqual(1e-4)
    }
    expect(survivalQuantile(steps, 0.5).days).toBe(31)
  })
})

describe('the quantiles', () => {
  // Oracle: jstat 1.9.6
  it('of the normal agree with another library', () => {
    for (let chance = 0.001; chance < 1; chance += 0.001) {
      expect(normalQuantile(chance)).toBeCloseTo(jStat.normal.inv(chance, 0, 1), 6)
    }
    expect(normalQuantile(0.975)).toBeCloseTo(1.959963985, 9)
    for (const chance of [1e-6, 1e-9, 1 - 1e-9]) {
      expect(normalQuantile(chance)).toBeCloseTo(jStat.normal.inv(chance, 0, 1), 6)
    }
    // Far tail, where jstat's own integral has no digits left: R, qnorm(1e-15) [M]
    expect(normalQuantile(1e-15)).toBeCloseTo(-7.941345, 6)
  })

  it('of Student agree with another library', () => {
    for (const chance of [0.75, 0.9, 0.975, 0.995]) {
      for (const freedom of [1, 2, 3, 4, 5, 6, 7, 10, 11, 30, 31, 120]) {
        const expected = jStat.studentt.inv(chance, freedom)
        expect(studentQuantile(chance, freedom) / expected).toBeCloseTo(1, 6)
      }
    }
  })
})
