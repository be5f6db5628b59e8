import { and, asc, eq, gt, inArray, isNull, sql } from 'drizzle-orm'
import type { Handle } from '../client'
import { areas } from '../schema/area'
import { householdPhones, households, phones } from '../schema/household'
import { fittings, kitModelStages, kits } from '../schema/kit'

/**
 * One page of the kits in use with what their plan ahead asks for, by number. Paged by key: `after` is the
 * last number of the page before, 0 for the first, so that no page costs more than another.
 */
export async function listKitsAhead(
  db: Handle,
  { after, limit }: { after: number; limit: number },
) {
  const page = await db
    .select({
      id: kits.id,
      number: kits.number,
      washCountedFrom: kits.washCountedFrom,
      calendarWashOn: kits.calendarWashOn,
      nextWashOn: kits.nextWashOn,
      nextFlowCheckOn: kits.nextFlowCheckOn,
      sourceClass: households.sourceClass,
      language: households.language,
      wetMonths: areas.wetMonths,
      texted: sql<boolean>`coalesce(${phones.state} = 'active' and ${phones.consent} = 'given'
        and not ${phones.carrierBlocked}, false)`,
    })
    .from(kits)
    .innerJoin(households, eq(households.id, kits.householdId))
    .innerJoin(areas, eq(areas.id, households.areaId))
    .leftJoin(
      householdPhones,
      and(eq(householdPhones.householdId, households.id), eq(householdPhones.first, true)),
    )
    .leftJoin(phones, eq(phones.id, householdPhones.phoneId))
    .where(and(eq(kits.state, 'in use'), gt(kits.number, after)))
    .orderBy(asc(kits.number))
    .limit(limit)
  const stages = await listStagesAhead(
    db,
    page.map(({ id }) => id),
  )
  return page.map((kit) => ({ ...kit, stages: stages.get(kit.id) ?? [] }))
}

type StageAhead = { position: 1 | 2 | 3; fittedOn: string; changeMonths: number }

async function listStagesAhead(db: Handle, kitIds: string[]): Promise<Map<string, StageAhead[]>> {
  const ofKits = new Map<string, StageAhead[]>()
  if (kitIds.length === 0) return ofKits
  const rows = await db
    .select({
      kitId: fittings.kitId,
      position: fittings.position,
      fittedOn: fittings.fittedOn,
      changeMonths: kitModelStages.changeMonths,
    })
    .from(fittings)
    .innerJoin(kits, eq(kits.id, fittings.kitId))
    .innerJoin(
      kitModelStages,
      and(eq(kitModelStages.modelId, kits.modelId), eq(kitModelStages.position, fittings.position)),
    )
    .where(and(inArray(fittings.kitId, kitIds), isNull(fittings.removedOn)))
    .orderBy(asc(fittings.kitId), asc(fittings.position))
  for (const { kitId, ...stage } of rows) ofKits.set(kitId, [...(ofKits.get(kitId) ?? []), stage])
  return ofKits
}

/** The months between changes of each stage, as the kit models have them; models may differ. */
export async function listStageMonths(db: Handle) {
  return db
    .selectDistinct({
      position: kitModelStages.position,
      changeMonths: kitModelStages.changeMonths,
    })
    .from(kitModelStages)
    .orderBy(asc(kitModelStages.position), asc(kitModelStages.changeMonths))
}
