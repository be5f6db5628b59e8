import { DateTime } from 'luxon'
import { and, eq, like } from 'drizzle-orm'
import { beforeEach, describe, expect, test } from 'vitest'
import { areas } from '@/db/schema/area'
import { phones } from '@/db/schema/household'
import { kits } from '@/db/schema/kit'
import { prompts, texts } from '@/db/schema/text'
import { planPrompts } from '@/lib/services/plan-prompts'
import { sendDueTexts } from '@/lib/services/send-text'
import { testDeps, type TestDeps } from '../factories/deps'
import { houseIn, world, type World } from '../factories/world'

const HOUR = 3_600_000

let deps: TestDeps
let place: World

async function begin(at: string) {
  deps = await testDeps({ at })
  place = await world(deps)
}

async function leftTexts() {
  return deps.store.db
    .select({ at: texts.sentAt, purpose: texts.purpose, householdId: texts.householdId })
    .from(texts)
    .where(and(eq(texts.state, 'sent'), like(texts.purpose, 'prompt:%')))
}

describe.each([
  ['spring, with its skipped hour', '2026-03-05T05:10:00Z'],
  ['autumn, with its repeated hour', '2026-10-29T04:10:00Z'],
])('planning hour by hour over the change of clocks in %s', (_, from) => {
  const timeZone = 'America/New_York'

  test('each thing due goes once, inside the window', { timeout: 90_000 }, async () => {
    await begin(from)
    // The window lies over the hour that is skipped or repeated.
    const window = { windowOpensMinute: 60, windowClosesMinute: 180 }
    await deps.store.db.update(areas).set({ ...window, timeZone })
    const local = DateTime.fromISO(from, { zone: timeZone })
    for (const [index, daysAgo] of [14, 13, 12, 11, 10].entries()) {
      await houseIn(deps, place, {
        name: `House ${index}`,
        number: `+1202555011${index}`,
        handedOverOn: local.minus({ days: daysAgo }).toISODate()!,
      })
    }
    await deps.store.db.update(kits).set({ welcomeDueOn: null })
    for (let swept = 0; swept < 7 * 24; swept += 1) {
      await planPrompts(deps)
      await sendDueTexts(deps)
      deps.clock.advance(HOUR)
    }
    const left = await leftTexts()
    // One wash each: none lost, none doubled.
    expect(left.map(({ householdId }) => householdId)).toHaveLength(5)
    expect(new Set(left.map(({ householdId }) => householdId)).size).toBe(5)
    const clocks = left.map(({ at }) => DateTime.fromMillis(at!, { zone: timeZone }))
    expect(clocks.filter(({ hour }) => hour < 1 || hour >= 3)).toEqual([])
    // The last is due on the fourth day; the clocks change on the third.
    const days = clocks.map((clock) => Math.floor(clock.diff(local, 'days').days))
    expect(days.toSorted((one, other) => one - other)).toEqual([0, 1, 2, 3, 4])
  })
})

describe('planning', () => {
  beforeEach(() => begin('2026-03-02T07:00:00Z'))

  test('by two at a time makes one text for each kit', async () => {
    await houseIn(deps, place, { handedOverOn: '2026-02-10' })
    await houseIn(deps, place, { name: 'Vela', number: '+12025550111', handedOverOn: '2026-02-11' })
    const planned = await Promise.all([planPrompts(deps), planPrompts(deps), planPrompts(deps)])
    expect(planned.reduce((sum, one) => sum + one.planned, 0)).toBe(2)
    expect(await deps.store.db.select().from(texts)).toHaveLength(2)
  })

  test('welcomes a household once, and again only when the welcome never left', async () => {
    await houseIn(deps, place, { handedOverOn: '2026-03-01' })
    await planPrompts(deps)
    // The server was down for two days: the welcome is too late for its hour and is dropped.
    deps.clock.advance(48 * HOUR)
    await sendDueTexts(deps)
    expect(await leftTexts()).toEqual([])
    await planPrompts(deps)
    await sendDueTexts(deps)
    expect(await leftTexts()).toHaveLength(1)
    deps.clock.advance(24 * HOUR)
    await planPrompts(deps)
    const rows = await deps.store.db.select().from(prompts).where(eq(prompts.kind, 'welcome'))
    expect(rows).toMatchObject([{ state: 'answered', tries: 2 }])
    expect(await deps.store.db.select({ owed: kits.welcomeDueOn }).from(kits)).toEqual([
      { owed: null },
    ])
  })

  test('asks for what is due before what only will be', async () => {
    await houseIn(deps, place, { handedOverOn: '2026-02-17' })
    await deps.store.db
      .update(kits)
      .set({ welcomeDueOn: null, nextFlowCheckOn: '2026-03-02', nextWashOn: '2026-03-03' })
    await planPrompts(deps)
    expect((await deps.store.db.select().from(texts)).map(({ moment }) => moment)).toEqual([
      'flow-check',
    ])
  })

  test('texts nobody who said no', async () => {
    await houseIn(deps, place, { handedOverOn: '2026-02-10' })
    await deps.store.db.update(phones).set({ consent: 'withdrawn' })
    expect(await planPrompts(deps)).toEqual({ planned: 0 })
  })
})
