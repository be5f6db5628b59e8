import type { Deps } from '@/lib/deps'
import { isCauseOf } from '@/lib/domain/end-causes'
import type { Actor } from '@/lib/domain/role'
import type { EndStage } from '@/lib/domain/ticket-types'
import { applyTicketEvent } from './apply-ticket-event'
import { workTicket, type TicketRef, type Worked } from './ticket-work'

/** Ends a ticket with what cured it, or with why there is no more to do. */
export function endTicket(
  deps: Deps,
  actor: Actor,
  { end, cause, ...ref }: TicketRef & { end: EndStage; cause: string },
): Promise<Worked> {
  return workTicket(deps, actor, {
    ...ref,
    act: 'end ticket',
    detail: { end, cause },
    work: async ({ tx, ticket }) => {
      if (!isCauseOf(end, cause)) return { ok: false, reason: 'Say what fits this end.' }
      return applyTicketEvent(tx, deps, {
        ticketId: ticket.id,
        staffId: actor.staffId,
        event: { kind: 'ended', end, cause },
      })
    },
  })
}

/** Takes the filter out of use: the household is told to stop, and what to drink meanwhile. */
export function stopUsing(deps: Deps, actor: Actor, ref: TicketRef): Promise<Worked> {
  return workTicket(deps, actor, {
    ...ref,
    act: 'stop using',
    work: ({ tx, ticket }) =>
      applyTicketEvent(tx, deps, {
        ticketId: ticket.id,
        staffId: actor.staffId,
        event: { kind: 'stopped using' },
      }),
  })
}
