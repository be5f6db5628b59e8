import { and, count, desc, eq, gte, inArray, isNull, sql } from 'drizzle-orm'
import type { Handle } from '../client'
import { areas } from '../schema/area'
import { households } from '../schema/household'
import { kits } from '../schema/kit'
import { partPromises } from '../schema/promise'
import { staff } from '../schema/staff'
import { texts } from '../schema/text'
import { ticketEvents, tickets, walks } from '../schema/ticket'
import { visits } from '../schema/visit'

const worstFirst = sql`array_position(array['danger sign', 'unwell', 'unsafe', 'no flow', 'slow', 'unread', 'silent'], ${tickets.trouble})`

/** Open tickets with whom they concern and who has them: the gravest troubles first, then the oldest. */
export async function listOpenTickets(db: Handle, limit: number) {
  return db
    .select({ ticket: tickets, kit: kits, household: households, area: areas, holder: staff.name })
    .from(tickets)
    .innerJoin(kits, eq(kits.id, tickets.kitId))
    .innerJoin(households, eq(households.id, tickets.householdId))
    .innerJoin(areas, eq(areas.id, households.areaId))
    .leftJoin(staff, eq(staff.id, tickets.takenBy))
    .where(isNull(tickets.endedAt))
    .orderBy(worstFirst, tickets.openedAt, tickets.id)
    .limit(limit)
}

export type OpenTicket = Awaited<ReturnType<typeof listOpenTickets>>[number]

function lastOf(db: Handle, direction: 'in' | 'out') {
  return db
    .select({ body: texts.body, state: texts.state, language: texts.language })
    .from(texts)
    .where(and(eq(texts.householdId, households.id), eq(texts.direction, direction)))
    .orderBy(desc(texts.n))
    .limit(1)
    .as(`last_${direction}`)
}

/** The last text of one direction with each of these households. */
export async function listLastTexts(db: Handle, householdIds: string[], direction: 'in' | 'out') {
  if (householdIds.length === 0) return []
  const last = lastOf(db, direction)
  return db
    .select({ householdId: households.id, body: last.body, state: last.state })
    .from(households)
    .innerJoinLateral(last, sql`true`)
    .where(inArray(households.id, householdIds))
}

/** How the walks of these tickets stand: answers so far, washes among them. */
export async function listWalkCounts(db: Handle, ticketIds: string[]) {
  if (ticketIds.length === 0) return []
  const washes = sql<number>`jsonb_array_length(jsonb_path_query_array(${walks.walk}, '$.tried[*] ? (@.stepId == "wash-fibre")'))`
  return db
    .select({
      ticketId: walks.ticketId,
      tried: sql<number>`jsonb_array_length(${walks.walk} -> 'tried')`,
      washes,
    })
    .from(walks)
    .where(inArray(walks.ticketId, ticketIds))
}

/** Those of these tickets whose present holder was given it by a colleague. */
export async function listHandedOn(db: Handle, ticketIds: string[]) {
  if (ticketIds.length === 0) return []
  return db
    .selectDistinctOn([ticketEvents.ticketId], {
      ticketId: ticketEvents.ticketId,
      kind: ticketEvents.kind,
    })
    .from(ticketEvents)
    .where(
      and(
        inArray(ticketEvents.ticketId, ticketIds),
        inArray(ticketEvents.kind, ['taken', 'handed on']),
      ),
    )
    .orderBy(ticketEvents.ticketId, desc(ticketEvents.n))
}

/** Texts of these moments that went for these tickets, oldest first. */
export async function listTextsOfMoments(db: Handle, ticketIds: string[], moments: string[]) {
  if (ticketIds.length === 0) return []
  return db
    .select({
      ticketId: texts.ticketId,
      moment: texts.moment,
      state: texts.state,
      stateWhy: texts.stateWhy,
      at: sql<number>`coalesce(${texts.sentAt}, ${texts.createdAt})`.mapWith(texts.createdAt),
    })
    .from(texts)
    .where(and(inArray(texts.ticketId, ticketIds), inArray(texts.moment, moments)))
    .orderBy(texts.n)
}

/** Parts that are owed to these kits. */
export async function listPromisesOfKits(db: Handle, kitIds: string[]) {
  if (kitIds.length === 0) return []
  return db
    .select()
    .from(partPromises)
    .where(and(inArray(partPromises.kitId, kitIds), eq(partPromises.state, 'promised')))
}

export async function listDueVisits(db: Handle, householdIds: string[]) {
  if (householdIds.length === 0) return []
  return db
    .select()
    .from(visits)
    .where(and(inArray(visits.householdId, householdIds), eq(visits.state, 'due')))
}

/** What came of the day since an instant: brought back to flowing, promised, booked. */
export async function countSince(db: Handle, since: number) {
  const [flowing] = await db
    .select({ n: count() })
    .from(tickets)
    .where(and(eq(tickets.stage, 'flowing'), gte(tickets.endedAt, since)))
  const [parts] = await db
    .select({ n: count() })
    .from(partPromises)
    .where(gte(partPromises.promisedAt, since))
  const [booked] = await db.select({ n: count() }).from(visits).where(gte(visits.createdAt, since))
  return { flowing: flowing?.n ?? 0, parts: parts?.n ?? 0, visits: booked?.n ?? 0 }
}
