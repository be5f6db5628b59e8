import { asc, eq } from 'drizzle-orm'
import { beforeEach, describe, expect, it } from 'vitest'
import { upsertSetting } from '@/db/queries/setting'
import { insertTicket } from '@/db/queries/ticket-events'
import { areas } from '@/db/schema/area'
import { ticketEvents } from '@/db/schema/ticket'
import type { SettingPath } from '@/lib/domain/settings'
import { defaultPriors } from '@/lib/domain/walk'
import { seeSettings } from '@/lib/services/change-settings'
import { enterArea } from '@/lib/services/enter-area'
import { prepareDesk } from '@/lib/services/prepare-desk'
import { testDeps, type TestDeps } from '../factories/deps'
import { lastTicket, sheetOf } from '../factories/desk'
import { areaInput, entered, programme, type Programme } from '../factories/programme'
import { actorOf, say } from '../factories/world'

const DAY = 86_400_000

let deps: TestDeps
let place: Programme
let elsewhere: Programme
let houses = 0

/** A household of an area, with a kit and a phone of its own. */
async function house(of: Programme) {
  houses += 1
  const number = `+1505555${String(1000 + houses)}`
  const home = await entered(deps, of, {
    name: `House ${houses}`,
    phones: [{ number, answeredBy: 'the mother' }],
  })
  return { ...home, number }
}

type Closed = { cause: string; tickets: number; openedAt?: string; endedDaysAgo?: number }

/** Tickets of an area that were closed as flowing, each of a house of its own. */
async function closed(
  of: Programme,
  { cause, tickets, ...when }: Closed,
  trouble: 'slow' | 'no flow' = 'slow',
) {
  const { householdId, kitId } = await house(of)
  for (let n = 0; n < tickets; n += 1) {
    await insertTicket(deps.store.db, {
      kitId,
      householdId,
      stage: 'flowing',
      trouble,
      automatic: false,
      version: 1,
      // 1 March in La Paz: a wet month there.
      openedAt: Date.parse(when.openedAt ?? '2026-03-01T15:00:00Z'),
      endedAt: deps.clock.now() - (when.endedDaysAgo ?? 1) * DAY,
      cause,
    })
  }
}

const set = (key: SettingPath, value: unknown) =>
  upsertSetting(deps.store.db, { key, value, setAt: deps.clock.now() })

/** A family says that its water is slow; what its ticket's walk starts from. */
async function opened(of: Programme) {
  const { number, householdId } = await house(of)
  await say(deps, number, 'sale poca agua')
  const ticket = await lastTicket(deps)
  expect(ticket.householdId).toBe(householdId)
  const [row] = await deps.store.db
    .select()
    .from(ticketEvents)
    .where(eq(ticketEvents.ticketId, ticket.id))
    .orderBy(asc(ticketEvents.n))
  if (row?.event.kind !== 'opened') throw new Error('The ticket was not opened.')
  return row.event
}

beforeEach(async () => {
  deps = await testDeps({ at: '2026-03-20T15:00:00Z' })
  await prepareDesk(deps)
  place = await programme(deps)
  const other = { ...areaInput, name: 'Vado Alto', depotId: place.depotId }
  const made = await enterArea(deps, place.coordinator, other)
  if (!made.ok) throw new Error(made.reason)
  elsewhere = { ...place, areaId: made.areaId }
})

