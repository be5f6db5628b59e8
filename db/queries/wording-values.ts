import { and, asc, desc, eq, inArray } from 'drizzle-orm'
import type { Language } from '@/lib/domain/language'
import type { Handle } from '../client'
import { areas, depots } from '../schema/area'
import { households } from '../schema/household'
import { kitModels, kits } from '../schema/kit'
import { staff } from '../schema/staff'
import { visits } from '../schema/visit'

const tryLimit = 60

/** Households that read this language and have a kit, by name: to try a wording on. */
export async function listHouseholdsToTry(db: Handle, language: Language) {
  return db
    .selectDistinct({ id: households.id, name: households.name, area: areas.name })
    .from(households)
    .innerJoin(areas, eq(areas.id, households.areaId))
    .innerJoin(kits, eq(kits.householdId, households.id))
    .where(
      and(eq(households.language, language), inArray(kits.state, ['in use', 'out of service'])),
    )
    .orderBy(asc(households.name), asc(households.id))
    .limit(tryLimit)
}

/** The household, its newest kit and its depot: what a text to it may speak of. */
export async function findHouseholdToTry(db: Handle, householdId: string) {
  const [row] = await db
    .select({
      household: households,
      kit: kits,
      model: kitModels,
      depot: depots,
      altitudeMetres: areas.altitudeMetres,
    })
    .from(households)
    .innerJoin(kits, eq(kits.householdId, households.id))
    .innerJoin(kitModels, eq(kitModels.id, kits.modelId))
    .innerJoin(areas, eq(areas.id, households.areaId))
    .innerJoin(depots, eq(depots.id, areas.depotId))
    .where(eq(households.id, householdId))
    .orderBy(desc(kits.number))
    .limit(1)
  return row ?? null
}

/** The visit that a household is told of, with who comes where one is asked. */
export async function findDueVisit(db: Handle, householdId: string) {
  const [row] = await db
    .select({ dueOn: visits.dueOn, visitor: staff.name })
    .from(visits)
    .leftJoin(staff, eq(staff.id, visits.visitorId))
    .where(and(eq(visits.householdId, householdId), eq(visits.state, 'due')))
  return row ?? null
}
