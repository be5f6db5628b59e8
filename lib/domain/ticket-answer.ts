import type {
  EndStage,
  Need,
  TicketEffect,
  TicketEvent,
  TicketOutcome,
  TicketState,
} from './ticket-types'
import { isDanger, isWorse } from './trouble'
import { answerStep, nextStep, startWalk, type Walk } from './walk'
import { stepOf } from './walk-catalogue'
import type { Next } from './walk-rules'
import { coldCelsius, suspectIds } from './walk-suspects'
import { failedWashesInARow, isWashAnswer, trialsOf } from './walk-trials'

type Answered = Extract<TicketEvent, { kind: 'answered' }>

/** True while a part or a person is on the way: no answer by text takes that back. */
export function isUnderWay({ stage }: Pick<TicketState, 'stage'>): boolean {
  return stage === 'part owed' || stage === 'visit due'
}

/** Sends a step and waits for its answer. */
export function sendStep(state: TicketState, stepId: string): TicketOutcome {
  const waiting: TicketState = { ...state, stage: 'waiting', waitingFor: stepId }
  return { state: waiting, effects: [{ kind: 'send step', stepId }] }
}

/** Ends the ticket. A promise or a visit that is still open is the caller's to release. */
export function endTicket(
  state: TicketState,
  { end, cause, now }: { end: EndStage; cause: string; now: number },
): TicketOutcome {
  const isBack = end === 'flowing' && state.outOfService
  const ended: TicketState = {
    ...state,
    stage: end,
    cause,
    endedAt: now,
    automatic: false,
    waitingFor: null,
    outOfService: state.outOfService && !isBack,
    noSafeWaterSince: isBack ? null : state.noSafeWaterSince,
  }
  const closed: TicketEffect[] = [{ kind: 'closed' }]
  return { state: ended, effects: isBack ? [{ kind: 'back in service' }, ...closed] : closed }
}

/** Takes the filter out of service, once, and says what to drink meanwhile. */
export function takeOutOfService(state: TicketState, now: number): TicketOutcome {
  if (state.outOfService) return { state, effects: [] }
  return {
    state: { ...state, outOfService: true, noSafeWaterSince: state.noSafeWaterSince ?? now },
    effects: [{ kind: 'out of service' }, { kind: 'send', moment: 'drink-advice' }],
  }
}

/** A filter that must not be used: the fixed answer, the advice, and no step by itself. */
export function stopUsing(state: TicketState, now: number): TicketOutcome {
  if (state.outOfService && state.trouble === 'unsafe') return { state, effects: [] }
  const out = takeOutOfService(state, now)
  const trouble = isDanger(state.trouble) ? state.trouble : 'unsafe'
  return {
    state: {
      ...out.state,
      trouble,
      automatic: false,
      stage: isUnderWay(state) ? state.stage : 'walking',
      waitingFor: null,
    },
    effects: [{ kind: 'send', moment: 'stop-using' }, ...out.effects],
  }
}

/** What an answer to a step does to the ticket: to its walk first, then to its life. */
export function answered(state: TicketState, event: Answered, now: number): TicketOutcome {
  const before = state.walk ?? startWalk({ trouble: state.trouble })
  const walk = answerStep(before, { ...event, at: now })
  // Who times a litre and gets nothing has more than slow water.
  const isDry = stepOf(event.stepId)?.asks === 'flow' && event.answer === 'no'
  const heard: TicketState = {
    ...state,
    trouble: isDry && isWorse('no flow', state.trouble) ? 'no flow' : state.trouble,
    walk,
    failedWashes: failedWashesInARow(walk.tried),
    stage: isUnderWay(state) ? state.stage : 'walking',
    waitingFor: null,
  }
  const next = nextStep(walk)
  const { state: after, effects } = following(heard, next, { need: event.need, now })
  const known = event.recovery ? ('measured' as const) : ('said' as const)
  const washed: TicketEffect[] = isWashAnswer(event.stepId, event.answer)
    ? [{ kind: 'log wash', known }]
    : []
  return { state: after, effects: [...washed, ...effects] }
}

function following(
  heard: TicketState,
  next: Next,
  { need, now }: { need: Need | undefined; now: number },
): TicketOutcome {
  if (next.kind === 'step') {
    return heard.automatic && !isUnderWay(heard)
      ? sendStep(heard, next.step.id)
      : { state: heard, effects: [] }
  }
  return ended(heard, next, { need, now })
}

function ended(
  state: TicketState,
  next: Extract<Next, { kind: 'end' }>,
  { need, now }: { need: Need | undefined; now: number },
): TicketOutcome {
  if (next.end === 'stop using') return stopUsing(state, now)
  if (next.end === 'restored') return restored(state, now)
  if (isUnderWay(state)) return { state, effects: [] }
  const out = need === 'short' ? takeOutOfService(state, now) : { state, effects: [] }
  if (next.end === 'visit') {
    return {
      state: { ...out.state, stage: 'visit due' },
      effects: [{ kind: 'ask for visit' }, ...out.effects],
    }
  }
  const stage = next.stage ?? 3
  return {
    state: { ...out.state, stage: 'part owed', promisedStage: stage, cause: changedFor[stage] },
    effects: [{ kind: 'promise part', stage }, ...out.effects],
  }
}

const changedFor = { 1: 'full-cloth', 2: 'packed-carbon', 3: 'spent-fibre' } as const

/** Running water ends slow water and silence; it does not end illness, a crack or unread words. */
function restored(state: TicketState, now: number): TicketOutcome {
  if (isDanger(state.trouble) || state.trouble === 'unread') return { state, effects: [] }
  const cause = state.cause ?? causeOf(state.walk)
  const end = endTicket(state, { end: 'flowing', cause, now })
  return { state: end.state, effects: [{ kind: 'send', moment: 'flowing' }, ...end.effects] }
}

/** What a walk that brought the flow back tells of the cause. */
function causeOf(walk: Walk | null): string {
  const cures = trialsOf(walk?.tried ?? []).at(-1)?.step.cures
  if (!walk || !cures) {
    return walk?.celsius != null && walk.celsius <= coldCelsius ? 'cold-water' : 'no fault found'
  }
  const aimed = suspectIds.filter((id) => cures[id] !== undefined)
  return aimed.reduce((best, id) => (walk.odds[id] > walk.odds[best] ? id : best))
}
