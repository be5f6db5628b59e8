import type { Transaction } from '@/db/client'
import { findKitFacts, type KitFacts } from '@/db/queries/kit-facts'
import { insertAudit } from '@/db/queries/staff'
import { findTicketForUpdate, type TicketRow } from '@/db/queries/ticket-events'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import { isOpen } from '@/lib/domain/ticket'

export type Refused = { ok: false; reason: string }
export type Worked = { ok: true; ticketId: string; version: number } | Refused

/** Which ticket a person works on, as they last saw it. */
export type TicketRef = { ticketId: string; version: number }

export type TicketWork = { tx: Transaction; ticket: TicketRow; facts: KitFacts; now: number }

/**
 * One act of a person on an open ticket: the role is checked, the row is held, a version that is not the
 * one they saw is refused (somebody else was faster), and the act is audited, all in one transaction.
 */
export async function workTicket(
  deps: Deps,
  actor: Actor,
  input: TicketRef & {
    act: string
    detail?: Record<string, unknown>
    work: (held: TicketWork) => Promise<Refused | { ok: true }>
  },
): Promise<Worked> {
  allow(actor, 'work tickets')
  const now = deps.clock.now()
  return deps.store.transaction(async (tx) => {
    const ticket = await findTicketForUpdate(tx, input.ticketId)
    if (!ticket) return { ok: false, reason: 'not found' }
    if (!isOpen(ticket.stage)) return { ok: false, reason: 'This ticket has ended.' }
    if (ticket.version !== input.version) {
      return { ok: false, reason: 'Something has happened on this ticket since you saw it.' }
    }
    const facts = await findKitFacts(tx, ticket.kitId)
    if (!facts) return { ok: false, reason: 'not found' }
    const done = await input.work({ tx, ticket, facts, now })
    if (!done.ok) return done
    await insertAudit(tx, {
      staffId: actor.staffId,
      act: input.act,
      subject: 'ticket',
      subjectId: ticket.id,
      detail: input.detail ?? {},
      at: now,
    })
    const after = await findTicketForUpdate(tx, ticket.id)
    return { ok: true, ticketId: ticket.id, version: after?.version ?? ticket.version }
  })
}
