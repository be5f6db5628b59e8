import { eq, sql } from 'drizzle-orm'
import { beforeEach, describe, expect, test } from 'vitest'
import { upsertSetting } from '@/db/queries/setting'
import { areas } from '@/db/schema/area'
import { households, phones } from '@/db/schema/household'
import { fittings, kits } from '@/db/schema/kit'
import { wordings } from '@/db/schema/wording'
import { defaultSettings } from '@/lib/domain/settings'
import { NotAllowedError } from '@/lib/domain/role'
import { partsOf } from '@/lib/domain/wording-examples'
import { whatIfQuerySchema, whatIfSchema } from '@/lib/schemas/what-if'
import { cyclesOf, cyclesStanding } from '@/lib/services/cycles-standing'
import { listRounds } from '@/lib/services/list-rounds'
import { planPrompts } from '@/lib/services/plan-prompts'
import { plansAhead } from '@/lib/services/plans-ahead'
import { whatIf } from '@/lib/services/what-if'
import { testDeps, type TestDeps } from '../factories/deps'
import { manyKits } from '../factories/many-kits'
import { actorOf, houseIn, world, type World } from '../factories/world'

let deps: TestDeps
let place: World

beforeEach(async () => {
  // A Monday, 10:00 in Nairobi.
  deps = await testDeps({ at: '2026-03-02T07:00:00Z' })
  place = await world(deps)
})

async function ask(query: Record<string, unknown> = {}) {
  return whatIfSchema.parse(await whatIf(deps, place.coordinator, whatIfQuerySchema.parse(query)))
}

/** Three families of cloudy water, welcomed, whose kits were handed over on three days. */
async function settle() {
  for (const [index, day] of ['18', '20', '25'].entries()) {
    await houseIn(deps, place, {
      name: `House ${index}`,
      number: `+1202555011${index}`,
      handedOverOn: `2026-02-${day}`,
    })
  }
  await deps.store.db.update(kits).set({ welcomeDueOn: null })
}

describe('what if nothing changes', () => {
  test('it is the plan: what the rounds foresee, and what is fitted by its date', async () => {
    await settle()
    const { today, other, byWeek, changed } = await ask({ weeks: '4' })
    expect(other).toEqual(today)
    expect(changed).toEqual([])
    // Washes of 14 days: on 4, 6 and 11 March, and again within the four weeks on 18, 20 and 25 March.
    // Cloth of one month on 18, 20 and 25 March. The first flow checks are due in April.
    expect(today).toMatchObject({ washes: 6, changes: [3, 0, 0], flowChecks: 0, texts: 9 })
    expect(today.busiest).toEqual({ day: 'Wed 18 Mar', texts: 2 })
    const { days } = await listRounds(deps, place.coordinator)
    const foreseen = days.reduce((sum, { counts }) => sum + counts.wash, 0)
    expect(byWeek.slice(0, 2).reduce((sum, week) => sum + week.today.texts, 0)).toBe(foreseen)
    const due = await deps.store.db
      .select()
      .from(fittings)
      .where(sql`${fittings.dueOn} < '2026-03-30'`)
    expect(due).toHaveLength(3)
  })

  test('naming the cycles that stand changes nothing either', async () => {
    await settle()
    const standing = await cyclesStanding(deps, place.coordinator)
    expect(standing).toMatchObject({ washCloudy: 14, wetPercent: 70, change1: 1, change3: 12 })
    const answer = await ask({ weeks: '52', ...standing })
    expect(answer.other).toEqual(answer.today)
    expect(answer.changed).toEqual([])
    expect(answer.byWeek).toHaveLength(52)
  })

  test('an empty desk has nothing to say, and says it', async () => {
    const { today, kits: all, byWeek } = await ask()
    expect(all).toBe(0)
    expect(today).toMatchObject({ texts: 0, cost: 0, busiest: null })
    expect(byWeek).toHaveLength(13)
  })
})

describe('other cycles', () => {
  test('a doubled interval about halves the washes and leaves the rest', async () => {
    await settle()
    const { today, other, changed } = await ask({ weeks: '52', washCloudy: '28' })
    expect(Math.abs(other.washes - today.washes / 2)).toBeLessThanOrEqual(3)
    expect(other.changes).toEqual(today.changes)
    expect(other.flowChecks).toBe(today.flowChecks)
    expect(other.cost).toBeLessThan(today.cost)
    expect(changed).toEqual(['Wash in cloudy water: 28 days instead of 14'])
  })

  test('water of another class does not feel it', async () => {
    await settle()
    const { today, other } = await ask({ weeks: '52', washClear: '60', washVeryCloudy: '10' })
    expect(other).toEqual(today)
  })

  test('washes closer than the settings keep them apart are refused', async () => {
    const query = whatIfQuerySchema.parse({ washCloudy: '4' })
    expect(await whatIf(deps, place.coordinator, query)).toEqual({
      ok: false,
      reason: 'The settings keep washes at least 5 days apart.',
    })
  })

  test('the cycles that stand are those of the settings', async () => {
    await upsertSetting(deps.store.db, { key: 'wash.flowCheckDays', value: 30, setAt: 0 })
    await settle()
    const standing = await cyclesStanding(deps, place.coordinator)
    expect(standing.flowCheckDays).toBe(30)
    const { today, other } = await ask({ weeks: '52', flowCheckDays: '60' })
    expect([today.flowChecks, other.flowChecks]).toEqual([36, 18])
  })

  test('a wet month is felt where there is one', async () => {
    await settle()
    const dry = await ask({ weeks: '13', wetPercent: '40' })
    expect(dry.other).toEqual(dry.today)
    await deps.store.db.update(areas).set({ wetMonths: [4, 5] })
    const wet = await ask({ weeks: '13', wetPercent: '40' })
    expect(wet.other.washes).toBeGreaterThan(wet.today.washes)
  })

  test('parts follow the months of the stages', async () => {
    await settle()
    const { today, other } = await ask({ weeks: '52', change1: '2', change2: '6', change3: '6' })
    // Fitted in February: within a year 12 cloths a house, or 6; 4 carbons, or 2; one fibre, or 2.
    expect(today.changes).toEqual([36, 12, 3])
    expect(other.changes).toEqual([18, 6, 6])
  })

  test('a shorter flow check asks oftener', async () => {
    await settle()
    const { today, other } = await ask({ weeks: '52', flowCheckDays: '30' })
    expect([today.flowChecks, other.flowChecks]).toEqual([18, 36])
  })
})

