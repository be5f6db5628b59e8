import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import { isServedBy, judgedShift, nextFor } from './list-shift'
import { takeTicket } from './take-ticket'
import type { Worked } from './ticket-work'

/** So many colleagues may be faster before we give up. */
const TRIES = 5

/** Takes the worst ticket that nobody has and whose language this person speaks. */
export async function takeNext(deps: Deps, actor: Actor): Promise<Worked> {
  allow(actor, 'work tickets')
  for (let tries = 0; tries < TRIES; tries++) {
    const { judged } = await judgedShift(deps, actor)
    const next = judged.find(({ ticket, ...one }) => !ticket.takenBy && isServedBy(one, actor))
    if (!next) return { ok: false, reason: nextFor(judged, actor).words }
    const { id: ticketId, version } = next.ticket
    const taken = await takeTicket(deps, actor, { ticketId, version })
    if (taken.ok) return taken
  }
  return { ok: false, reason: 'Colleagues were faster each time. Try again.' }
}
