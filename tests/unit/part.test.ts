import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  available,
  conditionChangesPerDay,
  countCorrection,
  demandAhead,
  demandAtMost,
  fillRate,
  onHand,
  orderPlan,
  orderUpTo,
  reorderPoint,
  stockOuts,
} from '@/lib/domain/part'

describe('the stock to order up to', () => {
  it('is the smallest that lasts with the stated chance', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 60, noNaN: true }),
        fc.double({ min: 0.5, max: 0.999, noNaN: true }),
        (mean, chance) => {
          const stock = orderUpTo({ mean, chance })
          expect(demandAtMost({ mean, upTo: stock })).toBeGreaterThanOrEqual(chance - 1e-12)
          expect(demandAtMost({ mean, upTo: stock - 1 })).toBeLessThan(chance)
        },
      ),
      { seed: 4 },
    )
  })

  it('is nothing for no demand, and still found for a demand of thousands', () => {
    expect(orderUpTo({ mean: 0, chance: 0.99 })).toBe(0)
    const large = orderUpTo({ mean: 4000, chance: 0.975 })
    expect(Math.abs(large - (4000 + 1.96 * Math.sqrt(4000)))).toBeLessThan(3)
  })

  it('ends even when the chance asked for is beyond rounding', () => {
    expect(orderUpTo({ mean: 5, chance: 1 - 2 ** -53 })).toBeLessThan(60)
    expect(orderUpTo({ mean: 4000, chance: 1 - 2 ** -53 })).toBeLessThan(5000)
  })

  it.each([0, 1, NaN])('refuses a chance of %s', (chance) => {
    expect(() => orderUpTo({ mean: 1, chance })).toThrow(RangeError)
  })

  it.each([-1, NaN])('refuses a mean of %s', (mean) => {
    expect(() => orderUpTo({ mean, chance: 0.9 })).toThrow(RangeError)
    expect(() => demandAtMost({ mean, upTo: 1 })).toThrow(RangeError)
  })

  it('of nothing wanted is enough at nothing', () => {
    expect(demandAtMost({ mean: 0, upTo: 0 })).toBe(1)
    expect(demandAtMost({ mean: 0, upTo: -1 })).toBe(0)
    expect(fillRate({ mean: 0, stock: 0 })).toBe(0)
  })
})

const input = {
  dueOn: ['2025-05-20', '2025-06-01', '2025-06-11', '2025-06-12'],
  today: '2025-06-01',
  conditionChangesPerDay: 0.2,
}

describe('the demand ahead', () => {
  it('adds what is due, overdue ones too, to what condition will bring', () => {
    expect(demandAhead({ ...input, days: 10 })).toEqual({
      fromDates: 3,
      fromCondition: 2,
      mean: 5,
    })
  })

  it('brings the wave of a hand-out day back whole', () => {
    const wave = { ...input, dueOn: Array.from({ length: 80 }, () => '2025-09-01') }
    expect(demandAhead({ ...wave, days: 91 }).fromDates).toBe(0)
    expect(demandAhead({ ...wave, days: 92 }).fromDates).toBe(80)
  })

  it('counts changes by condition only once there was time to look', () => {
    expect(conditionChangesPerDay({ changes: 6, days: 30 })).toBe(0.2)
    expect(conditionChangesPerDay({ changes: 0, days: 0 })).toBe(0)
    expect(demandAhead({ ...input, conditionChangesPerDay: -1, days: 10 }).fromCondition).toBe(0)
  })

  it('sets the reorder point by the days until an order comes', () => {
    expect(reorderPoint({ ...input, leadDays: 10, chance: 0.95 })).toBe(
      orderUpTo({ mean: 5, chance: 0.95 }),
    )
  })
})

describe('an order', () => {
  const plan = (inStock: number) =>
    orderPlan({ ...input, leadDays: 10, reviewDays: 30, chance: 0.95, available: inStock })

  it('is placed at the reorder point and not above it', () => {
    const { reorderAt, upTo, demand } = plan(0)
    expect(demand).toEqual({ fromDates: 4, fromCondition: 8, mean: 12 })
    expect(upTo).toBe(orderUpTo({ mean: 12, chance: 0.95 }))
    expect(plan(reorderAt + 1).order).toBe(0)
    expect(plan(reorderAt).order).toBe(upTo - reorderAt)
    expect(plan(-3).order).toBe(upTo + 3)
  })
})

describe('the ledger', () => {
  const moves = [
    { quantity: 10, at: 100 },
    { quantity: -4, at: 200 },
    { quantity: -6, at: 300 },
    { quantity: 5, at: 400 },
  ]

  it('adds up, whatever the order of its lines', () => {
    expect(onHand(moves)).toBe(5)
    expect(onHand([...moves].reverse())).toBe(5)
    expect(onHand([])).toBe(0)
  })

  it('keeps promises back', () => {
    expect(available({ onHand: 5, promised: 2 })).toBe(3)
    expect(available({ onHand: 1, promised: 2 })).toBe(-1)
  })

  it('agrees with a count after its correction', () => {
    expect(countCorrection(moves, 3)).toBe(-2)
    expect(countCorrection(moves, 7)).toBe(2)
    expect(countCorrection(moves, 5)).toBeNull()
  })

  it('knows when there was none', () => {
    expect(stockOuts(moves, { from: 150, to: 500 })).toEqual({ times: 1, milliseconds: 100 })
    expect(stockOuts(moves, { from: 150, to: 350 })).toEqual({ times: 1, milliseconds: 50 })
    expect(stockOuts(moves, { from: 350, to: 500 })).toEqual({ times: 1, milliseconds: 50 })
    expect(stockOuts(moves, { from: 400, to: 500 })).toEqual({ times: 0, milliseconds: 0 })
    expect(stockOuts([], { from: 0, to: 10 })).toEqual({ times: 1, milliseconds: 10 })
    expect(stockOuts([...moves].reverse(), { from: 50, to: 500 })).toEqual({
      times: 2,
      milliseconds: 150,
    })
    const longOut = [...moves, { quantity: -5, at: 450 }, { quantity: -1, at: 460 }]
    expect(stockOuts(longOut, { from: 150, to: 500 })).toEqual({ times: 2, milliseconds: 150 })
  })
})
