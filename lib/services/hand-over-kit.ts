import { TZDate } from '@date-fns/tz'
import type { Transaction } from '@/db/client'
import type { AreaRow } from '@/db/queries/area'
import { insertFirstFittings, insertKit } from '@/db/queries/kit'
import { insertReading } from '@/db/queries/kit-facts'
import { type findKitModel, listModelStages } from '@/db/queries/reference'
import { nextChangeOn, planWash, type SourceClass } from '@/lib/domain/cycle'
import { addDays, monthOf } from '@/lib/domain/day'
import { flowErrorShare, litresPerHour, normalisedFlow } from '@/lib/domain/flow'
import { localDay } from '@/lib/domain/round'
import type { HouseholdInput } from '@/lib/schemas/household-entry'
import { settingsNow } from './settings-now'

type HandOver = {
  household: { id: string; sourceClass: SourceClass }
  area: AreaRow
  model: NonNullable<Awaited<ReturnType<typeof findKitModel>>>
  handedOverOn: string
  reading: HouseholdInput['reading']
  now: number
}

/** Noon of a local day: a hand-over has a day but no hour. Never later than now. */
function noonOf(day: string, timeZone: string, now: number): number {
  const [year = 0, month = 1, date = 1] = day.split('-').map(Number)
  return Math.min(now, new TZDate(year, month - 1, date, 12, timeZone).getTime())
}

async function keepFirstReading(
  tx: Transaction,
  {
    handOver,
    kitId,
    fibreFittingId,
  }: { handOver: HandOver; kitId: string; fibreFittingId: string },
) {
  const { area, model, reading, handedOverOn, now } = handOver
  if (!reading) return
  const celsius = reading.celsius ?? area.monthCelsius[monthOf(handedOverOn) - 1] ?? 20
  const bottle = { litres: model.bottleLitres, seconds: reading.minutes * 60 }
  await insertReading(tx, {
    kitId,
    fibreFittingId,
    ...bottle,
    celsius,
    celsiusFrom: reading.celsius === null ? 'area month' : 'told',
    litresPerHour: litresPerHour(bottle),
    normalised: normalisedFlow({ ...bottle, celsius, headRatio: 1 }),
    errorShare: flowErrorShare((await settingsNow(tx)).flow),
    known: 'measured',
    at: noonOf(handedOverOn, area.timeZone, now),
  })
}

/** A kit in a household's hands: every stage fitted that day, its cycles begun, its first flow kept. */
export async function handOverKit(tx: Transaction, handOver: HandOver) {
  const { household, area, model, handedOverOn, now } = handOver
  const settings = await settingsNow(tx)
  const kit = await insertKit(tx, {
    householdId: household.id,
    modelId: model.id,
    handedOverOn,
    lastWashOn: handedOverOn,
    washCountedFrom: handedOverOn,
    ...planWash({
      countedFrom: handedOverOn,
      today: localDay(now, area.timeZone),
      // One reading at most: there is no trend yet.
      shortOn: null,
      sourceClass: household.sourceClass,
      wetMonths: area.wetMonths,
      settings: settings.wash,
    }),
    nextFlowCheckOn: addDays(handedOverOn, settings.wash.flowCheckDays),
    welcomeDueOn: handedOverOn,
    createdAt: now,
  })
  const stages = await listModelStages(tx, model.id)
  const fitted = await insertFirstFittings(
    tx,
    stages.map(({ position, partId, changeMonths }) => ({
      kitId: kit.id,
      position,
      partId,
      fittedOn: handedOverOn,
      dueOn: nextChangeOn({ fittedOn: handedOverOn, changeMonths }),
      createdAt: now,
    })),
  )
  const fibre = stages.find(({ kind }) => kind === 'fibre')
  const fibreFittingId = fitted.find(({ position }) => position === fibre?.position)?.id
  if (!fibreFittingId) throw new Error(`The kit model ${model.name} has no fibre stage.`)
  await keepFirstReading(tx, { handOver, kitId: kit.id, fibreFittingId })
  return kit
}
