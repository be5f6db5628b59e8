import { sql } from 'drizzle-orm'
import { beforeEach, describe, expect, test } from 'vitest'
import { dueQuery, listDue } from '@/db/queries/prompt'
import { kits } from '@/db/schema/kit'
import { planPrompts } from '@/lib/services/plan-prompts'
import { sendDueTexts } from '@/lib/services/send-text'
import { testDeps, type TestDeps } from '../factories/deps'
import { manyKits } from '../factories/many-kits'
import { world } from '../factories/world'

/*
 * Planning costs what is due, not what there is. Measured side by side by `npm run bench`; here by asking the
 * database how it is going to answer.
 */

const today = '2026-03-02'
const horizon = '2026-03-06'
const due = 40

/** One step of a plan, as `explain (format json)` tells it. */
type Step = {
  'Node Type': string
  'Relation Name'?: string
  'Index Name'?: string
  'Actual Rows'?: number
  Plans?: Step[]
}

let deps: TestDeps

beforeEach(async () => {
  deps = await testDeps({ at: '2026-03-02T07:00:00Z' })
  await manyKits(deps, await world(deps), { kits: 2000, due, today })
})

async function steps(): Promise<Step[]> {
  const asked = sql`explain (analyze, format json) ${dueQuery(horizon, 2000)}`
  const { rows } = await deps.store.db.execute<{ 'QUERY PLAN': [{ Plan: Step }] }>(asked)
  const flat = (step: Step): Step[] => [step, ...(step.Plans ?? []).flatMap(flat)]
  return flat(rows[0]!['QUERY PLAN'][0].Plan)
}

describe('what is due', () => {
  test('is found by walking an index of due dates for each kind', async () => {
    const plan = await steps()
    const walked = plan.map((step) => step['Index Name'])
    for (const index of [
      'kits_wash_due',
      'kits_flow_check_due',
      'kits_welcome_due',
      'fittings_due',
    ])
      expect(walked).toContain(index)
  })

  test('is found without reading all of any table that grows with the kits', async () => {
    const read = (await steps())
      .filter((step) => step['Node Type'] === 'Seq Scan')
      .map((step) => step['Relation Name'])
    for (const table of ['kits', 'fittings', 'household_phones', 'phones', 'prompts'])
      expect(read).not.toContain(table)
  })

  test('costs nothing for a kit that has its welcome', async () => {
    const welcomes = async () =>
      (await steps()).find((step) => step['Index Name'] === 'kits_welcome_due')?.['Actual Rows']
    expect(await welcomes()).toBe(due / 4)
    await planPrompts(deps)
    deps.clock.advance(3_600_000)
    await sendDueTexts(deps)
    await deps.store.keepHouse()
    expect(await welcomes()).toBe(0)
  })

  test('is each thing once, of all four kinds', async () => {
    const rows = await listDue(deps.store.db, horizon, 2000)
    const kinds = rows.map(({ kind }) => kind)
    expect(rows).toHaveLength(due)
    for (const kind of ['wash', 'flow check', 'change', 'welcome'])
      expect(kinds.filter((one) => one === kind)).toHaveLength(due / 4)
    await planPrompts(deps)
    expect(await listDue(deps.store.db, horizon, 2000)).toEqual([])
  })

  test('leaves out a kit that is no longer in use', async () => {
    await deps.store.db.update(kits).set({ state: 'retired' })
    expect(await listDue(deps.store.db, horizon, 2000)).toEqual([])
  })
})
