import { sql } from 'drizzle-orm'
import { openPglite } from '@/db/client'
import { startQueue } from '@/jobs/boss'
import { planPrompts } from '@/lib/services/plan-prompts'
import { depsOn, type TestDeps } from '../factories/deps'
import { manyKits } from '../factories/many-kits'
import { world } from '../factories/world'

/*
 * `npm run bench [kits] [due] [rounds]`: does planning cost what is due, or what there is? Two desks in
 * memory with the same number of due kits, one with ten times as many kits in all, plan by turns in this one
 * process. Only the ratio says something: the times are this machine's, and nothing is asserted.
 */

const [kits = 2000, due = 200, rounds = 7] = process.argv.slice(2).map(Number)
const today = '2026-03-02'
const quiet = { error: () => undefined }

type Desk = { kits: number; deps: TestDeps; first: number[]; again: number[] }

async function openDesk(kitsInAll: number): Promise<Desk> {
  const store = await openPglite()
  await store.migrate()
  const deps = depsOn(store, await startQueue(store, quiet, false), `${today}T07:00:00Z`)
  await manyKits(deps, await world(deps), { kits: kitsInAll, due, today })
  return { kits: kitsInAll, deps, first: [], again: [] }
}

async function timed(work: () => Promise<unknown>): Promise<number> {
  const begun = performance.now()
  await work()
  return performance.now() - begun
}

/** Plans all that is due, sweeps once more over what is planned by then, and takes it all back. */
async function round({ deps }: Desk) {
  let planned = 0
  const first = await timed(async () => (planned = (await planPrompts(deps)).planned))
  if (planned !== due) throw new Error(`${planned} were planned, not ${due}.`)
  const again = await timed(() => planPrompts(deps))
  const { db } = deps.store
  await db.execute(sql`delete from prompts where state = 'planned'`)
  await db.execute(sql`delete from texts where state = 'queued'`)
  await db.execute(sql`delete from pgboss.job`)
  await deps.store.keepHouse()
  return { first, again }
}

function middle(times: readonly number[]): number {
  const sorted = [...times].sort((one, other) => one - other)
  return sorted[Math.floor(sorted.length / 2)] ?? Number.NaN
}

function line(words: string, few: readonly number[], many: readonly number[]) {
  const ratios = few.map((time, index) => (many[index] ?? Number.NaN) / time)
  const cells = [middle(few), middle(many)].map((time) => `${time.toFixed(1)} ms`.padStart(14))
  const [low, high] = [Math.min(...ratios), Math.max(...ratios)].map((ratio) => ratio.toFixed(2))
  return `${words.padEnd(28)}${cells.join('')}${middle(ratios).toFixed(2).padStart(9)}  (${low} to ${high})`
}

const desks = [await openDesk(kits), await openDesk(kits * 10)] as const
for (const desk of desks) await round(desk)
for (let turn = 0; turn < rounds; turn += 1) {
  for (const desk of turn % 2 === 0 ? desks : desks.toReversed()) {
    const { first, again } = await round(desk)
    desk.first.push(first)
    desk.again.push(again)
  }
}

const [few, many] = desks
const heads = desks.map((desk) => `${desk.kits.toLocaleString('en')} kits`.padStart(14))
console.log(`${due} due in each; middle of ${rounds} rounds, by turns\n`)
console.log(`${''.padEnd(28)}${heads.join('')}    ratio`)
console.log(line('planning what is due', few.first, many.first))
console.log(line('a sweep with nothing new', few.again, many.again))
for (const { deps } of desks) {
  await deps.queue.stop()
  await deps.store.close()
}
