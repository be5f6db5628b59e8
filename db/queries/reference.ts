import { asc, eq } from 'drizzle-orm'
import type { Handle } from '../client'
import { kitModels, kitModelStages } from '../schema/kit'
import { parts } from '../schema/part'

const MODEL = {
  name: 'Three-stage gravity kit',
  nominalLitresPerHour: 18,
  bottleLitres: 1,
}

/** The stages of the first kit model. Months between changes and what is washed: common practice, no source. */
export const firstModelStages = [
  { position: 1, kind: 'cloth', part: 'Cloth', changeMonths: 1, washed: true },
  { position: 2, kind: 'carbon', part: 'Carbon', changeMonths: 3, washed: false },
  { position: 3, kind: 'fibre', part: 'Fibre', changeMonths: 12, washed: true },
] as const

const spares = [
  { name: 'Cap', kind: 'cap' },
  { name: 'Hose', kind: 'hose' },
] as const

/**
 * The kit model every programme begins with, its parts and their months, when there is no model yet.
 * Called at each start; a programme that has a model keeps its own.
 */
export async function insertReferenceData(db: Handle): Promise<void> {
  const known = await db.select({ id: kitModels.id }).from(kitModels).limit(1)
  if (known.length > 0) return
  const [model] = await db.insert(kitModels).values(MODEL).returning()
  if (!model) throw new Error('The kit model was not kept.')
  for (const { part: name, ...stage } of firstModelStages) {
    const [part] = await db.insert(parts).values({ name, kind: stage.kind }).returning()
    if (!part) throw new Error('A part was not kept.')
    await db.insert(kitModelStages).values({ ...stage, modelId: model.id, partId: part.id })
  }
  await db.insert(parts).values([...spares])
}

export async function listKitModels(db: Handle) {
  return db.select().from(kitModels).orderBy(asc(kitModels.name))
}

export async function findKitModel(db: Handle, modelId: string) {
  const [row] = await db.select().from(kitModels).where(eq(kitModels.id, modelId))
  return row ?? null
}

/** The stages of a model, top to bottom. */
export async function listModelStages(db: Handle, modelId: string) {
  return db
    .select()
    .from(kitModelStages)
    .where(eq(kitModelStages.modelId, modelId))
    .orderBy(asc(kitModelStages.position))
}
