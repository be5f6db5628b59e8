import { readdirSync, readFileSync } from 'node:fs'
import { PGlite } from '@electric-sql/pglite'
import { beforeEach, describe, expect, test } from 'vitest'
import { areas } from '@/db/schema/area'
import { NotAllowedError } from '@/lib/domain/role'
import type { Area } from '@/lib/schemas/area'
import { enterArea } from '@/lib/services/enter-area'
import { listAreas } from '@/lib/services/list-areas'
import { listRounds } from '@/lib/services/list-rounds'
import { planPrompts } from '@/lib/services/plan-prompts'
import { listCountries, publicHolidays } from '@/lib/services/public-holidays'
import { sendDueTexts } from '@/lib/services/send-text'
import { testDeps, type TestDeps } from '../factories/deps'
import { actorOf, houseIn, world, type World } from '../factories/world'

let deps: TestDeps
let place: World

beforeEach(async () => {
  // A Monday, 10:00 in Nairobi.
  deps = await testDeps({ at: '2026-03-02T07:00:00Z' })
  place = await world(deps)
})

describe('a named day off', () => {
  const fordDay = { on: '2026-03-02', name: 'Ford day' }

  test('keeps the texts of its area back until the day after', async () => {
    await deps.store.db.update(areas).set({ holidays: [fordDay] })
    await houseIn(deps, place, { handedOverOn: '2026-02-20' })
    await planPrompts(deps)
    await sendDueTexts(deps)
    expect(deps.carrier.sent).toHaveLength(0)
    deps.clock.advance(24 * 3_600_000)
    await sendDueTexts(deps)
    expect(deps.carrier.sent).toHaveLength(1)
  })

  test('is the reason in the rounds, by area where they differ', async () => {
    const { areas: known } = await listAreas(deps, place.coordinator)
    const { id: _, depotName: __, households: ___, ...loma } = known[0] as Area
    await deps.store.db.update(areas).set({ sundaysOff: true, holidays: [fordDay] })
    const whys = async () => {
      const { days } = await listRounds(deps, place.coordinator)
      return days
        .filter(({ daysOff }) => daysOff.length > 0)
        .map(({ on, off, daysOff }) => ({ on, off, daysOff }))
    }
    expect(await whys()).toEqual([
      { on: '2026-03-02', off: true, daysOff: [{ why: 'Ford day', areas: [] }] },
      { on: '2026-03-08', off: true, daysOff: [{ why: 'Sunday', areas: [] }] },
      { on: '2026-03-15', off: true, daysOff: [{ why: 'Sunday', areas: [] }] },
    ])
    await enterArea(deps, place.coordinator, { ...loma, name: 'Ferry Bank' })
    expect(await whys()).toEqual([
      { on: '2026-03-02', off: false, daysOff: [{ why: 'Ford day', areas: ['Loma Clara'] }] },
      { on: '2026-03-08', off: false, daysOff: [{ why: 'Sunday', areas: ['Loma Clara'] }] },
      { on: '2026-03-15', off: false, daysOff: [{ why: 'Sunday', areas: ['Loma Clara'] }] },
    ])
  })
})

