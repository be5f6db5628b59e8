import { and, asc, eq, sql } from 'drizzle-orm'
import type { Handle } from '../client'
import { depots } from '../schema/area'
import { partPromises } from '../schema/promise'
import { stockMoves } from '../schema/stock'

/** What each depot has of a part beyond what it has promised, the wanted depot first. */
export async function listAvailable(db: Handle, partId: string, firstDepotId: string) {
  const found = await db.execute(sql`
    select d.id, d.name,
      (select coalesce(sum(m.quantity), 0)::int from stock_moves m
        where m.depot_id = d.id and m.part_id = ${partId}) as in_hand,
      (select count(*)::int from part_promises p
        where p.depot_id = d.id and p.part_id = ${partId} and p.state = 'promised') as promised
    from depots d
    order by d.id <> ${firstDepotId}, d.name collate "C"`)
  return found.rows.map((row) => ({
    depotId: String(row.id),
    name: String(row.name),
    inHand: Number(row.in_hand),
    promised: Number(row.promised),
    available: Number(row.in_hand) - Number(row.promised),
  }))
}

/** Holds a depot's shelf for one part until the end of the transaction: two promises never share a part. */
export async function lockShelf(db: Handle, partId: string) {
  await db.execute(sql`select pg_advisory_xact_lock(hashtextextended(${`shelf:${partId}`}, 0))`)
}

/** A promise; null when the stage has an open one already. */
export async function insertPromise(db: Handle, row: typeof partPromises.$inferInsert) {
  const [made] = await db.insert(partPromises).values(row).onConflictDoNothing().returning()
  return made ?? null
}

export async function findOpenPromise(db: Handle, kitId: string) {
  const [row] = await db
    .select({ promise: partPromises, depotName: depots.name })
    .from(partPromises)
    .innerJoin(depots, eq(depots.id, partPromises.depotId))
    .where(and(eq(partPromises.kitId, kitId), eq(partPromises.state, 'promised')))
    .orderBy(asc(partPromises.promisedAt))
    .limit(1)
  return row ? { ...row.promise, depotName: row.depotName } : null
}

export async function endPromise(
  db: Handle,
  promiseId: string,
  { state, endedAt }: { state: 'handed over' | 'withdrawn'; endedAt: number },
) {
  await db.update(partPromises).set({ state, endedAt }).where(eq(partPromises.id, promiseId))
}

/** Withdraws what is still owed to a kit, so that the depot may promise it elsewhere. */
export async function withdrawPromises(db: Handle, kitId: string, endedAt: number) {
  await db
    .update(partPromises)
    .set({ state: 'withdrawn', endedAt })
    .where(and(eq(partPromises.kitId, kitId), eq(partPromises.state, 'promised')))
}

export async function insertStockMove(db: Handle, row: typeof stockMoves.$inferInsert) {
  await db.insert(stockMoves).values(row)
}
