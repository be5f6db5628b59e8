import { endTicket, isUnderWay, sendStep } from './ticket-answer'
import type { StageNumber, TicketOutcome, TicketState } from './ticket-types'
import { isDanger } from './trouble'
import { answerStep, nextStep, startWalk } from './walk'

function only(state: TicketState): TicketOutcome {
  return { state, effects: [] }
}

/** A person has it: from here no step goes out by itself. */
export function taken(state: TicketState, staffId: string): TicketOutcome {
  const stage = state.stage === 'new' ? 'walking' : state.stage
  return only({ ...state, takenBy: staffId, automatic: false, stage })
}

/** To another person, or (null) back to the shift for whoever takes the next. */
export function handedOn(state: TicketState, staffId: string | null): TicketOutcome {
  return only({ ...state, takenBy: staffId, automatic: state.automatic && staffId === null })
}

/** A step left. While a part or a person is on the way the ticket stays what it is. */
export function stepSent(state: TicketState, stepId: string): TicketOutcome {
  return only(isUnderWay(state) ? state : { ...state, stage: 'waiting', waitingFor: stepId })
}

export function partPromised(
  state: TicketState,
  { promiseId, stage }: { promiseId: string; stage: StageNumber },
): TicketOutcome {
  return {
    state: { ...state, stage: 'part owed', waitingFor: null, promisedStage: stage, promiseId },
    effects: [{ kind: 'send', moment: 'part-owed' }],
  }
}

/** The household has the part: only a flow figure tells whether it is fitted and runs. */
export function partHandedOver(state: TicketState): TicketOutcome {
  // What was tried concerned the old part.
  const walk = startWalk({ trouble: state.trouble, celsius: state.walk?.celsius })
  return sendStep(
    { ...state, walk, failedWashes: 0, promisedStage: null, promiseId: null },
    'ask-flow',
  )
}

export function visitBooked(state: TicketState, visitId: string): TicketOutcome {
  const stage = state.stage === 'part owed' ? 'part owed' : 'visit due'
  return {
    state: { ...state, visitId, stage, waitingFor: null },
    effects: [{ kind: 'send', moment: 'visit-booked' }],
  }
}

/** Seen flowing ends it. Otherwise it is a person's again, or still owed a part. */
export function visitDone(state: TicketState, flowing: boolean, now: number): TicketOutcome {
  if (flowing) {
    return endTicket(state, { end: 'flowing', cause: state.cause ?? 'mended at a visit', now })
  }
  const stage = state.stage === 'part owed' ? 'part owed' : 'walking'
  return only({ ...state, stage, visitId: null, waitingFor: null, automatic: false })
}

/**
 * Nobody answered, after the nudges. The next step is a person's; silence that was already the
 * trouble, or two unanswered steps in a row, need a visit.
 */
export function noAnswer(state: TicketState, now: number): TicketOutcome {
  if (isDanger(state.trouble)) {
    return { state, effects: [{ kind: 'tell coordinator', why: 'danger, and nobody answers' }] }
  }
  if (isUnderWay(state)) return only(state)
  const walk =
    state.walk && state.waitingFor
      ? answerStep(state.walk, { stepId: state.waitingFor, answer: 'no answer', at: now })
      : state.walk
  const silent: TicketState = {
    ...state,
    walk,
    waitingFor: null,
    automatic: false,
    stage: state.stage === 'waiting' ? 'walking' : state.stage,
  }
  const next = walk ? nextStep(walk) : null
  const isVisit = state.trouble === 'silent' || (next?.kind === 'end' && next.end === 'visit')
  return isVisit
    ? { state: { ...silent, stage: 'visit due' }, effects: [{ kind: 'ask for visit' }] }
    : only(silent)
}
