import type { Transaction } from '@/db/client'
import { listOpenFittings, type KitFacts } from '@/db/queries/kit-facts'
import { insertPromise, listAvailable, lockShelf } from '@/db/queries/promise'
import type { Deps } from '@/lib/deps'
import type { TicketEvent } from '@/lib/domain/ticket-types'
import { tellCoordinator } from './tell-coordinator'

type Promised = { ok: true; event: TicketEvent } | { ok: false; reason: string }

/**
 * Promises the part of a stage from a depot that has it: the area's own first, else any other. The event
 * that tells the ticket is the caller's to apply. Where no depot has the part the coordinator is told.
 */
export async function promisePart(
  tx: Transaction,
  deps: Deps,
  { facts, ticketId, position }: { facts: KitFacts; ticketId: string; position: 1 | 2 | 3 },
): Promise<Promised> {
  const fittings = await listOpenFittings(tx, facts.kit.id)
  const stage = fittings.find((row) => row.stage.position === position)?.stage
  if (!stage) return { ok: false, reason: 'the kit has no such stage' }
  await lockShelf(tx, stage.partId)
  const shelves = await listAvailable(tx, stage.partId, facts.area.depotId)
  const depot = shelves.find((shelf) => shelf.available > 0)
  if (!depot) {
    await tellCoordinator(tx, deps, { subject: 'A part is owed and no depot has it', ticketId })
    return { ok: false, reason: 'no depot has this part' }
  }
  const promise = await insertPromise(tx, {
    ticketId,
    kitId: facts.kit.id,
    position,
    partId: stage.partId,
    depotId: depot.depotId,
    promisedAt: deps.clock.now(),
  })
  if (!promise) return { ok: false, reason: 'this stage has a promise already' }
  return { ok: true, event: { kind: 'part promised', promiseId: promise.id, stage: position } }
}
