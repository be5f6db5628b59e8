import { setImmediate } from 'node:timers/promises'
import { listKitsAhead } from '@/db/queries/kit-ahead'
import type { Deps } from '@/lib/deps'
import type { Language } from '@/lib/domain/language'
import {
  emptyPlan,
  planAhead,
  type Cycles,
  type DayAhead,
  type WhatIf,
} from '@/lib/domain/round-ahead'
import { bothPlans } from '@/lib/domain/round-load'

const PAGE = 500
/** A year of this many kits takes a few seconds and holds nobody else up, page by page. */
const MOST_KITS = 20_000

export type PlansAhead = {
  /** Day by day, with the cycles that stand and with the others. */
  today: DayAhead[]
  other: DayAhead[]
  kits: number
  /** Of these, how many households that texts reach read each language. */
  readers: Map<Language, number>
  cut: boolean
}

/** Both plans over all kits in use, page by page, so that a long read does not hold the desk. */
export async function plansAhead(
  deps: Deps,
  { from, days, cycles, whatIf }: { from: string; days: number; cycles: Cycles; whatIf: WhatIf },
  mostKits = MOST_KITS,
): Promise<PlansAhead> {
  const found: PlansAhead = {
    today: emptyPlan(from, days),
    other: emptyPlan(from, days),
    kits: 0,
    readers: new Map(),
    cut: false,
  }
  for (let after = 0; ;) {
    // One more than wanted, on the last page, tells whether there are more.
    const limit = Math.min(PAGE, mostKits - found.kits + 1)
    const page = await listKitsAhead(deps.store.db, { after, limit })
    const kits = page.slice(0, mostKits - found.kits)
    found.today = bothPlans(found.today, planAhead({ kits, from, days, cycles }))
    found.other = bothPlans(found.other, planAhead({ kits, from, days, cycles, whatIf }))
    found.kits += kits.length
    for (const { language } of kits.filter(({ texted }) => texted))
      found.readers.set(language, (found.readers.get(language) ?? 0) + 1)
    found.cut = kits.length < page.length
    const last = page.at(-1)
    if (found.cut || page.length < limit || !last) return found
    after = last.number
    // The embedded database answers without giving way: whoever waits for the desk goes first.
    await setImmediate()
  }
}
