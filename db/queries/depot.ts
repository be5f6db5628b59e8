import { asc, eq, sql } from 'drizzle-orm'
import type { Handle } from '../client'
import { areas, depots } from '../schema/area'
import { parts } from '../schema/part'
import { partPromises } from '../schema/promise'
import { stockMoves } from '../schema/stock'

export async function listDepotRows(db: Handle) {
  return db.select().from(depots).orderBy(asc(depots.name))
}

export async function findDepot(db: Handle, depotId: string) {
  const [row] = await db.select().from(depots).where(eq(depots.id, depotId))
  return row ?? null
}

/** A new depot; null when another has its name. */
export async function insertDepot(db: Handle, row: typeof depots.$inferInsert) {
  const [made] = await db.insert(depots).values(row).onConflictDoNothing().returning()
  return made ?? null
}

export async function listParts(db: Handle) {
  const order = sql`array_position(array['cloth', 'carbon', 'fibre', 'cap', 'hose'], ${parts.kind})`
  return db.select().from(parts).orderBy(order, asc(parts.name))
}

export async function listAreaNames(db: Handle) {
  return db
    .select({ depotId: areas.depotId, name: areas.name })
    .from(areas)
    .orderBy(asc(areas.name))
}

/** What each depot holds of each part: the sum of its moves. Shelves that never held any are left out. */
export async function listInHand(db: Handle) {
  return db
    .select({
      depotId: stockMoves.depotId,
      partId: stockMoves.partId,
      inHand: sql<number>`sum(${stockMoves.quantity})::int`,
    })
    .from(stockMoves)
    .groupBy(stockMoves.depotId, stockMoves.partId)
}

/** What each depot has promised of each part and not handed over. */
export async function listPromised(db: Handle) {
  return db
    .select({
      depotId: partPromises.depotId,
      partId: partPromises.partId,
      promised: sql<number>`count(*)::int`,
    })
    .from(partPromises)
    .where(eq(partPromises.state, 'promised'))
    .groupBy(partPromises.depotId, partPromises.partId)
}
