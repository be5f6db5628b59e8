import { causeWords } from './end-causes'
import type { TicketEvent, TicketState } from './ticket-types'
import type { Trouble } from './trouble'
import { stepOf } from './walk-catalogue'

/** What a ticket is about, in words. */
export const troubleWords: Record<Trouble, string> = {
  slow: 'slow water',
  'no flow': 'no water comes',
  unwell: 'someone is unwell',
  'danger sign': 'unwell, with a danger sign',
  unsafe: 'the filter may be unsafe',
  unread: 'words nobody has read',
  silent: 'no answer',
}

export const stageWords = { 1: 'cloth', 2: 'carbon', 3: 'fibre' } as const

/** `Whitlock house`; a name that says so itself stays as it is. */
export function houseName(name: string): string {
  return /\bhouse$/i.test(name) ? name : `${name} house`
}

const endWords = { flowing: 'Flowing', retired: 'Kit withdrawn', withdrawn: 'Withdrawn' } as const

/** How a ticket ended, and of what. */
export function endInWords(state: Pick<TicketState, 'stage' | 'cause'>): string {
  if (state.stage !== 'flowing' && state.stage !== 'retired' && state.stage !== 'withdrawn')
    return ''
  const cause = state.cause ? `: ${causeWords(state.cause).toLowerCase()}` : ''
  return `${endWords[state.stage]}${cause}`
}

function stepName(stepId: string): string {
  return stepOf(stepId)?.name ?? stepId
}

function answerWords({ stepId, answer, minutes }: Extract<TicketEvent, { kind: 'answered' }>) {
  if (minutes !== undefined) return `${minutes} minutes a bottle`
  const label = stepOf(stepId)?.answers.find((one) => one.answer === answer)?.label
  return (label ?? answer).toLowerCase()
}

/** Names of staff by their id. */
export type Names = (staffId: string) => string

/** One event of a ticket, in words for its history. */
export function eventWords(event: TicketEvent, nameOf: Names): string {
  switch (event.kind) {
    case 'opened':
      return `Opened: ${troubleWords[event.trouble]}`
    case 'taken':
      return 'Taken'
    case 'handed on':
      return event.staffId ? `Handed on to ${nameOf(event.staffId)}` : 'Back in the shift'
    case 'worsened':
      return `Now: ${troubleWords[event.trouble]}`
    case 'step sent':
      return `Sent: ${stepName(event.stepId).toLowerCase()}`
    case 'answered':
      return `${stepName(event.stepId)}: ${answerWords(event)}`
    case 'part promised':
      return `Promised: a part for the ${stageWords[event.stage]} stage`
    case 'part handed over':
      return 'Part handed over and fitted'
    case 'visit booked':
      return 'Visit booked'
    case 'visit done':
      return event.flowing ? 'Visited: it flows' : 'Visited: it does not flow yet'
    case 'stopped using':
      return 'Told to stop using it'
    case 'no answer':
      return 'No answer'
    case 'ended':
      return endInWords({ stage: event.end, cause: event.cause })
  }
}
