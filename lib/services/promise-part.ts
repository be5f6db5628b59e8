import type { Transaction } from '@/db/client'
import { listOpenFittings, type KitFacts } from '@/db/queries/kit-facts'
import { insertPromise, listAvailable, lockShelf } from '@/db/queries/promise'
import type { Deps } from '@/lib/deps'
import { applyTicketEvent } from './apply-ticket-event'
import { tellCoordinator } from './tell-coordinator'

/**
 * Promises the part of a stage from a depot that has it: the area's own first, else any other. Where none
 * has it the ticket stays `part owed` without a promise, and the coordinator is told.
 */
export async function promisePart(
  tx: Transaction,
  deps: Deps,
  { facts, ticketId, position }: { facts: KitFacts; ticketId: string; position: 1 | 2 | 3 },
): Promise<{ ok: true; promiseId: string } | { ok: false; reason: string }> {
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
  const applied = await applyTicketEvent(tx, deps, {
    ticketId,
    event: { kind: 'part promised', promiseId: promise.id, stage: position },
  })
  return applied.ok ? { ok: true, promiseId: promise.id } : applied
}
