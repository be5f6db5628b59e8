import { describe, expect, it } from 'vitest'
import {
  causesOf,
  costPerHouseholdMonth,
  promptStairs,
  stockOutShare,
  timeToRestore,
  type PromptFate,
} from '@/lib/domain/measure-care'

const day = 86_400_000
const cutOffAt = 100 * day

describe('prompts down the stairs', () => {
  const fate = (rest: Partial<PromptFate>): PromptFate => ({
    sent: true,
    delivered: true,
    answered: true,
    done: null,
    ...rest,
  })

  it('each step is of the one above, the silent a row of their own', () => {
    const found = promptStairs(
      [
        fate({ sent: false, delivered: false, answered: false }),
        fate({ delivered: false, answered: false }),
        fate({ answered: false }),
        fate({}),
        fate({ done: 'said' }),
        fate({ done: 'said' }),
        fate({ done: 'measured' }),
        fate({ answered: false, done: 'seen' }),
      ],
      cutOffAt,
    )
    expect(found.planned).toBe(8)
    expect(found.sent).toMatchObject({ count: 7, n: 8 })
    expect(found.delivered).toMatchObject({ count: 6, n: 7 })
    expect(found.answered).toMatchObject({ count: 4, n: 6 })
    expect(found.silent).toMatchObject({ count: 2, n: 6 })
    expect(found.done.said).toMatchObject({ count: 2, n: 6 })
    expect(found.done.measured).toMatchObject({ count: 1, n: 6 })
    expect(found.done.seen).toMatchObject({ count: 1, n: 6 })
    expect(found.cutOffAt).toBe(cutOffAt)
  })

  it('of nothing are nothing', () => {
    expect(promptStairs([], cutOffAt)).toMatchObject({ planned: 0, sent: { share: null } })
  })
})

describe('the time to restore', () => {
  const trouble = (openedDay: number, restoredDay: number | null, endedDay = restoredDay) => ({
    openedAt: openedDay * day,
    restoredAt: restoredDay === null ? null : restoredDay * day,
    endedAt: endedDay === null ? null : endedDay * day,
  })

  it('is the day by which half and nine tenths had water again', () => {
    const found = timeToRestore(
      Array.from({ length: 10 }, (_, at) => trouble(50, 51 + at)),
      cutOffAt,
    )
    expect(found).toMatchObject({ n: 10, restored: 10, median: { days: 5 }, ninety: { days: 9 } })
  })

  it('is not made short by leaving the open ones out', () => {
    const found = timeToRestore(
      [trouble(90, 91), trouble(90, null), trouble(90, null, 95), trouble(90, null)],
      cutOffAt,
    )
    expect(found).toMatchObject({ n: 4, restored: 1, median: { days: null } })
  })

  it('knows nothing of what came after the cut-off', () => {
    const found = timeToRestore(
      [trouble(99, 102), trouble(101, 102), trouble(98, null, 102)],
      cutOffAt,
    )
    expect(found).toMatchObject({ n: 2, restored: 0 })
  })

  it('follows what ended otherwise no longer than to its end', () => {
    const found = timeToRestore([trouble(90, null, 91), trouble(90, 92)], cutOffAt)
    expect(found.median.days).toBe(2)
    const longer = timeToRestore([trouble(90, null, 93), trouble(90, 92)], cutOffAt)
    expect(longer.ninety.days).toBeNull()
  })
})

describe('causes', () => {
  it('are told the commonest first, the unknown among them', () => {
    const found = causesOf(['cloth', 'fibre', null, 'fibre'])
    expect(found.map(({ cause, count, n }) => [cause, count, n])).toEqual([
      ['fibre', 2, 4],
      ['cloth', 1, 4],
      [null, 1, 4],
    ])
    expect(causesOf([])).toEqual([])
  })
})

describe('stock-outs', () => {
  it('are of ledgers and of time', () => {
    const never = [{ quantity: 5, at: 0 }]
    const once = [
      { quantity: 1, at: 0 },
      { quantity: -1, at: 60 },
      { quantity: 1, at: 80 },
    ]
    expect(stockOutShare([never, once], { from: 0, to: 100 })).toMatchObject({
      count: 1,
      n: 2,
      times: 1,
      shareOfTime: 0.1,
      cutOffAt: 100,
    })
    expect(stockOutShare([], { from: 0, to: 100 }).shareOfTime).toBeNull()
  })
})

describe('the cost of a household-month', () => {
  const cutOffOn = '2025-06-30'

  it('is all cost over all months', () => {
    const found = costPerHouseholdMonth(
      [
        { cost: 12, months: 6 },
        { cost: 6, months: 6 },
        { cost: 3, months: 2 },
      ],
      cutOffOn,
    )
    expect(found).toMatchObject({ n: 3, months: 14, cost: 1.5, cutOffOn })
    // Residues 3, -3, 0; standard error √(18/2/3)/(14/3) = 0.371154; t of 2 at 97.5 % = 4.302653.
    expect(found.high).toBeCloseTo(1.5 + 4.302653 * 0.371154, 5)
    expect(found.low).toBeCloseTo(1.5 - 4.302653 * 0.371154, 5)
  })

  it('has no interval of one household, and no value of none', () => {
    expect(costPerHouseholdMonth([{ cost: 4, months: 2 }], cutOffOn)).toMatchObject({
      cost: 2,
      low: null,
      high: null,
    })
    expect(costPerHouseholdMonth([], cutOffOn).cost).toBeNull()
  })
})
