import type { Transaction } from '@/db/client'
import {
  findFirstReading,
  insertReading,
  listOpenFittings,
  type KitFacts,
} from '@/db/queries/kit-facts'
import type { Deps } from '@/lib/deps'
import {
  flowErrorShare,
  litresPerHour,
  normalisedFlow,
  recovery,
  type Recovery,
} from '@/lib/domain/flow'
import { dailyNeed, enough, type Enough } from '@/lib/domain/need'
import { areaCelsius } from './area-celsius'
import { replanWash } from './plan-wash'
import { settingsNow } from './settings-now'

export type FlowVerdict = {
  recovery: Recovery
  need: Enough
  litresPerHour: number
  /** Litres per hour at 20 °C and full head. */
  normalised: number
  celsius: number
  celsiusFrom: 'told' | 'area month'
}

/**
 * Keeps a bottle-fill time as a flow reading and sets it against the first reading of the fibre fitting
 * and the family's need; the next wash follows the trend. `minutes` is for the model's bottle. A text gives
 * one reading, however often read.
 */
export async function recordFlow(
  tx: Transaction,
  deps: Deps,
  reading: {
    facts: KitFacts
    minutes: number
    known: 'said' | 'measured' | 'seen'
    textId?: string
    ticketId?: string
    celsius?: number
  },
): Promise<FlowVerdict> {
  const now = deps.clock.now()
  const { kit, model, household, area } = reading.facts
  const fibre = (await listOpenFittings(tx, kit.id)).find((row) => row.stage.kind === 'fibre')
  if (!fibre) throw new Error(`Kit ${kit.id} has no fibre fitting to hold a flow reading against.`)
  const celsius = reading.celsius ?? areaCelsius(area, now)
  const celsiusFrom = reading.celsius === undefined ? 'area month' : 'told'
  const bottle = { litres: model.bottleLitres, seconds: reading.minutes * 60 }
  const normalised = normalisedFlow({ ...bottle, celsius, headRatio: 1 })
  const { flow, need } = await settingsNow(tx)
  const first = await findFirstReading(tx, fibre.fitting.id)
  await insertReading(tx, {
    kitId: kit.id,
    fibreFittingId: fibre.fitting.id,
    ticketId: reading.ticketId,
    textId: reading.textId,
    ...bottle,
    celsius,
    celsiusFrom,
    litresPerHour: litresPerHour(bottle),
    normalised,
    errorShare: flowErrorShare(flow),
    known: reading.known,
    at: now,
  })
  await replanWash(tx, deps, kit.id)
  return {
    recovery: recovery({
      flow: normalised,
      first: first?.normalised ?? null,
      nominal: model.nominalLitresPerHour,
      settings: flow,
    }),
    need: enough({
      litresPerHour: litresPerHour(bottle),
      litresPerDay: dailyNeed({ people: household.people, ...need }),
      ...need,
    }),
    litresPerHour: litresPerHour(bottle),
    normalised,
    celsius,
    celsiusFrom,
  }
}