describe('a country’s public holidays', () => {
  async function holidaysOf(country: string) {
    const found = await publicHolidays(deps, place.coordinator, { country })
    if ('ok' in found) throw new Error(found.reason)
    return found
  }

  test('are those still to come this year and next, in order, each day once', async () => {
    const { country, holidays } = await holidaysOf('FR')
    const days = holidays.map(({ on }) => on)
    expect(country).toBe('France')
    expect(days).toEqual([...new Set(days)].toSorted())
    expect(days.filter((on) => on < '2026-03-02' || on > '2027-12-31')).toEqual([])
    // 14 July by law; Easter Monday of 2026 and 2027 by the computus.
    expect(days).toEqual(
      expect.arrayContaining(['2026-07-14', '2027-07-14', '2026-04-06', '2027-03-29']),
    )
    expect(holidays.every(({ name }) => name.length > 0 && name.length <= 60)).toBe(true)
  })

  test('have every day of a feast of several, by the local day and not the evening before', async () => {
    const { holidays } = await holidaysOf('BD')
    const eid = holidays.filter(({ name }) => name.includes('al-Fitr')).map(({ on }) => on)
    expect(eid.slice(0, 3)).toEqual(['2026-03-20', '2026-03-21', '2026-03-22'])
  })

  test('are offered for many countries, by name', async () => {
    const { countries } = await listCountries(deps, place.coordinator)
    expect(countries.length).toBeGreaterThan(150)
    expect(countries).toContainEqual({ code: 'KE', name: 'Kenya' })
  })

  test('are not made up for a country that is none', async () => {
    for (const country of ['XX', '', 'constructor', '../FR'])
      expect(await publicHolidays(deps, place.coordinator, { country })).toEqual({
        ok: false,
        reason: 'not found',
      })
  })

  test('are for coordinators', async () => {
    const agent = await actorOf(deps, 'agent')
    await expect(publicHolidays(deps, agent, { country: 'FR' })).rejects.toThrow(NotAllowedError)
    await expect(listCountries(deps, agent)).rejects.toThrow(NotAllowedError)
  })
})

function migrations(): string[] {
  return readdirSync('db/migrations')
    .filter((file) => file.endsWith('.sql'))
    .toSorted()
}

/** The statements of a migration, as Drizzle runs them. */
function statementsOf(migration: string): string[] {
  return readFileSync(`db/migrations/${migration}`, 'utf8').split('--> statement-breakpoint')
}

test('days off kept before they had names stay days off, and kits not welcomed yet are owed it', async () => {
  const database = await PGlite.create()
  const run = async (migration: string) => {
    for (const statement of statementsOf(migration)) await database.exec(statement)
  }
  const [first = '', ...later] = migrations()
  await run(first)
  await database.exec(`
    insert into depots (id, name, created_at) values ('depot', 'Vado depot', now());
    insert into areas (id, name, time_zone, language, month_celsius, depot_id, created_at, holidays)
      select 'area-' || n, 'Area ' || n, 'UTC', 'es', array_fill(20, array[12]), 'depot', now(), days
      from (values (1, array['2026-12-25', '2026-05-01']), (2, '{}'::text[])) as given (n, days);
    insert into households (id, name, area_id, language, people, source_class, created_at)
      values ('house', 'House', 'area-1', 'es', 5, 'cloudy', now());
    insert into kit_models (id, name, nominal_litres_per_hour) values ('model', 'Model', 18);
    insert into kits (id, household_id, model_id, handed_over_on, last_wash_on, next_wash_on,
      next_flow_check_on, created_at)
      select kit, 'house', 'model', '2026-03-01', '2026-03-01', '2026-03-15', '2026-05-01', now()
      from unnest(array['new', 'planned', 'welcomed']) as kit;
    insert into texts (id, direction, purpose, e164, language, body, state, send_after, created_at)
      values ('text', 'out', 'p', '+12025550101', 'es', 'hello', 'sent', now(), now());
    insert into prompts (id, kit_id, kind, due_on, state, text_id, created_at)
      values ('one', 'planned', 'welcome', '2026-03-01', 'planned', 'text', now()),
        ('two', 'welcomed', 'welcome', '2026-03-01', 'answered', 'text', now());`)
  for (const migration of later) await run(migration)
  const kept = await database.query('select holidays from areas order by name')
  expect(kept.rows).toEqual([
    {
      holidays: [
        { on: '2026-05-01', name: '' },
        { on: '2026-12-25', name: '' },
      ],
    },
    { holidays: [] },
  ])
  const owed = await database.query(
    'select id from kits where welcome_due_on is not null order by id',
  )
  expect(owed.rows).toEqual([{ id: 'new' }, { id: 'planned' }])
  await database.close()
})