describe('the odds a walk starts from', () => {
  it('are the catalogue’s while the switch is off, whatever was closed', async () => {
    await closed(place, { cause: 'kinked-hose', tickets: 30 })
    const event = await opened(place)
    expect(event.odds).toBeUndefined()
    const agent = await actorOf(deps, 'agent')
    expect((await sheetOf(deps, agent)).column.oddsFrom).toBe('The odds began from the catalogue.')
  })

  it('are moved by the area’s own tickets of the season and the trouble, and by no others', async () => {
    await set('walks.fromClosedTickets', true)
    await closed(place, { cause: 'kinked-hose', tickets: 10 })
    await closed(place, { cause: 'not known', tickets: 3 })
    await closed(place, { cause: 'air-lock', tickets: 9, openedAt: '2025-07-01T15:00:00Z' })
    await closed(place, { cause: 'packed-carbon', tickets: 9 }, 'no flow')
    await closed(elsewhere, { cause: 'full-cloth', tickets: 40 })
    const { odds, oddsOrigin } = await opened(place)
    // (10 + 20 · 0.04) / 30, and nothing but the catalogue's share of the others.
    expect(odds?.['kinked-hose']).toBeCloseTo(0.36, 9)
    for (const id of ['full-cloth', 'air-lock', 'packed-carbon'] as const) {
      expect(odds?.[id]).toBeCloseTo((20 * defaultPriors.slow[id]) / 30, 9)
    }
    expect(oddsOrigin).toEqual({
      area: 'Loma Clara',
      season: 'wet',
      tickets: 10,
      priorTickets: 20,
    })
  })

  it('count the season by the area’s own day, and a year at most', async () => {
    await set('walks.fromClosedTickets', true)
    // 31 March, 22:00 in La Paz is April in UTC.
    await closed(place, { cause: 'kinked-hose', tickets: 2, openedAt: '2025-04-01T02:00:00Z' })
    await closed(place, { cause: 'kinked-hose', tickets: 4, openedAt: '2025-04-01T05:00:00Z' })
    await closed(place, { cause: 'kinked-hose', tickets: 8, endedDaysAgo: 364 })
    await closed(place, { cause: 'kinked-hose', tickets: 16, endedDaysAgo: 366 })
    expect((await opened(place)).oddsOrigin?.tickets).toBe(2 + 8)
  })

  it('weigh the catalogue as it is set', async () => {
    await set('walks.fromClosedTickets', true)
    await set('walks.priorTickets', 10)
    await closed(place, { cause: 'kinked-hose', tickets: 10 })
    expect((await opened(place)).odds?.['kinked-hose']).toBeCloseTo((10 + 0.4) / 20, 9)
  })

  it('are told on the ticket’s sheet as they were that day, though the area be renamed', async () => {
    await set('walks.fromClosedTickets', true)
    await closed(place, { cause: 'kinked-hose', tickets: 34 })
    await opened(place)
    await closed(place, { cause: 'kinked-hose', tickets: 5 })
    await deps.store.db.update(areas).set({ name: 'Loma Nueva' }).where(eq(areas.id, place.areaId))
    const agent = await actorOf(deps, 'agent')
    await deps.store.db.update(areas).set({ wetMonths: [] }).where(eq(areas.id, place.areaId))
    expect((await sheetOf(deps, agent)).column.oddsFrom).toBe(
      'The odds began from 34 closed tickets of Loma Clara in wet months, the catalogue weighing 20.',
    )
  })
})

describe('the settings page', () => {
  it('shows what is counted by area and season, beside the catalogue', async () => {
    await closed(place, { cause: 'kinked-hose', tickets: 10 })
    await closed(place, { cause: 'fouled-fibre', tickets: 2 })
    await closed(place, { cause: 'not known', tickets: 20 })
    await closed(place, { cause: 'air-lock', tickets: 1, openedAt: '2025-07-01T15:00:00Z' })
    await closed(elsewhere, { cause: 'no fault found', tickets: 3 })
    const { startingOdds } = await seeSettings(deps, place.coordinator)
    expect(startingOdds.map(({ area, season, tickets }) => [area, season, tickets])).toEqual([
      ['Loma Clara', 'dry', 1],
      ['Loma Clara', 'wet', 12],
    ])
    const [, wet] = startingOdds
    expect(wet?.likely).toEqual({ words: 'Hose kinked', tickets: 10 })
    expect(wet?.odds).toHaveLength(3)
    const hose = wet?.odds.find(({ words }) => words === 'Hose kinked')
    expect(hose?.used).toBeCloseTo((10 + 20 * 0.04) / 32, 9)
    expect(hose?.catalogue).toBe(0.04)
  })
})
