import type { EndStage } from './ticket-types'
import { suspectIds, suspectNames } from './walk-suspects'

const others = {
  'no fault found': 'No fault found',
  'not known': 'Not known: it runs again',
  'gave it back': 'The family gave it back',
  'beyond repair': 'Beyond repair',
  'moved away': 'The family moved away',
  'lost or stolen': 'Lost or stolen',
  'no trouble': 'There was no trouble',
  'answered in words': 'A question, answered in words',
  'saw a health worker': 'The family saw a health worker',
  'wrong household': 'It was about another household',
} as const

type Other = keyof typeof others

export type EndCause = Other | (typeof suspectIds)[number]

/** Why each end may come, most telling first. What cured it is counted for the next walks. */
const causesOf: Record<EndStage, readonly EndCause[]> = {
  flowing: [...suspectIds, 'no fault found', 'not known'],
  retired: ['gave it back', 'beyond repair', 'moved away', 'lost or stolen'],
  withdrawn: ['no trouble', 'answered in words', 'saw a health worker', 'wrong household'],
}

export const endCauses = Object.values(causesOf).flat()

/** A cause in words; what is no cause of ours stands as it is. */
export function causeWords(cause: string): string {
  const named: Record<string, string> = { ...suspectNames, ...others }
  return named[cause] ?? cause
}

/** The causes that an end may be given, with their words. */
export function causesFor(end: EndStage): { cause: EndCause; words: string }[] {
  return causesOf[end].map((cause) => ({ cause, words: causeWords(cause) }))
}

/** Whether a cause fits an end: nothing is cured by having moved away. */
export function isCauseOf(end: EndStage, cause: string): boolean {
  return causesOf[end].some((one) => one === cause)
}
