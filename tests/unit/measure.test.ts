import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  medianInterval,
  quantileInterval,
  shareOf,
  survival,
  survivalQuantile,
  wilson,
} from '@/lib/domain/measure'

describe('the interval of a share', () => {
  it('lies within 0 and 1 and around the share', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 500 }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (n, part) => {
          const count = Math.round(n * part)
          const { low, high } = wilson(count, n)
          expect(low).toBeGreaterThanOrEqual(0)
          expect(high).toBeLessThanOrEqual(1)
          expect(low).toBeLessThanOrEqual(count / n)
          expect(high).toBeGreaterThanOrEqual(count / n)
          const mirrored = wilson(n - count, n)
          expect(mirrored.low).toBeCloseTo(1 - high, 12)
        },
      ),
      { seed: 5 },
    )
  })

  it('says nothing of nothing', () => {
    expect(shareOf(0, 0)).toEqual({ count: 0, n: 0, share: null, low: 0, high: 1 })
  })

  it('refuses a count outside its n', () => {
    expect(() => wilson(5, 4)).toThrow(RangeError)
    expect(() => wilson(-1, 4)).toThrow(RangeError)
    expect(() => wilson(NaN, 4)).toThrow(RangeError)
  })
})

describe('the median with its interval', () => {
  const upTo = (n: number) => Array.from({ length: n }, (_, index) => index + 1)

  it('goes by order statistics', () => {
    // Chance outside ranks 2 and 9 of 10: 2·(1 + 10)/1024 = 2.1 %; ranks 3 and 8 leave 10.9 %.
    expect(medianInterval(upTo(10))).toEqual({ n: 10, value: 5.5, low: 2, high: 9 })
    expect(medianInterval(upTo(6))).toEqual({ n: 6, value: 3.5, low: 1, high: 6 })
    expect(medianInterval([3, 1, 2].map((value) => value * 10))?.value).toBe(20)
  })

  it('has no ends where the sample is too small', () => {
    expect(medianInterval(upTo(5))).toEqual({ n: 5, value: 3, low: null, high: null })
    expect(medianInterval([])).toBeNull()
    expect(quantileInterval(upTo(10), 0.9)).toMatchObject({ value: 9.1, high: null })
  })

  it('holds for thousands of values', () => {
    const { low, high } = medianInterval(upTo(4001)) ?? {}
    expect(low).toBeGreaterThan(2001 - 70)
    expect(high).toBeLessThan(2001 + 70)
    expect(low).toBeLessThan(2001 - 55)
  })

  it('covers the true median about 95 times in a hundred', () => {
    let seed = 7
    const random = () => (seed = (seed * 48_271) % 2_147_483_647) / 2_147_483_647
    let covered = 0
    for (let round = 0; round < 2000; round += 1) {
      const interval = medianInterval(Array.from({ length: 25 }, random))
      if ((interval?.low ?? 0) <= 0.5 && (interval?.high ?? 1) >= 0.5) covered += 1
    }
    expect(covered / 2000).toBeGreaterThan(0.94)
    expect(covered / 2000).toBeLessThan(0.975)
  })

  it('refuses what is no chance', () => {
    expect(() => quantileInterval([1], 1)).toThrow(RangeError)
  })
})

describe('survival', () => {
  it('without censoring is the share still standing', () => {
    const steps = survival([1, 2, 3, 4].map((days) => ({ days, failed: true })))
    expect(steps.map((step) => step.survival)).toEqual([0.75, 0.5, 0.25, 0])
    expect(steps.map((step) => step.atRisk)).toEqual([4, 3, 2, 1])
  })

  it('falls only at failures, and keeps the lost up to the day they were lost', () => {
    const lost = { days: 2, failed: false }
    expect(survival([lost, lost])).toEqual([])
    expect(survival([])).toEqual([])
    const steps = survival([lost, { days: 2, failed: true }, { days: 3, failed: true }])
    expect(steps.map(({ days, atRisk }) => [days, atRisk])).toEqual([
      [2, 3],
      [3, 1],
    ])
  })

  it('has a band that narrows with numbers and never leaves 0 to 1', () => {
    const group = [
      { days: 5, failed: true },
      { days: 9, failed: false },
      { days: 12, failed: true },
    ]
    const small = survival(group)[0]
    const large = survival(Array.from({ length: 50 }, () => group).flat())[0]
    expect(large?.survival).toBeCloseTo(small?.survival ?? 0, 12)
    expect((large?.high ?? 1) - (large?.low ?? 0)).toBeLessThan(
      (small?.high ?? 0) - (small?.low ?? 1),
    )
    const end = survival(group).at(-1)
    expect(end).toMatchObject({ survival: 0, low: 0 })
    expect(end?.high).toBe(small?.high)
  })

  it('gives the day by which a share has failed, or none', () => {
    const steps = survival([1, 2, 3, 4].map((days) => ({ days, failed: true })))
    expect(survivalQuantile(steps, 0.5).days).toBe(2)
    expect(survivalQuantile(steps, 0.9).days).toBe(4)
    expect(survivalQuantile(steps, 0.5).low).toBe(1)
    expect(survivalQuantile(steps, 0.5).high).toBeNull()
    expect(survivalQuantile([], 0.5)).toEqual({ days: null, low: null, high: null })
  })

  it('takes 0.9 failed as 0.1 standing, rounding or not', () => {
    const steps = survival(Array.from({ length: 10 }, (_, at) => ({ days: at + 1, failed: true })))
    expect(survivalQuantile(steps, 0.9).days).toBe(9)
  })
})
