import type { Transaction } from '@/db/client'
import { findKitFacts, type KitFacts } from '@/db/queries/kit-facts'
import { insertAudit } from '@/db/queries/staff'
import { findTicketForUpdate, type TicketRow } from '@/db/queries/ticket-events'
import type { Deps } from '@/lib/deps'
import { refusalWords } from '@/lib/domain/refusal-words'
import { allow, type Actor } from '@/lib/domain/role'
import { isOpen } from '@/lib/domain/ticket'

/** `keeps`: what was done on the way to the refusal stays, such as a letter to the coordinator. */
type Refused = { ok: false; reason: string; keeps?: boolean }
export type Worked = { ok: true; ticketId: string; version: number } | Refused

/** Which ticket a person works on, as they last saw it. */
export type TicketRef = { ticketId: string; version: number }

export type TicketWork = { tx: Transaction; ticket: TicketRow; facts: KitFacts; now: number }

type Act = TicketRef & {
  act: string
  detail?: Record<string, unknown>
  work: (held: TicketWork) => Promise<Refused | { ok: true }>
}

/** Ends the transaction of an act that was refused half way, so that none of it stays. */
class RefusedError extends Error {}

async function work(
  tx: Transaction,
  { now, staffId }: { now: number; staffId: string },
  input: Act,
): Promise<Worked> {
  const ticket = await findTicketForUpdate(tx, input.ticketId)
  if (!ticket) return { ok: false, reason: 'not found' }
  if (!isOpen(ticket.stage)) return { ok: false, reason: 'This ticket has ended.' }
  if (ticket.version !== input.version) {
    return { ok: false, reason: 'Something has happened on this ticket since you saw it.' }
  }
  const facts = await findKitFacts(tx, ticket.kitId)
  if (!facts) return { ok: false, reason: 'not found' }
  const done = await input.work({ tx, ticket, facts, now })
  if (!done.ok && !done.keeps) throw new RefusedError(done.reason)
  if (!done.ok) return { ok: false, reason: refusalWords(done.reason) }
  await insertAudit(tx, {
    staffId,
    act: input.act,
    subject: 'ticket',
    subjectId: ticket.id,
    detail: input.detail ?? {},
    at: now,
  })
  const after = await findTicketForUpdate(tx, ticket.id)
  return { ok: true, ticketId: ticket.id, version: after?.version ?? ticket.version }
}

/**
 * One act of a person on an open ticket: the role is checked, the row is held, a version that is not the
 * one they saw is refused (somebody else was faster), and the act is audited, all in one transaction. An
 * act that is refused leaves nothing behind.
 */
export async function workTicket(deps: Deps, actor: Actor, input: Act): Promise<Worked> {
  allow(actor, 'work tickets')
  const by = { now: deps.clock.now(), staffId: actor.staffId }
  try {
    return await deps.store.transaction((tx) => work(tx, by, input))
  } catch (error) {
    if (!(error instanceof RefusedError)) throw error
    return { ok: false, reason: refusalWords(error.message) }
  }
}
