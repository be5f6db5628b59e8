import { asc, desc, eq, inArray, isNull, and } from 'drizzle-orm'
import type { Handle } from '../client'
import { fittings, kitModels, kits } from '../schema/kit'
import { parts } from '../schema/part'
import { flowReadings, washes } from '../schema/reading'
import { prompts } from '../schema/text'
import { tickets } from '../schema/ticket'

export async function insertKit(db: Handle, row: typeof kits.$inferInsert) {
  const [made] = await db.insert(kits).values(row).returning()
  if (!made) throw new Error('The kit was not kept.')
  return made
}

export async function insertFirstFittings(db: Handle, rows: (typeof fittings.$inferInsert)[]) {
  return db.insert(fittings).values(rows).returning()
}

export async function listKitsOfHousehold(db: Handle, householdId: string) {
  return db
    .select({ kit: kits, model: kitModels })
    .from(kits)
    .innerJoin(kitModels, eq(kitModels.id, kits.modelId))
    .where(eq(kits.householdId, householdId))
    .orderBy(asc(kits.number))
}

/** What stands in the stages of these kits now. */
export async function listOpenFittingsOfKits(db: Handle, kitIds: string[]) {
  if (kitIds.length === 0) return []
  return db
    .select()
    .from(fittings)
    .where(and(inArray(fittings.kitId, kitIds), isNull(fittings.removedOn)))
    .orderBy(asc(fittings.kitId), asc(fittings.position))
}

/** The last flow reading of each of these kits. */
export async function listLastReadings(db: Handle, kitIds: string[]) {
  if (kitIds.length === 0) return []
  return db
    .selectDistinctOn([flowReadings.kitId])
    .from(flowReadings)
    .where(inArray(flowReadings.kitId, kitIds))
    .orderBy(flowReadings.kitId, desc(flowReadings.at), desc(flowReadings.n))
}

/** Everything that ever stood in a kit's stages, oldest first. */
export async function listFittings(db: Handle, kitId: string) {
  return db
    .select({ fitting: fittings, partName: parts.name })
    .from(fittings)
    .innerJoin(parts, eq(parts.id, fittings.partId))
    .where(eq(fittings.kitId, kitId))
    .orderBy(asc(fittings.fittedOn), asc(fittings.position), asc(fittings.id))
}

/** A life line shows so many of each at most: the latest. */
const LIFE = 400

export async function listWashes(db: Handle, kitId: string) {
  const rows = await db
    .select()
    .from(washes)
    .where(eq(washes.kitId, kitId))
    .orderBy(desc(washes.n))
    .limit(LIFE)
  return rows.toReversed()
}

export async function listReadings(db: Handle, kitId: string) {
  const rows = await db
    .select()
    .from(flowReadings)
    .where(eq(flowReadings.kitId, kitId))
    .orderBy(desc(flowReadings.at), desc(flowReadings.n))
    .limit(LIFE)
  return rows.toReversed()
}

export async function listPromptsOfKit(db: Handle, kitId: string) {
  const rows = await db
    .select()
    .from(prompts)
    .where(eq(prompts.kitId, kitId))
    .orderBy(desc(prompts.dueOn), desc(prompts.id))
    .limit(LIFE)
  return rows.toReversed()
}

export async function listTicketsOfKit(db: Handle, kitId: string) {
  return db
    .select()
    .from(tickets)
    .where(eq(tickets.kitId, kitId))
    .orderBy(asc(tickets.openedAt), asc(tickets.id))
}
