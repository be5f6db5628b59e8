import type { Deps } from '@/lib/deps'
import type { Actor } from '@/lib/domain/role'
import { applyTicketEvent } from './apply-ticket-event'
import { workTicket, type TicketRef, type Worked } from './ticket-work'

/** Takes a ticket: from now on no step goes out by itself. */
export function takeTicket(deps: Deps, actor: Actor, ref: TicketRef): Promise<Worked> {
  return workTicket(deps, actor, {
    ...ref,
    act: 'take ticket',
    work: ({ tx, ticket }) =>
      applyTicketEvent(tx, deps, {
        ticketId: ticket.id,
        staffId: actor.staffId,
        event: { kind: 'taken', staffId: actor.staffId },
      }),
  })
}

/** Hands a ticket on to a colleague, or back into the shift with `staffId: null`. */
export function handOnTicket(
  deps: Deps,
  actor: Actor,
  { staffId, ...ref }: TicketRef & { staffId: string | null },
): Promise<Worked> {
  return workTicket(deps, actor, {
    ...ref,
    act: 'hand ticket on',
    detail: { to: staffId },
    work: ({ tx, ticket }) =>
      applyTicketEvent(tx, deps, {
        ticketId: ticket.id,
        staffId: actor.staffId,
        event: { kind: 'handed on', staffId },
      }),
  })
}
