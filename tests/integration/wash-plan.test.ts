import { setImmediate } from 'node:timers/promises'
import { sql } from 'drizzle-orm'
import { beforeEach, describe, expect, it } from 'vitest'
import type { Transaction } from '@/db/client'
import { findKitFacts, type KitFacts } from '@/db/queries/kit-facts'
import { listPromptsOfKit } from '@/db/queries/kit'
import { localDay } from '@/lib/domain/round'
import { closePrompts, logWash, refitStage } from '@/lib/services/care-for-kit'
import { changeHousehold } from '@/lib/services/change-household'
import { householdSheet } from '@/lib/services/household-sheet'
import { planPrompts } from '@/lib/services/plan-prompts'
import { replanWash } from '@/lib/services/plan-wash'
import { recordFlow } from '@/lib/services/record-flow'
import { sendDueTexts } from '@/lib/services/send-text'
import { testDeps, type TestDeps } from '../factories/deps'
import { entered, householdInput, programme, type Programme } from '../factories/programme'
import { houseIn, world } from '../factories/world'

const DAY = 86_400_000
const timeZone = 'America/La_Paz'

let deps: TestDeps
let place: Programme
let home: { householdId: string; kitId: string }

// Six people, who need 31.8 L a day: 4 L/h. Clear water is washed for every 30 days.
beforeEach(async () => {
  deps = await testDeps({ at: '2026-05-01T15:00:00Z' })
  place = await programme(deps)
  home = await entered(deps, place, {
    sourceClass: 'clear',
    kit: { modelId: place.modelId, handedOverOn: '2026-05-01' },
  })
})

async function kit(): Promise<KitFacts> {
  const facts = await findKitFacts(deps.store.db, home.kitId)
  if (!facts) throw new Error('There is no kit.')
  return facts
}

async function dates() {
  const { nextWashOn, calendarWashOn } = (await kit()).kit
  return { nextWashOn, calendarWashOn }
}

/** A bottle timed some days on. */
async function timed(minutes: number, afterDays: number) {
  deps.clock.advance(afterDays * DAY)
  const facts = await kit()
  await deps.store.transaction((tx) =>
    recordFlow(tx, deps, { facts, minutes, known: 'said', celsius: 20 }),
  )
}

async function washed() {
  const facts = await kit()
  await deps.store.transaction((tx) => logWash(tx, deps, { facts, known: 'said' }))
}

async function view() {
  const sheet = await householdSheet(deps, place.coordinator, home.householdId)
  if ('ok' in sheet) throw new Error(sheet.reason)
  const [shown] = sheet.kits
  if (!shown) throw new Error('The sheet shows no kit.')
  return shown
}

describe('the next wash', () => {
  it('keeps its day by the calendar while the readings are too few', async () => {
    await timed(6, 5)
    expect(await dates()).toEqual({ nextWashOn: '2026-05-31', calendarWashOn: '2026-05-31' })
    expect((await view()).flow.forecast.kind).toBe('too few')
  })

  it('comes forward to the day the falling flow meets the need, as the sheet foretells it', async () => {
    await timed(6, 5)
    await timed(8, 5)
    const { forecast } = (await view()).flow
    if (forecast.kind !== 'falls') throw new Error('No fall was seen.')
    const { nextWashOn, calendarWashOn } = await dates()
    expect(nextWashOn).toBe(localDay(forecast.onAt, timeZone))
    expect(calendarWashOn).toBe('2026-05-31')
    expect(nextWashOn < calendarWashOn).toBe(true)
    const wash = (await view()).planned.find(({ title }) => title === 'Wash')
    expect(wash?.note).toBe('brought forward from 31 May by the trend of the flow')
  })

  it('goes back to the calendar when a later reading shows no such fall', async () => {
    await timed(6, 5)
    await timed(8, 5)
    await timed(4, 1)
    expect(await dates()).toEqual({ nextWashOn: '2026-05-31', calendarWashOn: '2026-05-31' })
    const wash = (await view()).planned.find(({ title }) => title === 'Wash')
    expect(wash?.note).toBeUndefined()
  })

  it('is counted from a wash that was logged, the trend through all readings of the fibre', async () => {
    await timed(6, 5)
    await timed(8, 5)
    await washed()
    const { nextWashOn, calendarWashOn } = await dates()
    expect(calendarWashOn).toBe('2026-06-10')
    // The line goes on falling: no wash before the floor of five days.
    expect(nextWashOn >= '2026-05-16').toBe(true)
    expect(nextWashOn < calendarWashOn).toBe(true)
  })

  it('is never in the past, and never under five days from the last wash', async () => {
    await timed(8, 5)
    await timed(16, 5)
    expect((await dates()).nextWashOn).toBe('2026-05-11')
    await washed()
    expect((await dates()).nextWashOn).toBe('2026-05-16')
  })

  it('forgets the old readings with a new fibre', async () => {
    await timed(6, 5)
    await timed(8, 5)
    const facts = await kit()
    await deps.store.transaction((tx) =>
      refitStage(tx, deps, { facts, position: 3, removedFor: 'spent' }),
    )
    expect(await dates()).toEqual({ nextWashOn: '2026-06-10', calendarWashOn: '2026-06-10' })
  })

  it('follows the people in the house, whose need is another then', async () => {
    await timed(6, 5)
    await timed(7, 5)
    const before = (await dates()).nextWashOn
    const { phones, kit: _kit, reading: _reading, areaId: _area, ...who } = householdInput(place)
    const [phone] = phones
    if (!phone) throw new Error('The family has a phone.')
    const changed = { ...who, sourceClass: 'clear' as const, people: 9, phone }
    await changeHousehold(deps, place.coordinator, { ...changed, householdId: home.householdId })
    const after = (await dates()).nextWashOn
    expect(after < before).toBe(true)
  })
})

