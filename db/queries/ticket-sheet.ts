import { and, asc, desc, eq, inArray, isNotNull, isNull } from 'drizzle-orm'
import type { Handle } from '../client'
import { staff } from '../schema/staff'
import { texts } from '../schema/text'
import { tickets } from '../schema/ticket'

export async function findTicket(db: Handle, ticketId: string) {
  const [row] = await db.select().from(tickets).where(eq(tickets.id, ticketId))
  return row ?? null
}

/** Names of these people, whether or not they still sign in. */
export async function listStaffNames(db: Handle, staffIds: string[]) {
  if (staffIds.length === 0) return []
  return db
    .select({ id: staff.id, name: staff.name })
    .from(staff)
    .where(inArray(staff.id, staffIds))
}

const mostColleagues = 100

/** Who can work on tickets, by name. */
export async function listTicketWorkers(db: Handle) {
  return db
    .select({ id: staff.id, name: staff.name, languages: staff.languages })
    .from(staff)
    .where(and(inArray(staff.role, ['agent', 'coordinator']), isNull(staff.disabledAt)))
    .orderBy(asc(staff.name), asc(staff.id))
    .limit(mostColleagues)
}

/** The last step that went to the household for a ticket, with how far it has come. */
export async function findLastStepText(db: Handle, ticketId: string) {
  const [row] = await db
    .select()
    .from(texts)
    .where(and(eq(texts.ticketId, ticketId), eq(texts.direction, 'out'), isNotNull(texts.stepId)))
    .orderBy(desc(texts.n))
    .limit(1)
  return row ?? null
}

/** The last words that came in for a ticket. */
export async function findLastWords(db: Handle, ticketId: string) {
  const [row] = await db
    .select({ body: texts.body })
    .from(texts)
    .where(and(eq(texts.ticketId, ticketId), eq(texts.direction, 'in')))
    .orderBy(desc(texts.n))
    .limit(1)
  return row?.body ?? null
}
