import { endVisit, findDueVisit, insertVisit } from '@/db/queries/visit'
import type { Deps } from '@/lib/deps'
import type { Actor } from '@/lib/domain/role'
import { applyTicketEvent } from './apply-ticket-event'
import { workTicket, type TicketRef, type Worked } from './ticket-work'

/** Books a visit for a day; whose it is may be settled later. */
export function bookVisit(
  deps: Deps,
  actor: Actor,
  { dueOn, visitorId, why, ...ref }: TicketRef & { dueOn: string; visitorId?: string; why: string },
): Promise<Worked> {
  return workTicket(deps, actor, {
    ...ref,
    act: 'book visit',
    detail: { dueOn },
    work: async ({ tx, ticket, facts, now }) => {
      const visit = await insertVisit(tx, {
        ticketId: ticket.id,
        householdId: facts.household.id,
        visitorId,
        why,
        dueOn,
        createdAt: now,
      })
      if (!visit) return { ok: false, reason: 'This household has a visit due already.' }
      return applyTicketEvent(tx, deps, {
        ticketId: ticket.id,
        staffId: actor.staffId,
        event: { kind: 'visit booked', visitId: visit.id },
      })
    },
  })
}

/** Notes what a visitor saw, and whether the water runs. */
export function noteVisit(
  deps: Deps,
  actor: Actor,
  { flowing, note, ...ref }: TicketRef & { flowing: boolean; note: string },
): Promise<Worked> {
  return workTicket(deps, actor, {
    ...ref,
    act: 'note visit',
    detail: { flowing },
    work: async ({ tx, ticket, facts, now }) => {
      const visit = await findDueVisit(tx, facts.household.id)
      if (!visit) return { ok: false, reason: 'No visit is due.' }
      await endVisit(tx, visit.id, { note, endedAt: now })
      return applyTicketEvent(tx, deps, {
        ticketId: ticket.id,
        staffId: actor.staffId,
        event: { kind: 'visit done', flowing },
      })
    },
  })
}
