import type { Handle } from '@/db/client'
import {
  listFittings,
  listPromptsOfKit,
  listReadings,
  listTicketsOfKit,
  listWashes,
  type listKitsOfHousehold,
} from '@/db/queries/kit'
import { asAtReference, trend } from '@/lib/domain/flow'
import { forecastWords } from '@/lib/domain/forecast-words'
import { kitPast, kitPlan } from '@/lib/domain/kit-life'
import { neededLitresPerHour } from '@/lib/domain/need'
import { localDay } from '@/lib/domain/round'
import type { Settings } from '@/lib/domain/settings'
import type { KitView } from '@/lib/schemas/household'
import { kitLook } from './kit-look'

type KitRow = Awaited<ReturnType<typeof listKitsOfHousehold>>[number]
type Around = KitRow & {
  timeZone: string
  now: number
  today: string
  litresPerDay: number
  /** Of the water, as is usual in this month. */
  celsius: number
  settings: Settings
}

type Facts = {
  fittings: Awaited<ReturnType<typeof listFittings>>[number]['fitting'][]
  washes: Awaited<ReturnType<typeof listWashes>>
  readings: Awaited<ReturnType<typeof listReadings>>
  prompts: Awaited<ReturnType<typeof listPromptsOfKit>>
  tickets: Awaited<ReturnType<typeof listTicketsOfKit>>
}

async function factsOf(db: Handle, kitId: string): Promise<Facts> {
  return {
    fittings: (await listFittings(db, kitId)).map(({ fitting }) => fitting),
    washes: await listWashes(db, kitId),
    readings: await listReadings(db, kitId),
    prompts: await listPromptsOfKit(db, kitId),
    tickets: await listTicketsOfKit(db, kitId),
  }
}

function flowOf({ readings, washes, fittings }: Facts, around: Around): KitView['flow'] {
  const { need, flow } = around.settings
  // Readings are drawn at 20 °C: so is what the house needs of its own, colder or warmer water.
  const needLitresPerHour = asAtReference(
    neededLitresPerHour({ litresPerDay: around.litresPerDay, ...need }),
    around.celsius,
  )
  const firsts = new Map(readings.toReversed().map((one) => [one.fibreFittingId, one.n]))
  const washDays = new Set(washes.map(({ washedOn }) => washedOn))
  const points = readings.map((reading) => {
    const isFirst = firsts.get(reading.fibreFittingId) === reading.n
    return {
      at: reading.at,
      litresPerHour: reading.normalised,
      errorLitresPerHour: reading.normalised * reading.errorShare,
      afterWash: washDays.has(localDay(reading.at, around.timeZone)),
      ...(isFirst ? { note: 'first reading' } : {}),
    }
  })
  // A new fibre begins a new line; what the old one did says nothing of it.
  const standing = fittings.find(({ position, removedOn }) => position === 3 && removedOn === null)
  const current = readings.filter(({ fibreFittingId }) => fibreFittingId === standing?.id)
  const line = current.map(({ at, normalised }) => ({ takenAt: at, normalised }))
  const forecast = trend(line, needLitresPerHour, flow)
  return { points, needLitresPerHour, forecast, forecastWords: forecastWords(forecast, around) }
}

function pastOf(facts: Facts, { kit, timeZone, today }: Around) {
  const tickets = facts.tickets.map((ticket) => ({
    ...ticket,
    openedOn: localDay(ticket.openedAt, timeZone),
    endedOn: ticket.endedAt === null ? null : localDay(ticket.endedAt, timeZone),
  }))
  return kitPast({ ...facts, tickets, handedOverOn: kit.handedOverOn }, today)
}

/** One kit for its household's sheet, and its open ticket. */
export async function kitSheet(db: Handle, around: Around) {
  const { kit, model, today, litresPerDay } = around
  const facts = await factsOf(db, kit.id)
  const standing = facts.fittings.filter(({ removedOn }) => removedOn === null)
  const litresPerHour = facts.readings.at(-1)?.litresPerHour ?? null
  const open = facts.tickets.find(({ endedAt }) => endedAt === null)
  const view: KitView = {
    id: kit.id,
    number: kit.number,
    model: model.name,
    state: kit.state,
    column: kitLook({ state: kit.state, fittings: standing, litresPerHour, litresPerDay }, around),
    past: pastOf(facts, around),
    planned: kitPlan({ ...kit, fittings: standing }, today),
    flow: flowOf(facts, around),
  }
  return { view, ticket: open ? { id: open.id, words: `${open.trouble}, ${open.stage}` } : null }
}
