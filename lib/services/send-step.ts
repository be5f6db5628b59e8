import { createHash } from 'node:crypto'
import { findFirstPhone } from '@/db/queries/phone'
import type { Deps } from '@/lib/deps'
import type { Moment } from '@/lib/domain/moments'
import type { Actor } from '@/lib/domain/role'
import { stepOf } from '@/lib/domain/walk-catalogue'
import { applyTicketEvent } from './apply-ticket-event'
import { queueText } from './queue-text'
import { stepText } from './word-text'
import { workTicket, type TicketRef, type TicketWork, type Worked } from './ticket-work'

type Sending = { moment: Moment; stepId?: string; body?: string }

/** Own words change nothing on the ticket: by their sum a second press of a button sends nothing twice. */
function ownWords(body = ''): string {
  return `own words:${createHash('sha256').update(body).digest('hex').slice(0, 16)}`
}

async function sendToHousehold(
  deps: Deps,
  actor: Actor,
  { held, sending }: { held: TicketWork; sending: Sending },
) {
  const { tx, ticket, facts, now } = held
  const phone = await findFirstPhone(tx, facts.household.id)
  if (!phone) return { ok: false as const, reason: 'This household has no phone.' }
  const { values } = await stepText(tx, { moment: sending.moment, household: facts.household })
  return queueText(tx, deps, {
    purpose: `step:${ticket.id}:${ticket.version + 1}:${sending.stepId ?? ownWords(sending.body)}`,
    moment: sending.moment,
    phone,
    household: facts.household,
    kitId: facts.kit.id,
    ticketId: ticket.id,
    stepId: sending.stepId,
    values,
    staffId: actor.staffId,
    body: sending.body,
    sendAfter: now,
    anyHour: true,
  })
}

/** Sends a step of the walk, in the wording's words or the agent's own. */
export function sendStep(
  deps: Deps,
  actor: Actor,
  { stepId, body, ...ref }: TicketRef & { stepId: string; body?: string },
): Promise<Worked> {
  return workTicket(deps, actor, {
    ...ref,
    act: 'send step',
    detail: { stepId, ownWords: body !== undefined },
    work: async (held) => {
      const step = stepOf(stepId)
      if (!step) return { ok: false, reason: 'There is no such step.' }
      const queued = await sendToHousehold(deps, actor, {
        held,
        sending: { moment: step.moment, stepId, body },
      })
      if (!queued.ok) return queued
      return applyTicketEvent(held.tx, deps, {
        ticketId: held.ticket.id,
        staffId: actor.staffId,
        event: { kind: 'step sent', stepId, by: actor.staffId },
      })
    },
  })
}

/** Sends an agent's own words; they ask for nothing that the desk would read an answer to. */
export function writeToHousehold(
  deps: Deps,
  actor: Actor,
  { body, ...ref }: TicketRef & { body: string },
): Promise<Worked> {
  return workTicket(deps, actor, {
    ...ref,
    act: 'write to household',
    work: (held) => sendToHousehold(deps, actor, { held, sending: { moment: 'got-it', body } }),
  })
}
