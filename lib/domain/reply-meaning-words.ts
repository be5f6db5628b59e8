import type { Asked, ReplyReading } from './reply'
import { replyKindWords, spanWords } from './slip-words'

/** What a reading says, in words for staff: `slow water, 12 minutes a bottle`. */
export function meaningWords(
  reading: Pick<ReplyReading, 'kind' | 'dangerSign' | 'alsoSlow'> & {
    minutes?: number | null | undefined
    choice?: number | null | undefined
  },
): string {
  const { kind, minutes, choice } = reading
  const isChoice = typeof choice === 'number'
  const parts = [
    isChoice ? `choice ${choice}` : kind === 'unclear' ? 'not clear' : replyKindWords[kind],
    !isChoice && typeof minutes === 'number' ? `${spanWords(minutes)} a bottle` : '',
    reading.dangerSign ? 'with a danger sign' : '',
    reading.alsoSlow ? 'and slow water' : '',
  ]
  return parts.filter(Boolean).join(', ')
}

/** How sure a reading is, from 0 to 1, as `85 % sure`. */
export function sureWords(sure: number): string {
  return `${Math.round(sure * 100)}\u00a0% sure`
}

/** What a reply was an answer to, in words for staff. */
export const askedWords: Record<Asked, string> = {
  wash: 'to wash the filter',
  change: 'to change a stage',
  flow: 'how long a bottle takes',
  step: 'a step of the walk',
  none: 'nothing',
}

export const askedKinds = Object.keys(askedWords) as readonly Asked[]