/** Until somebody waits for what this transaction holds: on the embedded database whoever comes waits outside. */
async function untilAwaited(tx: Transaction) {
  if (!process.env.TEST_DATABASE_URL) return
  for (;;) {
    const { rows } = await tx.execute(sql`
      select 1 from pg_locks where not granted and pg_backend_pid() = any (pg_blocking_pids(pid))`)
    if (rows.length > 0) return
    await setImmediate()
  }
}

describe('a wash logged while the plan is made anew', () => {
  it('is counted from, and not forgotten', async () => {
    deps.clock.advance(5 * DAY)
    const facts = await kit()
    let washing: Promise<void> | undefined
    await new Promise<void>((logged) => {
      washing = deps.store.transaction(async (tx) => {
        await logWash(tx, deps, { facts, known: 'said' })
        logged()
        await untilAwaited(tx)
      })
    })
    await deps.store.transaction((tx) => replanWash(tx, deps, home.kitId))
    await washing
    expect((await kit()).kit.washCountedFrom).toBe('2026-05-06')
    expect(await dates()).toEqual({ nextWashOn: '2026-06-05', calendarWashOn: '2026-06-05' })
  })
})

describe('a wash that is asked for', () => {
  // Cloudy water: washed for every 14 days.
  beforeEach(async () => {
    deps = await testDeps({ at: '2026-05-04T07:00:00Z' })
    home = await houseIn(deps, await world(deps), { handedOverOn: '2026-05-04' })
    await run()
    deps.clock.advance(14 * DAY)
    await run()
  })

  async function run() {
    await planPrompts(deps)
    await sendDueTexts(deps)
  }

  const washPrompts = async () => {
    const prompts = await listPromptsOfKit(deps.store.db, home.kitId)
    return prompts.filter(({ kind }) => kind === 'wash').map(({ dueOn, state }) => [dueOn, state])
  }

  it('keeps its day, whatever the trend says meanwhile, and is asked for once', async () => {
    await timed(6, 1)
    await timed(16, 1)
    expect((await dates()).nextWashOn).toBe('2026-05-18')
    await run()
    expect(await washPrompts()).toEqual([['2026-05-18', 'asked']])
  })

  it('is planned by the trend from the day on which the question is closed', async () => {
    await timed(6, 1)
    await timed(12, 1)
    const facts = await kit()
    await deps.store.transaction((tx) => closePrompts(tx, deps, { facts, state: 'answered' }))
    const { nextWashOn, calendarWashOn, lastWashOn } = (await kit()).kit
    // A line through 20, 10 and 5 L/h on days 0, 15 and 16 meets the need of 4 L/h after 23.7 days.
    expect({ nextWashOn, calendarWashOn, lastWashOn }).toEqual({
      nextWashOn: '2026-05-28',
      calendarWashOn: '2026-06-03',
      lastWashOn: '2026-05-04',
    })
    deps.clock.advance(8 * DAY)
    await run()
    expect(await washPrompts()).toEqual([
      ['2026-05-18', 'answered'],
      ['2026-05-28', 'asked'],
    ])
  })
})
