import type { Handle } from '@/db/client'
import { listPhonesOfHouseholds, listSharers } from '@/db/queries/household'
import {
  findFirstReading,
  findKitFacts,
  findLastReading,
  listOpenFittings,
} from '@/db/queries/kit-facts'
import { findOpenPromise } from '@/db/queries/promise'
import { listTextsOfMoments } from '@/db/queries/shift'
import { listTicketEvents } from '@/db/queries/ticket-events'
import {
  findLastStepText,
  findLastWords,
  findTicket,
  listStaffNames,
} from '@/db/queries/ticket-sheet'
import { findDueVisit } from '@/db/queries/wording-values'
import { fixedMoments } from '@/lib/domain/fixed-texts'
import { localDay } from '@/lib/domain/round'
import { fold } from '@/lib/domain/ticket'
import { settingsNow } from './settings-now'
import { isOfNow } from './ticket-harm'

type Event = Awaited<ReturnType<typeof listTicketEvents>>[number]

function staffIn(events: readonly Event[]): string[] {
  const ids = events.flatMap(({ staffId, event }) =>
    'staffId' in event ? [staffId, event.staffId] : [staffId],
  )
  return [...new Set(ids.filter((id) => id !== null))]
}

async function readingNow(
  db: Handle,
  { kitId, openedAt, fibreFittingId }: { kitId: string; openedAt: number; fibreFittingId?: string },
) {
  const last = await findLastReading(db, kitId)
  if (!last || !isOfNow(last, { openedAt, fibreFittingId })) return null
  const first = await findFirstReading(db, last.fibreFittingId)
  return { ...last, first: first && first.n !== last.n ? first.normalised : null }
}

async function peopleOf(db: Handle, householdId: string) {
  const phones = await listPhonesOfHouseholds(db, [householdId])
  const phoneIds = phones.map(({ phone }) => phone.id)
  return { phones, sharers: await listSharers(db, phoneIds, householdId) }
}

/** All that is known of a ticket; null where there is none of that id. */
export async function ticketFacts(db: Handle, ticketId: string, now: number) {
  const ticket = await findTicket(db, ticketId)
  const facts = ticket && (await findKitFacts(db, ticket.kitId))
  if (!ticket || !facts) return null
  const events = await listTicketEvents(db, ticketId)
  const state = fold(events)
  if (!state) return null
  const fittings = await listOpenFittings(db, facts.kit.id)
  const fibre = fittings.find(({ stage }) => stage.kind === 'fibre')
  const names = await listStaffNames(db, staffIn(events))
  return {
    ticket,
    state,
    ...facts,
    fittings,
    reading: await readingNow(db, {
      kitId: facts.kit.id,
      openedAt: ticket.openedAt,
      fibreFittingId: fibre?.fitting.id,
    }),
    events,
    nameOf: (id: string) => names.find((one) => one.id === id)?.name ?? 'somebody',
    ...(await peopleOf(db, facts.household.id)),
    promise: await findOpenPromise(db, facts.kit.id),
    visit: await findDueVisit(db, facts.household.id),
    fixed: await listTextsOfMoments(db, [ticketId], [...fixedMoments]),
    lastStep: await findLastStepText(db, ticketId),
    words: await findLastWords(db, ticketId),
    settings: await settingsNow(db),
    now,
    today: localDay(now, facts.area.timeZone),
  }
}

export type TicketFacts = NonNullable<Awaited<ReturnType<typeof ticketFacts>>>
