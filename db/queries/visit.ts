import { and, eq } from 'drizzle-orm'
import type { Handle } from '../client'
import { visits } from '../schema/visit'

/** A visit; null when the household has one due already. */
export async function insertVisit(db: Handle, row: typeof visits.$inferInsert) {
  const [made] = await db.insert(visits).values(row).onConflictDoNothing().returning()
  return made ?? null
}

export async function findDueVisit(db: Handle, householdId: string) {
  const [row] = await db
    .select()
    .from(visits)
    .where(and(eq(visits.householdId, householdId), eq(visits.state, 'due')))
  return row ?? null
}

export async function endVisit(
  db: Handle,
  visitId: string,
  { note, endedAt }: { note: string; endedAt: number },
) {
  await db.update(visits).set({ state: 'done', note, endedAt }).where(eq(visits.id, visitId))
}

/** Withdraws what is still due for a ticket that has ended. */
export async function withdrawVisits(db: Handle, ticketId: string, endedAt: number) {
  await db
    .update(visits)
    .set({ state: 'withdrawn', endedAt })
    .where(and(eq(visits.ticketId, ticketId), eq(visits.state, 'due')))
}
