import { isNull } from 'drizzle-orm'
import { tickets } from '@/db/schema/ticket'
import type { Deps } from '@/lib/deps'
import type { EndCause } from '@/lib/domain/end-causes'
import type { Actor } from '@/lib/domain/role'
import { endTicket } from '@/lib/services/end-ticket'
import { handOverPart } from '@/lib/services/owe-part'
import { takeTicket } from '@/lib/services/take-ticket'

const HOUR = 3_600_000
const DAY = 24 * HOUR

type Ticket = typeof tickets.$inferSelect

/** How long the virtual agent lets each trouble stand, in milliseconds. */
function patience(ticket: Ticket): number {
  switch (ticket.trouble) {
    case 'unread':
      return 20 * HOUR
    case 'unwell':
    case 'danger sign':
      return 2 * DAY
    case 'unsafe':
      return 3 * DAY
    case 'silent':
      return 6 * DAY
    case 'slow':
    case 'no flow':
      return 4 * DAY
  }
}

const endings: Record<Ticket['trouble'], { end: 'flowing' | 'withdrawn'; cause: EndCause }> = {
  unread: { end: 'withdrawn', cause: 'answered in words' },
  unwell: { end: 'withdrawn', cause: 'saw a health worker' },
  'danger sign': { end: 'withdrawn', cause: 'saw a health worker' },
  unsafe: { end: 'flowing', cause: 'misfitted-cap' },
  silent: { end: 'withdrawn', cause: 'no trouble' },
  slow: { end: 'flowing', cause: 'fouled-fibre' },
  'no flow': { end: 'flowing', cause: 'air-lock' },
}

/** A morning's work of the virtual agent: what has stood too long is ended, what is owed handed over. */
export async function workShift(
  deps: Deps,
  agent: Actor,
  handedOver: (householdId: string) => void,
): Promise<void> {
  const now = deps.clock.now()
  const open = await deps.store.db.select().from(tickets).where(isNull(tickets.endedAt))
  for (const ticket of open) {
    const age = now - ticket.openedAt
    const ref = { ticketId: ticket.id, version: ticket.version }
    if (ticket.stage === 'part owed' && age > 2 * DAY) {
      const done = await handOverPart(deps, agent, ref)
      if (done.ok) handedOver(ticket.householdId)
    } else if (age > patience(ticket)) {
      const taken = ticket.takenBy
        ? { ok: true as const, ...ref }
        : await takeTicket(deps, agent, ref)
      if (!taken.ok) throw new Error(taken.reason)
      const ended = await endTicket(deps, agent, { ...taken, ...endings[ticket.trouble] })
      if (!ended.ok) throw new Error(ended.reason)
    }
  }
}