describe('the cost of texts', () => {
  test('is the segments of the wordings in use, by who reads them, at the price that is set', async () => {
    await settle()
    await deps.store.db
      .update(households)
      .set({ language: 'bn' })
      .where(eq(households.name, 'House 0'))
    await upsertSetting(deps.store.db, { key: 'programme.pricePerSegment', value: 0.05, setAt: 0 })
    const inUse = await deps.store.db.select().from(wordings).where(eq(wordings.moment, 'wash-due'))
    const segments = (language: 'es' | 'bn') =>
      partsOf(inUse.find((one) => one.language === language)!.body, language)
    const { today, segmentsOfText } = await ask({ weeks: '4' })
    expect(segmentsOfText.wash).toBeCloseTo((2 * segments('es') + segments('bn')) / 3, 9)
    const { wash, change } = segmentsOfText
    expect(today.cost).toBeCloseTo((6 * wash + 3 * change) * 0.05, 9)
  })

  test('has no text for a household that may not be texted, but its washes and parts', async () => {
    await settle()
    await deps.store.db.update(phones).set({ consent: 'withdrawn' })
    const { today, kits: all, unreached } = await ask({ weeks: '4' })
    expect([all, unreached]).toEqual([3, 3])
    expect(today).toMatchObject({ texts: 0, cost: 0, washes: 6, changes: [3, 0, 0], busiest: null })
  })

  test('leaves out kits that are not in use', async () => {
    await settle()
    await deps.store.db.update(kits).set({ state: 'retired' })
    expect(await ask()).toMatchObject({ kits: 0, today: { washes: 0 } })
  })
})

describe('many kits', () => {
  const today = '2026-03-02'
  const horizon = { from: today, days: 28, whatIf: {} }

  test('are read page by page, each once, and where it stops it says so', async () => {
    await manyKits(deps, place, { kits: 1203, due: 40, today })
    const cycles = cyclesOf(defaultSettings)
    const all = await plansAhead(deps, { ...horizon, cycles })
    expect(all).toMatchObject({ kits: 1203, cut: false })
    expect(all.readers).toEqual(new Map([['es', 1203]]))
    for (const most of [1202, 1000, 500, 499, 1]) {
      const some = await plansAhead(deps, { ...horizon, cycles }, most)
      expect(some).toMatchObject({ kits: most, cut: true })
    }
    expect(await plansAhead(deps, { ...horizon, cycles }, 1203)).toMatchObject({ cut: false })
  })

  test('do not hold the desk while they are read or planned', async () => {
    await manyKits(deps, place, { kits: 1203, due: 40, today })
    const cycles = cyclesOf(defaultSettings)
    for (const long of [() => plansAhead(deps, { ...horizon, cycles }), () => planPrompts(deps)]) {
      let turns = 0
      let isDone = false
      const others = () => {
        turns += 1
        if (!isDone) setImmediate(others)
      }
      setImmediate(others)
      await long()
      isDone = true
      expect(turns).toBeGreaterThan(1)
    }
  })
})

test('the what-if is for coordinators', async () => {
  const agent = await actorOf(deps, 'agent')
  const query = whatIfQuerySchema.parse({})
  await expect(whatIf(deps, agent, query)).rejects.toThrow(NotAllowedError)
  await expect(cyclesStanding(deps, agent)).rejects.toThrow(NotAllowedError)
})

test.each([
  ['washClear', 'x', 'Write whole days.'],
  ['washCloudy', '1', 'At least 2 days: washing oftener wears the fibre and the family.'],
  ['washVeryCloudy', '7.5', 'Write whole days.'],
  ['wetPercent', '110', 'At most 100 %: a wet month asks for no fewer washes.'],
  ['change2', '0', 'At least 1 month.'],
  ['change3', '61', 'At most 60 months.'],
  ['flowCheckDays', '13', 'At least 14 days.'],
  ['weeks', '5', 'Choose 4, 13, 26 or 52 weeks.'],
])('a bad %s (%s) is refused at its field: %s', (field, value, message) => {
  const result = whatIfQuerySchema.safeParse({ [field]: value })
  expect(result.error?.issues.map((issue) => [issue.path.join('.'), issue.message])).toEqual([
    [field, message],
  ])
})
