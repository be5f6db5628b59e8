import type { Handle } from '@/db/client'
import { listDepotRows, listInHand } from '@/db/queries/depot'
import { listLastReadings, listOpenFittingsOfKits } from '@/db/queries/kit'
import {
  listDueVisits,
  listHandedOn,
  listLastTexts,
  listOpenTickets,
  listPromisesOfKits,
  listTextsOfMoments,
  listWalkCounts,
} from '@/db/queries/shift'
import { fixedMoments } from '@/lib/domain/fixed-texts'
import { settingsNow } from './settings-now'

/** More open tickets than this are more than a shift can read: the worst are on the page. */
const MOST = 500

function byKey<T>(rows: readonly T[], keyOf: (row: T) => string | null): Map<string, T> {
  return new Map(rows.flatMap((row) => (keyOf(row) === null ? [] : [[String(keyOf(row)), row]])))
}

function groups<T>(rows: readonly T[], keyOf: (row: T) => string | null): Map<string, T[]> {
  const grouped = new Map<string, T[]>()
  for (const row of rows) {
    const key = keyOf(row) ?? ''
    grouped.set(key, [...(grouped.get(key) ?? []), row])
  }
  return grouped
}

/** All that the shift's rows are made of, in a fixed number of queries however many tickets are open. */
export async function shiftFacts(db: Handle) {
  const found = await listOpenTickets(db, MOST + 1)
  const open = found.slice(0, MOST)
  const ticketIds = open.map(({ ticket }) => ticket.id)
  const kitIds = open.map(({ kit }) => kit.id)
  const householdIds = open.map(({ household }) => household.id)
  return {
    open,
    cut: found.length > MOST,
    fittings: groups(await listOpenFittingsOfKits(db, kitIds), ({ kitId }) => kitId),
    readings: byKey(await listLastReadings(db, kitIds), ({ kitId }) => kitId),
    lastIn: byKey(await listLastTexts(db, householdIds, 'in'), (row) => row.householdId),
    lastOut: byKey(await listLastTexts(db, householdIds, 'out'), (row) => row.householdId),
    walks: byKey(await listWalkCounts(db, ticketIds), ({ ticketId }) => ticketId),
    holders: byKey(await listHandedOn(db, ticketIds), ({ ticketId }) => ticketId),
    fixed: groups(
      await listTextsOfMoments(db, ticketIds, [...fixedMoments]),
      ({ ticketId }) => ticketId,
    ),
    promises: byKey(await listPromisesOfKits(db, kitIds), ({ kitId }) => kitId),
    visits: byKey(await listDueVisits(db, householdIds), (row) => row.householdId),
    depots: byKey(await listDepotRows(db), ({ id }) => id),
    inHand: await listInHand(db),
    settings: await settingsNow(db),
  }
}

export type ShiftFacts = Awaited<ReturnType<typeof shiftFacts>>
