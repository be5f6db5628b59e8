import { and, eq, like, sql } from 'drizzle-orm'
import { beforeEach, describe, expect, test } from 'vitest'
import { phones } from '@/db/schema/household'
import { prompts, texts } from '@/db/schema/text'
import { localDay } from '@/lib/domain/round'
import { NotAllowedError } from '@/lib/domain/role'
import { listRounds } from '@/lib/services/list-rounds'
import { moveClock } from '@/lib/services/move-clock'
import { planPrompts } from '@/lib/services/plan-prompts'
import { practiceDesk } from '@/lib/services/practice'
import { sendDueTexts } from '@/lib/services/send-text'
import { testDeps, type TestDeps } from '../factories/deps'
import { actorOf, houseIn, world, type World } from '../factories/world'

const DAY = 86_400_000

let deps: TestDeps
let place: World

beforeEach(async () => {
  // 10:00 in Nairobi, inside the window.
  deps = await testDeps({ at: '2026-03-02T07:00:00Z' })
  place = await world(deps)
})

const families = ['Orellana', 'Vela', 'Quispe', 'Mamani', 'Rojas']

/** Five families whose kits are of five ages, so that washes and changes fall on many days. */
async function settle() {
  for (const [index, name] of families.entries()) {
    await houseIn(deps, place, {
      name,
      number: `+1202555011${index}`,
      handedOverOn: `2026-02-${String(2 + index * 6).padStart(2, '0')}`,
    })
  }
}

/** Prompts that left, as `day household`, in order. */
async function promptsThatLeft() {
  const rows = await deps.store.db
    .select({ at: texts.sentAt, householdId: texts.householdId })
    .from(texts)
    .where(and(eq(texts.state, 'sent'), like(texts.purpose, 'prompt:%')))
  return rows.map(({ at, householdId }) => `${localDay(at!, 'Africa/Nairobi')} ${householdId}`)
}

// Weeks go by hour by hour on a real database: seconds alone, more on a busy machine.
const weeksGoBy = { timeout: 90_000 }

describe('the rounds', () => {
  test('say day by day what then goes out when the days come', weeksGoBy, async () => {
    await settle()
    const { days } = await listRounds(deps, place.coordinator)
    const foreseen = days.flatMap(({ on, going }) =>
      going.map(({ householdId }) => `${on} ${householdId}`),
    )
    expect(foreseen.length).toBeGreaterThan(5)
    await planPrompts(deps)
    await sendDueTexts(deps)
    for (let day = 1; day < 14; day += 1) {
      // Every household answers something, so no nudge takes a prompt's place in the weekly limit.
      await deps.store.db.update(prompts).set({ state: 'answered', nudgeAfter: null })
      await moveClock(deps, place.coordinator, { hours: 24 })
    }
    expect((await promptsThatLeft()).toSorted()).toEqual(foreseen.toSorted())
  })

  test('count what waits for its hour, and what follows if nobody answers', async () => {
    await houseIn(deps, place, { handedOverOn: '2026-02-14' })
    await planPrompts(deps)
    const before = await listRounds(deps, place.coordinator)
    expect(before.days[0]).toMatchObject({ texts: 1, counts: { welcome: 1, wash: 0 } })
    expect(before.days[0]?.going[0]).toMatchObject({ state: 'queued', hour: '10:00' })
    expect(before.days[1]).toMatchObject({ texts: 1, counts: { welcome: 0, wash: 1 } })
    expect(before.days[1]?.going[0]).toMatchObject({ state: 'planned', hour: '08:00' })
    await moveClock(deps, place.coordinator, { hours: 24 })
    const after = await listRounds(deps, place.coordinator)
    expect(after.days[0]).toMatchObject({ on: '2026-03-03', texts: 0 })
    expect(after.days[3]).toMatchObject({ on: '2026-03-06', counts: { nudge: 1 } })
    expect(after.days[3]?.going[0]).toMatchObject({ state: 'if silent', house: 'Orellana' })
  })

  test('are never two for one household on a day', async () => {
    await houseIn(deps, place, { handedOverOn: '2026-01-14' })
    for (let sweep = 0; sweep < 6; sweep += 1) {
      await planPrompts(deps)
      await sendDueTexts(deps)
      deps.clock.advance(600_000)
    }
    expect(deps.carrier.sent).toHaveLength(1)
  })

  test('leave out whoever may not be texted', async () => {
    await settle()
    await deps.store.db.update(phones).set({ consent: 'withdrawn' })
    const { texts: total, days } = await listRounds(deps, place.coordinator)
    expect(total).toBe(0)
    expect(days).toHaveLength(14)
  })

  test('have a line for what the sender can carry in a day', async () => {
    expect(await listRounds(deps, place.coordinator)).toMatchObject({
      textsPerMinute: 60,
      carriesADay: 60 * 12 * 60,
    })
  })

  test('are for coordinators only', async () => {
    const agent = await actorOf(deps, 'agent')
    await expect(listRounds(deps, agent)).rejects.toBeInstanceOf(NotAllowedError)
  })
})

describe('moving the practice clock', () => {
  test('does on the way what falls due, and says what it was', weeksGoBy, async () => {
    await houseIn(deps, place, { handedOverOn: '2026-03-02' })
    const moved = await moveClock(deps, place.coordinator, { hours: 14 * 24 })
    expect(moved).toMatchObject({ moved: '14 days', tickets: 0 })
    expect(moved).toMatchObject({ texts: 2, prompts: 2 })
    expect(deps.clock.now()).toBe(Date.parse('2026-03-16T07:00:00Z'))
  })

  test('goes to the next text and no further than three weeks', weeksGoBy, async () => {
    await houseIn(deps, place, { handedOverOn: '2026-03-02' })
    await planPrompts(deps)
    await sendDueTexts(deps)
    await moveClock(deps, place.coordinator, { toNext: true })
    expect(deps.carrier.sent).toHaveLength(2)
    expect(localDay(deps.clock.now(), 'Africa/Nairobi')).toBe('2026-03-16')
    await deps.store.db.update(phones).set({ consent: 'withdrawn' })
    const from = deps.clock.now()
    const moved = await moveClock(deps, place.coordinator, { toNext: true })
    expect(moved).toMatchObject({ texts: 0 })
    expect(deps.clock.now() - from).toBe(21 * DAY)
  })

  test('nudges, gives up and opens a ticket where nobody ever answers', weeksGoBy, async () => {
    await houseIn(deps, place, { handedOverOn: '2026-03-02' })
    const moved = await moveClock(deps, place.coordinator, { hours: 40 * 24 })
    expect(moved).toMatchObject({ tickets: 1 })
  })

  test('takes thirty days in well under a minute', { timeout: 60_000 }, async () => {
    await settle()
    await moveClock(deps, place.coordinator, { hours: 30 * 24 })
    const [row] = await deps.store.db
      .select({ sent: sql<number>`count(*)::int` })
      .from(texts)
      .where(eq(texts.state, 'sent'))
    expect(row?.sent).toBeGreaterThan(10)
  })

  test('is one move at a time', async () => {
    const both = await Promise.all([
      moveClock(deps, place.coordinator, { hours: 1 }),
      moveClock(deps, place.coordinator, { hours: 1 }),
    ])
    expect(both.filter((result) => 'ok' in result)).toHaveLength(1)
  })

  test('is not there where a real carrier could be reached', async () => {
    const real = { ...deps, practice: null }
    const notFound = { ok: false, reason: 'not found' }
    expect(await moveClock(real, place.coordinator, { hours: 1 })).toEqual(notFound)
    expect(await practiceDesk(real, place.coordinator)).toEqual(notFound)
  })
})
