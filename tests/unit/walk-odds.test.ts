import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  countCauses,
  normalise,
  oddsFromHistory,
  outcomeChance,
  withEvidence,
} from '@/lib/domain/walk-odds'
import { defaultPriors, suspectIds, type Odds } from '@/lib/domain/walk-suspects'

const prior = defaultPriors.slow
const sumOf = (odds: Odds) => suspectIds.reduce((sum, id) => sum + odds[id], 0)

describe('odds counted from closed tickets', () => {
  it('are the prior where nothing is counted', () => {
    const odds = oddsFromHistory({}, prior, 20)
    for (const id of suspectIds) expect(odds[id]).toBeCloseTo(prior[id], 12)
  })

  it('move by counts over the weight of the prior, by hand', () => {
    // 10 tickets, 8 of them a full cloth; the prior weighs 20: (8 + 20 · 0.1) / 30 and so on.
    const odds = oddsFromHistory({ 'full-cloth': 8, 'fouled-fibre': 2 }, prior, 20)
    expect(odds['full-cloth']).toBeCloseTo((8 + 20 * 0.1) / 30, 12)
    expect(odds['fouled-fibre']).toBeCloseTo((2 + 20 * 0.54) / 30, 12)
    expect(odds['air-lock']).toBeCloseTo((20 * 0.05) / 30, 12)
  })

  it('count causes that are suspects, and no others', () => {
    const counts = countCauses([
      { cause: 'full-cloth', tickets: 2 },
      { cause: 'kit withdrawn', tickets: 5 },
      { cause: 'air-lock', tickets: 1 },
      { cause: '', tickets: 3 },
    ])
    expect(counts).toMatchObject({ 'full-cloth': 2, 'air-lock': 1, 'fouled-fibre': 0 })
    expect(Object.values(counts).reduce((sum, count) => sum + count, 0)).toBe(3)
  })

  it('near the counts as they grow', () => {
    const odds = oddsFromHistory({ 'full-cloth': 6_000, 'fouled-fibre': 4_000 }, prior, 20)
    expect(odds['full-cloth']).toBeCloseTo(0.6, 2)
  })

  it('sum to 1 and leave every cause possible, whatever is counted', () => {
    const counts = fc.record(
      Object.fromEntries(suspectIds.map((id) => [id, fc.nat(500)])) as Record<
        string,
        fc.Arbitrary<number>
      >,
      { requiredKeys: [] },
    )
    fc.assert(
      fc.property(counts, fc.integer({ min: 1, max: 100 }), (counted, weight) => {
        const odds = oddsFromHistory(counted, prior, weight)
        expect(sumOf(odds)).toBeCloseTo(1, 9)
        for (const id of suspectIds) expect(odds[id]).toBeGreaterThan(0)
      }),
      { seed: 3, numRuns: 200 },
    )
  })

  it('refuse a prior that weighs nothing', () => {
    expect(() => oddsFromHistory({}, prior, 0)).toThrow(
      new RangeError('the prior must weigh something'),
    )
  })
})

describe('evidence', () => {
  it('says nothing with a factor of 1, and does not mind its order', () => {
    expect(withEvidence(prior, {})).toEqual(normalise(prior))
    const one = withEvidence(withEvidence(prior, { 'air-lock': 3 }), { 'full-cloth': 2 })
    const other = withEvidence(withEvidence(prior, { 'full-cloth': 2 }), { 'air-lock': 3 })
    for (const id of suspectIds) expect(one[id]).toBeCloseTo(other[id], 12)
  })

  it('that rules everything out leaves even odds', () => {
    const none = Object.fromEntries(suspectIds.map((id) => [id, 0]))
    expect(withEvidence(prior, none)['air-lock']).toBeCloseTo(1 / suspectIds.length, 12)
  })

  it('of a cure has chances that sum to 1 for every suspect', () => {
    const step = { cures: { 'fouled-fibre': 0.65 } }
    for (const id of suspectIds) {
      const sum = (['cured', 'partly', 'not cured'] as const).reduce(
        (total, outcome) => total + outcomeChance(step, outcome, id),
        0,
      )
      expect(sum).toBeCloseTo(1, 12)
    }
  })
})
