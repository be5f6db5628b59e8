import type { Transaction } from '@/db/client'
import { findKitFacts, type KitFacts } from '@/db/queries/kit-facts'
import {
  findOpenTicket,
  findTicketForUpdate,
  insertTicket,
  insertTicketEvent,
  listTicketEvents,
  updateTicket,
  upsertWalk,
} from '@/db/queries/ticket-events'
import type { Deps } from '@/lib/deps'
import { decide, fold } from '@/lib/domain/ticket'
import type { TicketEffect, TicketEvent, TicketState } from '@/lib/domain/ticket-types'
import type { Trouble } from '@/lib/domain/trouble'
import { runTicketEffects } from './run-ticket-effects'

export type Applied =
  | { ok: true; state: TicketState; effects: TicketEffect[]; ticketId: string }
  | { ok: false; reason: string }

/** Columns of the ticket's row that are its events folded. */
function cacheOf(state: TicketState) {
  return {
    stage: state.stage,
    trouble: state.trouble,
    waitingFor: state.waitingFor,
    noSafeWaterSince: state.noSafeWaterSince,
    takenBy: state.takenBy,
    automatic: state.automatic,
    endedAt: state.endedAt,
    cause: state.cause,
  }
}

async function save(
  tx: Transaction,
  entry: {
    ticketId: string
    n: number
    event: TicketEvent
    state: TicketState
    staffId: string | null
    at: number
  },
) {
  const { ticketId, n, event, state, staffId, at } = entry
  await updateTicket(tx, ticketId, { ...cacheOf(state), version: n })
  await insertTicketEvent(tx, { ticketId, n, kind: event.kind, event, staffId, at })
  if (state.walk) await upsertWalk(tx, { ticketId, walk: state.walk, changedAt: at })
}

/**
 * Applies one event to a ticket: its events are folded, the core decides, the event is appended, the row
 * brought up to date and the effects carried out, all in the caller's transaction.
 */
export async function applyTicketEvent(
  tx: Transaction,
  deps: Deps,
  input: { ticketId: string; event: TicketEvent; staffId?: string; minutes?: number },
): Promise<Applied> {
  const row = await findTicketForUpdate(tx, input.ticketId)
  if (!row) return { ok: false, reason: 'not found' }
  const events = await listTicketEvents(tx, row.id)
  const now = deps.clock.now()
  const decision = decide(fold(events), input.event, now)
  if (!decision.ok) return decision
  const n = events.length + 1
  await save(tx, {
    ticketId: row.id,
    n,
    event: input.event,
    state: decision.state,
    staffId: input.staffId ?? null,
    at: now,
  })
  const facts = await factsOf(tx, row.kitId)
  await runTicketEffects(tx, deps, {
    facts,
    ticketId: row.id,
    n,
    state: decision.state,
    effects: decision.effects,
    minutes: input.minutes,
    staffId: input.staffId,
  })
  return { ok: true, state: decision.state, effects: decision.effects, ticketId: row.id }
}

async function factsOf(tx: Transaction, kitId: string): Promise<KitFacts> {
  const facts = await findKitFacts(tx, kitId)
  if (!facts) throw new Error(`There is no kit ${kitId}.`)
  return facts
}

/** Opens a ticket for a kit, or worsens the one that is open. */
export async function raiseTrouble(
  tx: Transaction,
  deps: Deps,
  { facts, trouble, staffId }: { facts: KitFacts; trouble: Trouble; staffId?: string },
): Promise<Applied> {
  const open = await findOpenTicket(tx, facts.kit.id)
  if (open) {
    return applyTicketEvent(tx, deps, {
      ticketId: open.id,
      event: { kind: 'worsened', trouble },
      staffId,
    })
  }
  const now = deps.clock.now()
  const event: TicketEvent = { kind: 'opened', trouble }
  const decision = decide(null, event, now)
  if (!decision.ok) return decision
  const row = await insertTicket(tx, {
    kitId: facts.kit.id,
    householdId: facts.household.id,
    ...cacheOf(decision.state),
    version: 1,
    openedAt: now,
  })
  if (!row) return { ok: false, reason: 'already open' }
  await save(tx, {
    ticketId: row.id,
    n: 1,
    event,
    state: decision.state,
    staffId: staffId ?? null,
    at: now,
  })
  await runTicketEffects(tx, deps, {
    facts,
    ticketId: row.id,
    n: 1,
    state: decision.state,
    effects: decision.effects,
    staffId,
  })
  return { ok: true, state: decision.state, effects: decision.effects, ticketId: row.id }
}
