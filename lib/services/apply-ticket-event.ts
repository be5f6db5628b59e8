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
import type { TicketEvent, TicketState } from '@/lib/domain/ticket-types'
import type { Trouble } from '@/lib/domain/trouble'
import { noticeIllness } from './notice-illness'
import { areaCelsius } from './area-celsius'
import { runTicketEffects } from './run-ticket-effects'
import { oddsAtOpening } from './starting-odds'

export type Applied =
  { ok: true; state: TicketState; ticketId: string } | { ok: false; reason: string }

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
  const told = await runTicketEffects(tx, deps, {
    facts,
    ticketId: row.id,
    n,
    state: decision.state,
    effects: decision.effects,
    minutes: input.minutes,
    staffId: input.staffId,
  })
  return hear(tx, deps, {
    told,
    applied: { ok: true, state: decision.state, ticketId: row.id },
  })
}

/** Applies, in turn, what the effects of an event have to tell the ticket. */
async function hear(
  tx: Transaction,
  deps: Deps,
  { told, applied }: { told: readonly TicketEvent[]; applied: Applied & { ok: true } },
): Promise<Applied> {
  let last = applied
  for (const event of told) {
    const next = await applyTicketEvent(tx, deps, { ticketId: applied.ticketId, event })
    if (next.ok) last = next
  }
  return last
}

async function factsOf(tx: Transaction, kitId: string): Promise<KitFacts> {
  const facts = await findKitFacts(tx, kitId)
  if (!facts) throw new Error(`There is no kit ${kitId}.`)
  return facts
}

type Figure = Extract<TicketEvent, { kind: 'opened' }>['figure']

/** Opens a ticket for a kit, or worsens the one that is open. */
export async function raiseTrouble(
  tx: Transaction,
  deps: Deps,
  { facts, trouble, figure }: { facts: KitFacts; trouble: Trouble; figure?: Figure },
): Promise<Applied> {
  const open = await findOpenTicket(tx, facts.kit.id)
  const applied = open
    ? await applyTicketEvent(tx, deps, { ticketId: open.id, event: { kind: 'worsened', trouble } })
    : await openTicket(tx, deps, { facts, trouble, figure })
  if (applied.ok && (trouble === 'unwell' || trouble === 'danger sign')) {
    await noticeIllness(tx, deps, { facts, ticketId: applied.ticketId })
  }
  return applied
}

async function openTicket(
  tx: Transaction,
  deps: Deps,
  { facts, trouble, figure }: { facts: KitFacts; trouble: Trouble; figure?: Figure },
): Promise<Applied> {
  const now = deps.clock.now()
  const celsius = areaCelsius(facts.area, now)
  const counted = await oddsAtOpening(tx, { area: facts.area, trouble, now })
  const event: TicketEvent = {
    kind: 'opened',
    trouble,
    celsius,
    ...counted,
    ...(figure ? { figure } : {}),
  }
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
    staffId: null,
    at: now,
  })
  const told = await runTicketEffects(tx, deps, {
    facts,
    ticketId: row.id,
    n: 1,
    state: decision.state,
    effects: decision.effects,
  })
  return hear(tx, deps, {
    told,
    applied: { ok: true, state: decision.state, ticketId: row.id },
  })
}
