import {
  listAreaNames,
  listDepotRows,
  listInHand,
  listParts,
  listPromised,
} from '@/db/queries/depot'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import type { Depot, DepotList } from '@/lib/schemas/depot'

/** Every depot, by name, with all its shelves: also the ones that never held anything. */
export async function listDepots(deps: Deps, actor: Actor): Promise<DepotList> {
  allow(actor, 'keep stock')
  const { db } = deps.store
  const depots = await listDepotRows(db)
  const parts = await listParts(db)
  const areas = await listAreaNames(db)
  const inHand = await listInHand(db)
  const promised = await listPromised(db)
  const views = depots.map((depot): Depot => {
    const shelves = parts.map((part) => {
      const here = (row: { depotId: string; partId: string }) =>
        row.depotId === depot.id && row.partId === part.id
      const has = inHand.find(here)?.inHand ?? 0
      const owes = promised.find(here)?.promised ?? 0
      return {
        partId: part.id,
        name: part.name,
        inHand: has,
        promised: owes,
        available: has - owes,
      }
    })
    const names = areas.filter(({ depotId }) => depotId === depot.id).map(({ name }) => name)
    return { id: depot.id, name: depot.name, place: depot.place, areas: names, shelves }
  })
  return { depots: views, parts: parts.map(({ id, name }) => ({ id, name })) }
}
