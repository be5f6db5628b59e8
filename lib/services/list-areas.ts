import { findArea, listAreaRows, type AreaRow } from '@/db/queries/area'
import { listDepotRows } from '@/db/queries/depot'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import { minuteWords } from '@/lib/domain/stamp'
import type { Area, AreaInput, AreaList } from '@/lib/schemas/area'

function inputOf(area: AreaRow): AreaInput {
  const { id: _id, createdAt: _createdAt, windowOpensMinute, windowClosesMinute, ...rest } = area
  return {
    ...rest,
    windowOpens: minuteWords(windowOpensMinute),
    windowCloses: minuteWords(windowClosesMinute),
  }
}

/** Every area, by name. */
export async function listAreas(deps: Deps, actor: Actor): Promise<AreaList> {
  allow(actor, 'see households')
  const rows = await listAreaRows(deps.store.db)
  const areas = rows.map(({ area, depotName, households }): Area => ({
    ...inputOf(area),
    id: area.id,
    depotName,
    households,
  }))
  return { areas }
}

/** What the form of one area begins with, and the depots to choose from. Null: no such area. */
export async function areaForm(deps: Deps, actor: Actor, areaId: string | null) {
  allow(actor, 'set up areas')
  const depots = await listDepotRows(deps.store.db)
  const choices = depots.map(({ id, name }) => ({ id, name }))
  if (areaId === null) return { area: null, depots: choices }
  const area = await findArea(deps.store.db, areaId)
  return area && { area: inputOf(area), depots: choices }
}
