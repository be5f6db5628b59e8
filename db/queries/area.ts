import { asc, count, eq } from 'drizzle-orm'
import type { Handle } from '../client'
import { areas, depots } from '../schema/area'
import { households } from '../schema/household'

export type AreaRow = typeof areas.$inferSelect

export async function listAreaRows(db: Handle) {
  return db
    .select({ area: areas, depotName: depots.name, households: count(households.id) })
    .from(areas)
    .innerJoin(depots, eq(depots.id, areas.depotId))
    .leftJoin(households, eq(households.areaId, areas.id))
    .groupBy(areas.id, depots.name)
    .orderBy(asc(areas.name))
}

export async function findArea(db: Handle, areaId: string) {
  const [row] = await db.select().from(areas).where(eq(areas.id, areaId))
  return row ?? null
}

/** A new area; null when another has its name. */
export async function insertArea(db: Handle, row: typeof areas.$inferInsert) {
  const [made] = await db.insert(areas).values(row).onConflictDoNothing().returning()
  return made ?? null
}

export async function findAreaByName(db: Handle, name: string) {
  const [row] = await db.select().from(areas).where(eq(areas.name, name))
  return row ?? null
}

export async function updateArea(
  db: Handle,
  areaId: string,
  change: Partial<typeof areas.$inferInsert>,
) {
  await db.update(areas).set(change).where(eq(areas.id, areaId))
}
