import type { Recovery } from './flow'
import type { Moment } from './moments'
import type { Trouble } from './trouble'
import type { Walk } from './walk'
import type { StepAnswer, StepId } from './walk-catalogue'
import type { OddsOrigin } from './walk-history'
import type { Cue, Odds } from './walk-suspects'

export type StageNumber = 1 | 2 | 3

export type OpenStage = 'new' | 'walking' | 'waiting' | 'part owed' | 'visit due'
export type EndStage = 'flowing' | 'retired' | 'withdrawn'
export type TicketStage = OpenStage | EndStage

/** Times are epoch milliseconds. */
export type TicketState = {
  stage: TicketStage
  trouble: Trouble
  takenBy: string | null
  /** Steps go out by themselves. */
  automatic: boolean
  walk: Walk | null
  /** The step whose answer is awaited; set if and only if the stage is waiting. */
  waitingFor: StepId | null
  /** In a row, up to now. */
  failedWashes: number
  openedAt: number
  noSafeWaterSince: number | null
  endedAt: number | null
  cause: string | null
  outOfService: boolean
  promisedStage: StageNumber | null
  promiseId: string | null
  visitId: string | null
}

export type Need = 'enough' | 'slow' | 'short'

export type TicketEvent =
  | {
      kind: 'opened'
      trouble: Trouble
      /** Counted for the area and season; without them the catalogue's own. */
      odds?: Odds
      /** Where those were counted, kept as it was that day. */
      oddsOrigin?: OddsOrigin
      cues?: readonly Cue[]
      celsius?: number
      /** A flow figure that came with the complaint: it need not be asked for. */
      figure?: { recovery: Recovery; need?: Need }
    }
  | { kind: 'taken'; staffId: string }
  | { kind: 'handed on'; staffId: string | null }
  | { kind: 'worsened'; trouble: Trouble }
  /** `by` is null for a step that went out by itself. */
  | { kind: 'step sent'; stepId: StepId; by: string | null }
  | {
      kind: 'answered'
      stepId: StepId
      answer: StepAnswer
      recovery?: Recovery
      minutes?: number
      need?: Need
    }
  | { kind: 'part promised'; promiseId: string; stage: StageNumber }
  | { kind: 'part handed over'; promiseId: string }
  | { kind: 'visit booked'; visitId: string }
  | { kind: 'visit done'; flowing: boolean }
  | { kind: 'stopped using' }
  | { kind: 'no answer' }
  | { kind: 'ended'; end: EndStage; cause: string }

export type TicketEffect =
  | { kind: 'send step'; stepId: StepId }
  | { kind: 'send'; moment: Moment }
  | { kind: 'promise part'; stage: StageNumber }
  | { kind: 'ask for visit' }
  /** The fibre stage was washed, whatever it brought. */
  | { kind: 'log wash'; known: 'said' | 'measured' }
  | { kind: 'out of service' }
  | { kind: 'back in service' }
  | { kind: 'tell coordinator'; why: string }
  | { kind: 'closed' }

export type Refusal =
  | 'not open'
  | 'already open'
  | 'taken by another'
  | 'not automatic'
  | 'unknown step'
  | 'nothing promised'
  | 'no visit due'

export type Decision =
  { ok: true; state: TicketState; effects: TicketEffect[] } | { ok: false; reason: Refusal }

/** A state with what is to be done about it. */
export type TicketOutcome = { state: TicketState; effects: TicketEffect[] }
