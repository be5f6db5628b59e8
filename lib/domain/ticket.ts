import { answered, endTicket, stopUsing } from './ticket-answer'
import {
  handedOn,
  noAnswer,
  partHandedOver,
  partPromised,
  stepSent,
  taken,
  visitBooked,
  visitDone,
} from './ticket-moves'
import { opened, worsened } from './ticket-opening'
import type {
  Decision,
  Refusal,
  TicketEvent,
  TicketOutcome,
  TicketStage,
  TicketState,
} from './ticket-types'
import { stepOf } from './walk-catalogue'

export type { Decision, TicketEffect, TicketEvent, TicketStage, TicketState } from './ticket-types'
export type { Trouble } from './trouble'

/** True while somebody still has something to do about the ticket. */
export function isOpen(stage: TicketStage): boolean {
  return stage !== 'flowing' && stage !== 'retired' && stage !== 'withdrawn'
}

/**
 * What an event does to a ticket: its new state, and effects for the caller to carry out in the
 * same transaction. `now` is in epoch milliseconds. An event that cannot be is refused and changes
 * nothing.
 */
export function decide(state: TicketState | null, event: TicketEvent, now: number): Decision {
  if (event.kind === 'opened') {
    return state ? { ok: false, reason: 'already open' } : accept(opened(event, now))
  }
  if (!state || !isOpen(state.stage)) return { ok: false, reason: 'not open' }
  const refusal = refusalOf(state, event)
  return refusal ? { ok: false, reason: refusal } : accept(apply(state, event, now))
}

/**
 * A ticket from its events in order. They were decided under the rules of their day: one that
 * today's rules refuse is passed over, so that a change of rules never loses a ticket.
 */
export function fold(events: readonly { event: TicketEvent; at: number }[]): TicketState | null {
  return events.reduce<TicketState | null>((state, { event, at }) => {
    const decision = decide(state, event, at)
    return decision.ok ? decision.state : state
  }, null)
}

function accept({ state, effects }: TicketOutcome): Decision {
  return { ok: true, state, effects }
}

function refusalOf(state: TicketState, event: TicketEvent): Refusal | null {
  switch (event.kind) {
    case 'taken':
      return state.takenBy && state.takenBy !== event.staffId ? 'taken by another' : null
    case 'step sent':
      if (!stepOf(event.stepId)) return 'unknown step'
      if (event.by === null) {
        return state.automatic || state.waitingFor === event.stepId ? null : 'not automatic'
      }
      return state.takenBy && state.takenBy !== event.by ? 'taken by another' : null
    case 'answered':
      return stepOf(event.stepId) ? null : 'unknown step'
    case 'part handed over':
      return state.stage === 'part owed' ? null : 'nothing promised'
    case 'visit done':
      return state.stage === 'visit due' || state.visitId ? null : 'no visit due'
    default:
      return null
  }
}

type Later = Exclude<TicketEvent, { kind: 'opened' }>

function apply(state: TicketState, event: Later, now: number): TicketOutcome {
  switch (event.kind) {
    case 'taken':
      return taken(state, event.staffId)
    case 'handed on':
      return handedOn(state, event.staffId)
    case 'worsened':
      return worsened(state, event.trouble, now)
    case 'step sent':
      return stepSent(state, event.stepId)
    case 'answered':
      return answered(state, event, now)
    case 'part promised':
      return partPromised(state, event)
    case 'part handed over':
      return partHandedOver(state)
    case 'visit booked':
      return visitBooked(state, event.visitId)
    case 'visit done':
      return visitDone(state, event.flowing, now)
    case 'stopped using':
      return stopUsing(state, now)
    case 'no answer':
      return noAnswer(state, now)
    case 'ended':
      return endTicket(state, { end: event.end, cause: event.cause, now })
  }
}
