import { endPromise, findOpenPromise, insertStockMove } from '@/db/queries/promise'
import type { Deps } from '@/lib/deps'
import type { Actor } from '@/lib/domain/role'
import { applyTicketEvent } from './apply-ticket-event'
import { refitStage } from './care-for-kit'
import { promisePart } from './promise-part'
import { workTicket, type TicketRef, type Worked } from './ticket-work'

/** Promises a part from a depot that has it. */
export function owePart(
  deps: Deps,
  actor: Actor,
  { position, ...ref }: TicketRef & { position: 1 | 2 | 3 },
): Promise<Worked> {
  return workTicket(deps, actor, {
    ...ref,
    act: 'promise part',
    detail: { position },
    work: async ({ tx, ticket, facts }) => {
      const promised = await promisePart(tx, deps, { facts, ticketId: ticket.id, position })
      // The letter that tells the coordinator of an empty shelf stays.
      if (!promised.ok) return { ...promised, keeps: true }
      return applyTicketEvent(tx, deps, {
        ticketId: ticket.id,
        staffId: actor.staffId,
        event: promised.event,
      })
    },
  })
}

/**
 * The promised part is in the family's hands and fitted: it leaves the depot's ledger, the stage's cycle
 * starts anew today, and the household is asked how the water runs.
 */
export function handOverPart(deps: Deps, actor: Actor, ref: TicketRef): Promise<Worked> {
  return workTicket(deps, actor, {
    ...ref,
    act: 'hand part over',
    work: async ({ tx, ticket, facts, now }) => {
      const promise = await findOpenPromise(tx, facts.kit.id)
      if (!promise) return { ok: false, reason: 'No part is promised to this household.' }
      await endPromise(tx, promise.id, { state: 'handed over', endedAt: now })
      await insertStockMove(tx, {
        depotId: promise.depotId,
        partId: promise.partId,
        quantity: -1,
        why: 'handed over',
        promiseId: promise.id,
        staffId: actor.staffId,
        at: now,
      })
      await refitStage(tx, deps, {
        facts,
        position: promise.position,
        removedFor: ticket.cause ?? 'trouble',
      })
      return applyTicketEvent(tx, deps, {
        ticketId: ticket.id,
        staffId: actor.staffId,
        event: { kind: 'part handed over', promiseId: promise.id },
      })
    },
  })
}
