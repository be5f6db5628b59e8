import { describe, expect, it } from 'vitest'
import { originWords } from '@/lib/domain/odds-words'
import { decide, fold } from '@/lib/domain/ticket'
import type { TicketEvent } from '@/lib/domain/ticket-types'
import { defaultPriors } from '@/lib/domain/walk'
import { byOdds, countedOdds, seasonOf } from '@/lib/domain/walk-history'
import { now } from '../factories/ticket'

const slow = { trouble: 'slow', priorTickets: 20 } as const

describe('the odds counted from closed tickets', () => {
  it('are none where no ticket tells of a suspect', () => {
    expect(countedOdds([], slow)).toBeNull()
    expect(countedOdds([{ cause: 'not known', tickets: 40 }], slow)).toBeNull()
  })

  it('move the catalogue’s by the tickets over its weight, and count only suspects', () => {
    const closed = [
      { cause: 'kinked-hose', tickets: 12 },
      { cause: 'no fault found', tickets: 7 },
    ]
    const found = countedOdds(closed, slow)
    expect(found?.tickets).toBe(12)
    // (12 + 20 · 0.04) / 32
    expect(found?.odds['kinked-hose']).toBeCloseTo(0.4, 12)
    expect(byOdds(found?.odds ?? defaultPriors.slow).slice(0, 2)).toEqual([
      'kinked-hose',
      'fouled-fibre',
    ])
  })

  it('start from the catalogue of their own trouble', () => {
    const closed = [{ cause: 'kinked-hose', tickets: 10 }]
    const found = countedOdds(closed, { trouble: 'no flow', priorTickets: 10 })
    // (10 + 10 · 0.12) / 20
    expect(found?.odds['kinked-hose']).toBeCloseTo(0.56, 12)
  })
})

describe('the season of a day', () => {
  it.each([
    ['2026-03-31', 'wet'],
    ['2026-04-01', 'dry'],
    ['2025-12-01', 'wet'],
  ])('%s is %s', (day, season) => {
    expect(seasonOf(day, [12, 1, 2, 3])).toBe(season)
  })

  it('is dry all the year where no month is wet', () => {
    expect(seasonOf('2026-03-31', [])).toBe('dry')
  })
})

describe('a ticket that starts from counted odds', () => {
  const { odds = defaultPriors.slow } =
    countedOdds([{ cause: 'kinked-hose', tickets: 34 }], slow) ?? {}
  const origin = { area: 'Loma Clara', season: 'wet', tickets: 34, priorTickets: 20 } as const
  const counted: TicketEvent = { kind: 'opened', trouble: 'slow', odds, oddsOrigin: origin }

  it('says where they were counted, from its events alone', () => {
    const state = fold([{ event: counted, at: now }])
    expect(state?.walk?.origin).toEqual(origin)
    expect(state?.walk?.start['kinked-hose']).toBeCloseTo(odds['kinked-hose'], 12)
    expect(originWords(state?.walk?.origin ?? null)).toBe(
      'The odds began from 34 closed tickets of Loma Clara in wet months, the catalogue weighing 20.',
    )
  })

  it('starts from the catalogue again once a part is handed over, and says so', () => {
    const events: TicketEvent[] = [
      counted,
      { kind: 'part promised', promiseId: 'p', stage: 3 },
      { kind: 'part handed over', promiseId: 'p' },
    ]
    const state = fold(events.map((event) => ({ event, at: now })))
    expect(originWords(state?.walk?.origin ?? null)).toBe('The odds began from the catalogue.')
    expect(state?.walk?.start['kinked-hose']).toBeCloseTo(defaultPriors.slow['kinked-hose'], 12)
  })

  it('without odds starts from the catalogue, whatever origin is claimed', () => {
    const bare: TicketEvent = { kind: 'opened', trouble: 'slow', oddsOrigin: origin }
    const decision = decide(null, bare, now)
    expect(decision.ok && decision.state.walk?.origin).toBeUndefined()
  })
})
