import { listAreaRows } from '@/db/queries/area'
import { listKitModels } from '@/db/queries/reference'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import { localDay } from '@/lib/domain/round'

/** What the form of a new household offers: areas with their language and today’s date there, and kits. */
export async function householdForm(deps: Deps, actor: Actor) {
  allow(actor, 'enter households')
  const now = deps.clock.now()
  const areas = await listAreaRows(deps.store.db)
  const models = await listKitModels(deps.store.db)
  return {
    areas: areas.map(({ area: { id, name, language, timeZone } }) => ({
      id,
      name,
      language,
      today: localDay(now, timeZone),
    })),
    models: models.map(({ id, name, bottleLitres }) => ({ id, name, bottleLitres })),
  }
}
