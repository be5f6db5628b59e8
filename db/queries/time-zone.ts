import { asc, count, desc, eq } from 'drizzle-orm'
import type { Handle } from '../client'
import { areas } from '../schema/area'
import { households } from '../schema/household'

/** The zones of the areas, the one with most households first; empty on a desk without areas. */
export async function listTimeZones(db: Handle): Promise<string[]> {
  const rows = await db
    .select({ timeZone: areas.timeZone })
    .from(areas)
    .leftJoin(households, eq(households.areaId, areas.id))
    .groupBy(areas.timeZone)
    .orderBy(desc(count(households.id)), asc(areas.timeZone))
  return rows.map(({ timeZone }) => timeZone)
}
