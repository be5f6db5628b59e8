import { and, asc, eq, inArray, lte } from 'drizzle-orm'
import type { Handle } from '../client'
import { areas } from '../schema/area'
import { households } from '../schema/household'
import { kits } from '../schema/kit'
import { prompts, texts } from '../schema/text'

/** Texts that wait for their hour, with the prompts they carry. */
export async function listQueuedTexts(db: Handle, until: number, limit: number) {
  const queued = await db
    .select({
      id: texts.id,
      at: texts.sendAfter,
      moment: texts.moment,
      purpose: texts.purpose,
      householdId: texts.householdId,
      house: households.name,
      area: areas,
    })
    .from(texts)
    .innerJoin(households, eq(households.id, texts.householdId))
    .innerJoin(areas, eq(areas.id, households.areaId))
    .where(and(eq(texts.state, 'queued'), lte(texts.sendAfter, until)))
    .orderBy(asc(texts.sendAfter), asc(texts.n))
    .limit(limit)
  const carried = await listPromptsOfTexts(
    db,
    queued.map(({ id }) => id),
  )
  return queued.map((text) => ({
    ...text,
    prompts: carried.filter(({ textId }) => textId === text.id),
  }))
}

async function listPromptsOfTexts(db: Handle, textIds: string[]) {
  if (textIds.length === 0) return []
  return db
    .select({ textId: prompts.textId, kind: prompts.kind, positions: prompts.positions })
    .from(prompts)
    .where(inArray(prompts.textId, textIds))
    .orderBy(asc(prompts.dueOn), asc(prompts.kind))
}

/** Households that will be nudged if they go on saying nothing. */
export async function listNudgesAhead(db: Handle, until: number, limit: number) {
  return db
    .select({
      at: prompts.nudgeAfter,
      kind: prompts.kind,
      positions: prompts.positions,
      householdId: households.id,
      house: households.name,
      area: areas,
    })
    .from(prompts)
    .innerJoin(kits, eq(kits.id, prompts.kitId))
    .innerJoin(households, eq(households.id, kits.householdId))
    .innerJoin(areas, eq(areas.id, households.areaId))
    .where(and(eq(prompts.state, 'asked'), lte(prompts.nudgeAfter, until)))
    .orderBy(asc(prompts.nudgeAfter), asc(prompts.id))
    .limit(limit)
}

/** Where kits stand: household and area. */
export async function listKitPlaces(db: Handle, kitIds: string[]) {
  if (kitIds.length === 0) return []
  return db
    .select({
      kitId: kits.id,
      householdId: households.id,
      house: households.name,
      area: areas,
    })
    .from(kits)
    .innerJoin(households, eq(households.id, kits.householdId))
    .innerJoin(areas, eq(areas.id, households.areaId))
    .where(inArray(kits.id, kitIds))
}

export type KitPlace = Awaited<ReturnType<typeof listKitPlaces>>[number]
