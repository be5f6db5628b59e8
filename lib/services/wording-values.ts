import type { Handle } from '@/db/client'
import { findLastReading, listOpenFittings } from '@/db/queries/kit-facts'
import { findOpenPromise } from '@/db/queries/promise'
import { findDueVisit, findHouseholdToTry } from '@/db/queries/wording-values'
import type { MomentInfo } from '@/lib/domain/moments'
import type { Values } from '@/lib/domain/wording'
import { boilMinutes } from './boil-minutes'
import { settingsNow } from './settings-now'

type Found = NonNullable<Awaited<ReturnType<typeof findHouseholdToTry>>>

/** The stage that a text about a change or a part would be about: the one owed, else the next one due. */
async function stageValues(db: Handle, kitId: string): Promise<Values & { changeOn?: string }> {
  const promise = await findOpenPromise(db, kitId)
  const fittings = await listOpenFittings(db, kitId)
  const [next] = [...fittings].sort((one, other) =>
    one.fitting.dueOn < other.fitting.dueOn ? -1 : 1,
  )
  const about = fittings.find(({ fitting }) => fitting.position === promise?.position) ?? next
  if (!about) return {}
  return {
    stage: about.fitting.position,
    part: about.part.name,
    changeOn: about.fitting.dueOn,
  }
}

async function kitValues(db: Handle, { kit, model }: Found): Promise<Values> {
  const reading = await findLastReading(db, kit.id)
  return {
    litres: model.bottleLitres,
    ...(reading ? { minutes: Math.round(reading.seconds / 60) } : {}),
  }
}

/**
 * What a text of this moment to this household may speak of, as far as it is known today. Null for a
 * household without a kit.
 */
export async function wordingValues(
  db: Handle,
  info: MomentInfo,
  householdId: string,
): Promise<Values | null> {
  const found = await findHouseholdToTry(db, householdId)
  if (!found) return null
  const { programme } = await settingsNow(db)
  const { changeOn, ...stage } = await stageValues(db, found.kit.id)
  const visit = await findDueVisit(db, householdId)
  const aboutStage = info.values.includes('stage')
  return {
    programme: programme.name,
    house: found.household.name,
    depot: found.depot.name,
    ...stage,
    ...(await kitValues(db, found)),
    ...(aboutStage && changeOn ? { dueOn: changeOn } : { dueOn: found.kit.nextWashOn }),
    ...(info.moment === 'drink-advice' ? { minutes: boilMinutes(found.altitudeMetres) } : {}),
    ...(visit ? { visitOn: visit.dueOn } : {}),
    ...(visit?.visitor ? { visitor: visit.visitor } : {}),
  }
}
