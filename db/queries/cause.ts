import { and, asc, count, eq, gte, inArray, isNotNull, sql } from 'drizzle-orm'
import type { CountedTrouble } from '@/lib/domain/walk-history'
import type { Handle } from '../client'
import { areas } from '../schema/area'
import { households } from '../schema/household'
import { tickets } from '../schema/ticket'

/** Whether a ticket was opened in a wet month of its area, by the area's own calendar. */
const openedWet = sql<boolean>`(extract(month from ${tickets.openedAt} at time zone ${areas.timeZone})::integer = any (${areas.wetMonths}))`

function closedFlowing(db: Handle) {
  return db
    .select({
      areaId: areas.id,
      area: areas.name,
      wet: openedWet,
      trouble: tickets.trouble,
      cause: sql<string>`${tickets.cause}`,
      tickets: count(),
    })
    .from(tickets)
    .innerJoin(households, eq(households.id, tickets.householdId))
    .innerJoin(areas, eq(areas.id, households.areaId))
}

const groups = [areas.id, areas.name, openedWet, tickets.trouble, tickets.cause]

type Sought = { since: number; troubles: readonly CountedTrouble[]; areaId?: string; wet?: boolean }

/**
 * How many tickets closed as flowing since an instant had which cause, by area, season and trouble: of one
 * area and season, or of all. A row a cause: as many as there are areas and causes, however many tickets.
 */
export async function countClosedCauses(db: Handle, { since, troubles, areaId, wet }: Sought) {
  return closedFlowing(db)
    .where(
      and(
        eq(tickets.stage, 'flowing'),
        gte(tickets.endedAt, since),
        inArray(tickets.trouble, [...troubles]),
        isNotNull(tickets.cause),
        areaId === undefined ? undefined : eq(areas.id, areaId),
        wet === undefined ? undefined : eq(openedWet, wet),
      ),
    )
    .groupBy(...groups)
    .orderBy(asc(areas.name), asc(areas.id), openedWet, tickets.trouble, tickets.cause)
}
