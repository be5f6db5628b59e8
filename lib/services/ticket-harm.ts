import type { KitFacts } from '@/db/queries/kit-facts'
import type { TicketRow } from '@/db/queries/ticket-events'
import { harmOf, type Harm } from '@/lib/domain/harm'
import type { Language } from '@/lib/domain/language'
import { dailyNeed, enough, type NeedSettings } from '@/lib/domain/need'

type Reading = {
  at: number
  fibreFittingId: string
  litresPerHour: number
  normalised: number
  errorShare: number
}

/** A figure that came with the complaint is a moment older than the ticket, in milliseconds. */
const figureMargin = 60_000

/** True for a reading that tells of the filter as it is now: of this trouble, and of the fibre that stands. */
export function isOfNow(
  reading: Pick<Reading, 'at' | 'fibreFittingId'>,
  { openedAt, fibreFittingId }: { openedAt: number; fibreFittingId: string | undefined },
): boolean {
  return reading.at >= openedAt - figureMargin && reading.fibreFittingId === fibreFittingId
}

export type TicketHarm = Harm & { need: 'enough' | 'slow' | 'short' | null; hours: number | null }

/** Where an open ticket stands in the shift, by what is known of its household and its last flow. */
export function ticketHarm(
  held: {
    ticket: TicketRow
    kit: Pick<KitFacts['kit'], 'state'>
    household: KitFacts['household']
    timeZone: string
    /** The last reading of now. */
    reading: Reading | null
    toldToGo: boolean
  },
  { now, need: settings, language }: { now: number; need: NeedSettings; language: Language },
): TicketHarm {
  const { ticket, household, reading } = held
  const litresPerDay = dailyNeed({ people: household.people, ...settings })
  const given =
    reading && enough({ litresPerHour: reading.litresPerHour, litresPerDay, ...settings })
  const need = given?.kind ?? null
  const hours = given?.hours ?? null
  const harm = harmOf({
    trouble: ticket.trouble,
    house: household,
    outOfService: held.kit.state === 'out of service',
    noSafeWaterSince: ticket.noSafeWaterSince,
    need,
    litresPerHour: reading?.normalised ?? null,
    errorLitresPerHour: reading && reading.normalised * reading.errorShare,
    litresPerDay,
    hours,
    openedAt: ticket.openedAt,
    now,
    timeZone: held.timeZone,
    toldToGo: held.toldToGo,
    language,
  })
  return { ...harm, need, hours }
}
