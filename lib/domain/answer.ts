import type { Asked, ReplyReading } from './reply'
import type { Moment } from './moments'
import type { Trouble } from './trouble'
import { stepOf, type StepAnswer, type StepId } from './walk-catalogue'

/** What the desk knows when a reply has been read. */
export type AnswerInput = {
  reading: ReplyReading
  /** What was last asked of this phone. */
  asked: Asked
  /** The step whose answer the household's open ticket awaits; null without one. */
  waitingFor: StepId | null
  hasOpenTicket: boolean
  /** The carrier acted on the word itself and answered it: a text of ours would be refused. */
  handledByCarrier: boolean
  /** The words may be "stop" or "it stopped". */
  mayMeanStop: boolean
}

/** What a reply makes the desk do, as data. */
export type AnswerAct =
  | { kind: 'withdraw consent' }
  | { kind: 'give consent' }
  | { kind: 'suspend phone'; why: string }
  | { kind: 'mark moved' }
  | { kind: 'close prompts' }
  | { kind: 'log wash' }
  | { kind: 'log change' }
  /** Keep a flow reading; slow water, or water they call slow, opens a ticket that has its figure. */
  | { kind: 'log flow'; minutes: number; saysSlow: boolean }
  | { kind: 'answer step'; stepId: StepId; answer: StepAnswer; minutes?: number }
  | { kind: 'raise trouble'; trouble: Trouble }
  | { kind: 'send'; moment: Moment }

/**
 * What to do about a reply. The order of reading is the reader's (opt-out, danger, wrong number, then what
 * was asked); here each meaning becomes acts. Whatever is unsure becomes a trouble that a person reads.
 */
export function answerTo(input: AnswerInput): AnswerAct[] {
  const { reading } = input
  switch (reading.kind) {
    case 'stop':
      return input.handledByCarrier
        ? [{ kind: 'withdraw consent' }, { kind: 'close prompts' }]
        : [
            { kind: 'withdraw consent' },
            { kind: 'close prompts' },
            { kind: 'send', moment: 'stopped' },
          ]
    case 'start':
      return input.handledByCarrier
        ? [{ kind: 'give consent' }]
        : [{ kind: 'give consent' }, { kind: 'send', moment: 'started' }]
    case 'help':
      return input.handledByCarrier ? [] : [{ kind: 'send', moment: 'help' }]
    case 'unwell':
      return [
        { kind: 'close prompts' },
        { kind: 'raise trouble', trouble: reading.dangerSign ? 'danger sign' : 'unwell' },
      ]
    case 'broken':
    case 'odd-water':
      return [{ kind: 'close prompts' }, { kind: 'raise trouble', trouble: 'unsafe' }]
    case 'wrong-number':
      return [
        { kind: 'close prompts' },
        { kind: 'send', moment: 'wrong-number' },
        { kind: 'suspend phone', why: 'Somebody there says it is the wrong number.' },
      ]
    case 'moved':
      return [
        { kind: 'mark moved' },
        { kind: 'close prompts' },
        { kind: 'raise trouble', trouble: 'unread' },
      ]
    case 'slow':
    case 'no-flow':
      return troubleActs(input, reading.kind === 'slow' ? 'slow' : 'no flow')
    case 'flow-figure':
      return figureActs(input)
    case 'done':
      return doneActs(input)
    case 'choice':
    case 'yes':
    case 'no':
      return pickActs(input)
    // "Later" refuses nothing: the step, like the prompt, goes on waiting for its answer.
    case 'not-yet':
    case 'thanks':
      return []
    case 'need-part':
    case 'ask':
      return unread()
    case 'unclear':
      return input.mayMeanStop
        ? [...unread(), { kind: 'send', moment: 'stop-or-stopped' }]
        : unread()
  }
}

function unread(): AnswerAct[] {
  return [{ kind: 'close prompts' }, { kind: 'raise trouble', trouble: 'unread' }]
}

function stepAnswer(stepId: StepId, answer: StepAnswer, minutes?: number): AnswerAct {
  return { kind: 'answer step', stepId, answer, ...(minutes === undefined ? {} : { minutes }) }
}

function troubleActs(
  { reading, waitingFor }: AnswerInput,
  trouble: 'slow' | 'no flow',
): AnswerAct[] {
  // A figure with the complaint says more than the complaint.
  if (waitingFor && reading.minutes !== undefined)
    return [stepAnswer(waitingFor, 'done', reading.minutes)]
  if (waitingFor && stepOf(waitingFor)?.kind === 'cure')
    return [stepAnswer(waitingFor, 'not cured')]
  if (waitingFor === 'ask-flow' && trouble === 'no flow') return [stepAnswer(waitingFor, 'no')]
  return reading.minutes === undefined
    ? [{ kind: 'close prompts' }, { kind: 'raise trouble', trouble }]
    : [{ kind: 'close prompts' }, { kind: 'log flow', minutes: reading.minutes, saysSlow: true }]
}

function figureActs({ reading, asked, waitingFor, hasOpenTicket }: AnswerInput): AnswerAct[] {
  const minutes = reading.minutes
  if (minutes === undefined) return unread()
  if (waitingFor) return [stepAnswer(waitingFor, 'done', minutes)]
  if (hasOpenTicket) return [stepAnswer('ask-flow', 'done', minutes)]
  // Minutes in answer to a wash prompt are timed after the wash that was asked for.
  const washed: AnswerAct[] = asked === 'wash' ? [{ kind: 'log wash' }] : []
  return [
    { kind: 'close prompts' },
    ...washed,
    { kind: 'log flow', minutes, saysSlow: reading.alsoSlow ?? false },
  ]
}

function doneActs({ asked, waitingFor }: AnswerInput): AnswerAct[] {
  if (waitingFor) return [stepAnswer(waitingFor, 'done')]
  switch (asked) {
    case 'wash':
      return [{ kind: 'close prompts' }, { kind: 'log wash' }, { kind: 'send', moment: 'thanks' }]
    case 'change':
      return [{ kind: 'log change' }, { kind: 'close prompts' }, { kind: 'send', moment: 'thanks' }]
    case 'flow':
    case 'step':
    case 'none':
      return [{ kind: 'close prompts' }]
  }
}

function pickActs({ reading, waitingFor, asked }: AnswerInput): AnswerAct[] {
  const step = waitingFor === null ? undefined : stepOf(waitingFor)
  if (!step || waitingFor === null) {
    const isMinutes = reading.minutes !== undefined && (asked === 'wash' || asked === 'flow')
    return isMinutes
      ? [
          { kind: 'close prompts' },
          { kind: 'log flow', minutes: reading.minutes ?? 0, saysSlow: false },
        ]
      : unread()
  }
  const picked: StepAnswer =
    reading.kind === 'choice'
      ? (`choice-${reading.choice ?? 1}` as StepAnswer)
      : reading.kind === 'yes'
        ? 'yes'
        : 'no'
  if (step.answers.some((one) => one.answer === picked)) return [stepAnswer(waitingFor, picked)]
  // A bare small number where no choices were offered is the minutes of a quick filter.
  if (reading.minutes !== undefined) return [stepAnswer(waitingFor, 'done', reading.minutes)]
  if (reading.kind === 'yes') return [stepAnswer(waitingFor, 'done')]
  return unread()
}
