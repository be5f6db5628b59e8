import { and, asc, desc, eq, isNull } from 'drizzle-orm'
import type { Handle } from '../client'
import { areas } from '../schema/area'
import { households } from '../schema/household'
import { fittings, kitModels, kitModelStages, kits } from '../schema/kit'
import { parts } from '../schema/part'
import { flowReadings, washes } from '../schema/reading'

/** A kit with its model, its household and its area: what nearly every rule about it asks for. */
export async function findKitFacts(db: Handle, kitId: string) {
  const [row] = await db
    .select({ kit: kits, model: kitModels, household: households, area: areas })
    .from(kits)
    .innerJoin(kitModels, eq(kitModels.id, kits.modelId))
    .innerJoin(households, eq(households.id, kits.householdId))
    .innerJoin(areas, eq(areas.id, households.areaId))
    .where(eq(kits.id, kitId))
  return row ?? null
}

export type KitFacts = NonNullable<Awaited<ReturnType<typeof findKitFacts>>>

/** What stands in the kit's stages now, top to bottom, with the stage's own months and part. */
export async function listOpenFittings(db: Handle, kitId: string) {
  return db
    .select({ fitting: fittings, stage: kitModelStages, part: parts })
    .from(fittings)
    .innerJoin(kits, eq(kits.id, fittings.kitId))
    .innerJoin(
      kitModelStages,
      and(eq(kitModelStages.modelId, kits.modelId), eq(kitModelStages.position, fittings.position)),
    )
    .innerJoin(parts, eq(parts.id, kitModelStages.partId))
    .where(and(eq(fittings.kitId, kitId), isNull(fittings.removedOn)))
    .orderBy(asc(fittings.position))
}

/** The first reading of a fibre fitting: what a later one is held against. */
export async function findFirstReading(db: Handle, fibreFittingId: string) {
  const [row] = await db
    .select()
    .from(flowReadings)
    .where(eq(flowReadings.fibreFittingId, fibreFittingId))
    .orderBy(asc(flowReadings.at), asc(flowReadings.n))
    .limit(1)
  return row ?? null
}

/** A forecast looks at so many readings at most: the latest. */
const READINGS = 400

/** What a kit's fibre fitting let through, oldest first, as the trend wants it. */
export async function listReadingsOfFitting(db: Handle, kitId: string, fibreFittingId: string) {
  const rows = await db
    .select({ takenAt: flowReadings.at, normalised: flowReadings.normalised })
    .from(flowReadings)
    .where(and(eq(flowReadings.kitId, kitId), eq(flowReadings.fibreFittingId, fibreFittingId)))
    .orderBy(desc(flowReadings.at), desc(flowReadings.n))
    .limit(READINGS)
  return rows.toReversed()
}

export async function findLastReading(db: Handle, kitId: string) {
  const [row] = await db
    .select()
    .from(flowReadings)
    .where(eq(flowReadings.kitId, kitId))
    .orderBy(desc(flowReadings.at), desc(flowReadings.n))
    .limit(1)
  return row ?? null
}

export async function insertReading(db: Handle, row: typeof flowReadings.$inferInsert) {
  await db.insert(flowReadings).values(row).onConflictDoNothing({ target: flowReadings.textId })
}

export async function insertWash(db: Handle, row: typeof washes.$inferInsert) {
  await db.insert(washes).values(row)
}

/** Holds a kit until the end of the transaction: who changes it meanwhile waits, and is not overwritten. */
export async function holdKit(tx: Handle, kitId: string): Promise<void> {
  await tx.select({ id: kits.id }).from(kits).where(eq(kits.id, kitId)).for('no key update')
}

export async function updateKit(
  db: Handle,
  kitId: string,
  change: Partial<typeof kits.$inferInsert>,
) {
  await db.update(kits).set(change).where(eq(kits.id, kitId))
}

/** Takes out what stands in a stage, with the reason. Nothing there: nothing happens. */
export async function removeFitting(
  db: Handle,
  {
    kitId,
    position,
    removedOn,
    removedFor,
  }: { kitId: string; position: 1 | 2 | 3; removedOn: string; removedFor: string },
) {
  await db
    .update(fittings)
    .set({ removedOn, removedFor })
    .where(
      and(eq(fittings.kitId, kitId), eq(fittings.position, position), isNull(fittings.removedOn)),
    )
}

export async function insertFitting(db: Handle, row: typeof fittings.$inferInsert) {
  await db.insert(fittings).values(row)
}

export async function updateHousehold(
  db: Handle,
  householdId: string,
  change: Partial<typeof households.$inferInsert>,
) {
  await db.update(households).set(change).where(eq(households.id, householdId))
}

export async function findHousehold(db: Handle, householdId: string) {
  const [row] = await db.select().from(households).where(eq(households.id, householdId))
  return row ?? null
}
