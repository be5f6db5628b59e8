import { and, asc, desc, eq, gt, inArray, isNotNull, isNull, ne, notExists } from 'drizzle-orm'
import type { Handle } from '../client'
import { households } from '../schema/household'
import { ticketEvents, tickets, walks } from '../schema/ticket'

export type TicketRow = typeof tickets.$inferSelect

export async function findOpenTicket(db: Handle, kitId: string) {
  const [row] = await db
    .select()
    .from(tickets)
    .where(and(eq(tickets.kitId, kitId), isNull(tickets.endedAt)))
    .for('update')
  return row ?? null
}

export async function findTicketForUpdate(db: Handle, ticketId: string) {
  const [row] = await db.select().from(tickets).where(eq(tickets.id, ticketId)).for('update')
  return row ?? null
}

export async function listTicketEvents(db: Handle, ticketId: string) {
  return db
    .select()
    .from(ticketEvents)
    .where(eq(ticketEvents.ticketId, ticketId))
    .orderBy(asc(ticketEvents.n))
}

/** A new ticket; null when the kit has an open one already. */
export async function insertTicket(db: Handle, row: typeof tickets.$inferInsert) {
  const [made] = await db.insert(tickets).values(row).onConflictDoNothing().returning()
  return made ?? null
}

export async function insertTicketEvent(db: Handle, row: typeof ticketEvents.$inferInsert) {
  await db.insert(ticketEvents).values(row)
}

export async function updateTicket(
  db: Handle,
  ticketId: string,
  change: Partial<typeof tickets.$inferInsert>,
) {
  await db.update(tickets).set(change).where(eq(tickets.id, ticketId))
}

export async function upsertWalk(db: Handle, row: typeof walks.$inferInsert) {
  await db
    .insert(walks)
    .values(row)
    .onConflictDoUpdate({
      target: walks.ticketId,
      set: { walk: row.walk, changedAt: row.changedAt },
    })
}

/** When other houses of an area told of illness, newest first. */
export async function listIllnessInArea(db: Handle, areaId: string, butHouseholdId: string) {
  const rows = await db
    .select({ at: tickets.openedAt })
    .from(tickets)
    .innerJoin(households, eq(households.id, tickets.householdId))
    .where(
      and(
        eq(households.areaId, areaId),
        ne(tickets.householdId, butHouseholdId),
        inArray(tickets.trouble, ['unwell', 'danger sign']),
      ),
    )
    .orderBy(desc(tickets.openedAt))
    .limit(20)
  return rows.map(({ at }) => at)
}

/** Open tickets that wait for an answer to a step and of which nothing was heard since. */
export async function listUnansweredTickets(
  db: Handle,
  { since, limit }: { since: number; limit: number },
) {
  const heard = db
    .select({ n: ticketEvents.n })
    .from(ticketEvents)
    .where(and(eq(ticketEvents.ticketId, tickets.id), gt(ticketEvents.at, since)))
  return db
    .select({ id: tickets.id })
    .from(tickets)
    .where(and(isNull(tickets.endedAt), isNotNull(tickets.waitingFor), notExists(heard)))
    .orderBy(asc(tickets.openedAt), asc(tickets.id))
    .limit(limit)
}
