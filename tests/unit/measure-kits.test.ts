import { describe, expect, it } from 'vitest'
import {
  filterSurvival,
  kitsFlowing,
  kitsInDate,
  type Evidence,
  type Followed,
} from '@/lib/domain/measure-kits'

const cutOffOn = '2025-06-30'

describe('kits in date', () => {
  it('have nothing overdue on the cut-off day', () => {
    const kits = [
      { dueOn: ['2025-06-30', '2026-01-01'] },
      { dueOn: ['2025-06-29', '2026-01-01'] },
      { dueOn: [] },
    ]
    expect(kitsInDate(kits, cutOffOn)).toMatchObject({ count: 2, n: 3, cutOffOn })
    expect(kitsInDate([], cutOffOn).share).toBeNull()
  })
})

describe('kits flowing', () => {
  const kitIds = ['a', 'b', 'c', 'd']
  const word = (kitId: string, rest: Partial<Evidence>): Evidence => ({
    kitId,
    known: 'said',
    flowing: true,
    on: '2025-06-20',
    ...rest,
  })
  const found = (...evidence: Evidence[]) => kitsFlowing({ kitIds, evidence, cutOffOn })

  it('are counted of all kits, in the column their last word belongs to', () => {
    const { columns, silent, n } = found(
      word('a', {}),
      word('b', { flowing: false }),
      word('a', { known: 'measured', flowing: false, on: '2025-06-25' }),
    )
    expect(n).toBe(4)
    expect(columns.said).toMatchObject({ flowing: { count: 1, n: 4 }, notFlowing: 1, unknown: 2 })
    expect(columns.measured).toMatchObject({ flowing: { count: 0 }, notFlowing: 1, unknown: 3 })
    expect(columns.seen).toMatchObject({ flowing: { count: 0 }, unknown: 4, ageDays: null })
    expect(silent).toMatchObject({ count: 2, n: 4, share: 0.5 })
  })

  it('go by the last word, and of one day by the worse', () => {
    const later = word('a', { flowing: false, on: '2025-06-21' })
    expect(found(word('a', {}), later).columns.said.notFlowing).toBe(1)
    expect(found(later, word('a', {})).columns.said.notFlowing).toBe(1)
    const sameDay = word('a', { flowing: false })
    expect(found(word('a', {}), sameDay).columns.said.notFlowing).toBe(1)
    expect(found(sameDay, word('a', {})).columns.said.notFlowing).toBe(1)
  })

  it('are not kept alive by old words, by later ones or by strangers', () => {
    const { columns, silent } = found(
      word('a', { on: '2025-05-01' }),
      word('b', { on: '2025-04-30' }),
      word('c', { on: '2025-07-01' }),
      word('stranger', {}),
    )
    expect(columns.said.flowing.count).toBe(1)
    expect(silent.count).toBe(3)
    const strict = kitsFlowing({ kitIds, evidence: [word('a', {})], cutOffOn, freshDays: 9 })
    expect(strict.silent.count).toBe(4)
  })

  it('say how old the words are', () => {
    const { columns } = found(word('a', {}), word('b', { on: cutOffOn }), word('c', {}))
    expect(columns.said.ageDays).toMatchObject({ n: 3, value: 10 })
  })
})

describe('the survival of filters', () => {
  const filter = (rest: Partial<Followed>): Followed => ({
    fittedOn: '2025-01-01',
    failedOn: null,
    lastKnownOn: cutOffOn,
    ...rest,
  })

  it('counts failures, and keeps those lost from sight only while they were seen', () => {
    const found = filterSurvival(
      [
        filter({ failedOn: '2025-04-11' }),
        filter({ lastKnownOn: '2025-02-20' }),
        filter({}),
        filter({ lastKnownOn: '2025-12-31' }),
        filter({ failedOn: '2025-08-01' }),
      ],
      cutOffOn,
    )
    expect(found).toMatchObject({ n: 5, failed: 1, cutOffOn })
    // Four were still followed on day 100; one of them failed then.
    expect(found.steps).toMatchObject([{ days: 100, atRisk: 4, survival: 0.75 }])
    expect(found.median.days).toBeNull()
  })

  it('follows up to the cut-off and no further', () => {
    const found = filterSurvival(
      [
        filter({ failedOn: '2025-06-30' }), // day 180, the cut-off itself
        filter({ lastKnownOn: '2025-07-30' }),
        filter({ fittedOn: '2025-07-01' }),
        filter({ lastKnownOn: '2024-12-01' }),
      ],
      cutOffOn,
    )
    expect(found.n).toBe(3)
    expect(found.steps).toMatchObject([{ days: 180, atRisk: 2, survival: 0.5 }])
    expect(found.median.days).toBe(180)
  })
})
