import type { Transaction } from '@/db/client'
import {
  findKitFacts,
  holdKit,
  listOpenFittings,
  listReadingsOfFitting,
  updateKit,
  type KitFacts,
} from '@/db/queries/kit-facts'
import { hasOpenPrompt } from '@/db/queries/prompt'
import type { Deps } from '@/lib/deps'
import { planWash, type WashPlan } from '@/lib/domain/cycle'
import { asAtReference, shortOn, trend } from '@/lib/domain/flow'
import { dailyNeed, neededLitresPerHour } from '@/lib/domain/need'
import { localDay } from '@/lib/domain/round'
import type { Settings } from '@/lib/domain/settings'
import { areaCelsius } from './area-celsius'
import { settingsNow } from './settings-now'

/** The day on which the readings since the last change of the fibre see the flow fall under the need. */
async function shortDay(
  tx: Transaction,
  { kit, household, area }: KitFacts,
  { settings: { need, flow }, now }: { settings: Settings; now: number },
): Promise<string | null> {
  const fibre = (await listOpenFittings(tx, kit.id)).find(({ stage }) => stage.kind === 'fibre')
  if (!fibre) return null
  const readings = await listReadingsOfFitting(tx, kit.id, fibre.fitting.id)
  const litresPerDay = dailyNeed({ people: household.people, ...need })
  // Readings are held at 20 °C: what the house needs of its own, colder or warmer water is put as they are.
  const needed = asAtReference(
    neededLitresPerHour({ litresPerDay, ...need }),
    areaCelsius(area, now),
  )
  return shortOn(trend(readings, needed, flow), area.timeZone)
}

/** A kit's next wash, counted from a day, as the columns that keep it. */
export async function washFrom(
  tx: Transaction,
  deps: Deps,
  { facts, countedFrom }: { facts: KitFacts; countedFrom: string },
): Promise<WashPlan & { washCountedFrom: string }> {
  const { household, area } = facts
  const settings = await settingsNow(tx)
  const plan = planWash({
    countedFrom,
    today: localDay(deps.clock.now(), area.timeZone),
    shortOn: await shortDay(tx, facts, { settings, now: deps.clock.now() }),
    sourceClass: household.sourceClass,
    wetMonths: area.wetMonths,
    settings: settings.wash,
  })
  return { ...plan, washCountedFrom: countedFrom }
}

/**
 * Plans a kit's wash anew after something it hangs on has changed: a flow reading, the people, the
 * water. A wash that is asked for already keeps its day, or it would be asked for twice.
 */
export async function replanWash(tx: Transaction, deps: Deps, kitId: string): Promise<void> {
  // Held before it is read: a wash logged at the same time would be forgotten by the plan.
  await holdKit(tx, kitId)
  if (await hasOpenPrompt(tx, kitId, 'wash')) return
  const facts = await findKitFacts(tx, kitId)
  if (!facts) return
  await updateKit(
    tx,
    kitId,
    await washFrom(tx, deps, { facts, countedFrom: facts.kit.washCountedFrom }),
  )
}
