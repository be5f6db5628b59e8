import { answered, isUnderWay, sendStep, takeOutOfService } from './ticket-answer'
import type { TicketEvent, TicketOutcome, TicketState } from './ticket-types'
import { isDanger, isWorse, type Trouble } from './trouble'
import { nextStep, startWalk } from './walk'

type Opened = Extract<TicketEvent, { kind: 'opened' }>

/** A new ticket. Slow and stopped water are walked at once; danger gets its fixed answer. */
export function opened(event: Opened, now: number): TicketOutcome {
  const { trouble } = event
  const state: TicketState = {
    stage: 'new',
    trouble,
    takenBy: null,
    automatic: false,
    walk: null,
    waitingFor: null,
    failedWashes: 0,
    openedAt: now,
    noSafeWaterSince: null,
    endedAt: null,
    cause: null,
    outOfService: false,
    promisedStage: null,
    promiseId: null,
    visitId: null,
  }
  if (isDanger(trouble)) return fixedAnswer(state, now)
  return isWalked(trouble) ? startWalking(state, event, now) : { state, effects: [] }
}

/** More was told of an open ticket. It can only weigh more than before, never less. */
export function worsened(state: TicketState, trouble: Trouble, now: number): TicketOutcome {
  if (!isWorse(trouble, state.trouble)) return { state, effects: [] }
  const worse: TicketState = { ...state, trouble }
  if (isDanger(trouble)) return fixedAnswer({ ...worse, automatic: false }, now)
  const isAlreadyWalked = state.walk !== null || state.takenBy !== null || isUnderWay(state)
  return isWalked(trouble) && !isAlreadyWalked
    ? startWalking(worse, {}, now)
    : { state: worse, effects: [] }
}

function isWalked(trouble: Trouble): boolean {
  return trouble === 'slow' || trouble === 'no flow'
}

function startWalking(
  state: TicketState,
  { odds, oddsOrigin, cues, celsius, figure }: Omit<Opened, 'kind' | 'trouble'>,
  now: number,
): TicketOutcome {
  const walk = startWalk({
    trouble: state.trouble,
    priors: odds,
    origin: oddsOrigin,
    cues,
    celsius,
  })
  const walking: TicketState = { ...state, walk, automatic: true, stage: 'walking' }
  if (figure) {
    return answered(
      walking,
      { kind: 'answered', stepId: 'ask-flow', answer: 'done', ...figure },
      now,
    )
  }
  const next = nextStep(walk)
  // A walk with nothing tried cannot have ended; were it so, a person would see it in the shift.
  return next.kind === 'step' ? sendStep(walking, next.step.id) : { state: walking, effects: [] }
}

/** The fixed answers to danger. A person does all that follows. */
function fixedAnswer(state: TicketState, now: number): TicketOutcome {
  if (state.trouble === 'unsafe') {
    const out = takeOutOfService(state, now)
    return { state: out.state, effects: [{ kind: 'send', moment: 'stop-using' }, ...out.effects] }
  }
  const moment = state.trouble === 'danger sign' ? 'unwell-now' : 'unwell'
  return { state, effects: [{ kind: 'send', moment }] }
}
