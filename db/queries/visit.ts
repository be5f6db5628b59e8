import { and, asc, eq, isNull, or } from 'drizzle-orm'
import type { Handle } from '../client'
import { areas } from '../schema/area'
import { households } from '../schema/household'
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

/** What a visitor has to do, earliest first: visits given to them, and those given to nobody yet. */
export async function listDueVisits(db: Handle, visitorId: string) {
  return db
    .select({
      id: visits.id,
      visitorId: visits.visitorId,
      dueOn: visits.dueOn,
      why: visits.why,
      household: households.name,
      area: areas.name,
      place: households.place,
      language: households.language,
    })
    .from(visits)
    .innerJoin(households, eq(households.id, visits.householdId))
    .innerJoin(areas, eq(areas.id, households.areaId))
    .where(
      and(eq(visits.state, 'due'), or(eq(visits.visitorId, visitorId), isNull(visits.visitorId))),
    )
    .orderBy(asc(visits.dueOn), asc(households.name))
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
