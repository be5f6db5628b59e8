import type { Answer } from './reply-answer-kind'
import type { Mark } from './reply-marks'
import { areBeside, denied, isDenied, isSaid, said, sureOf, type Sense } from './reply-sense'
import { isOver } from './reply-trouble'
import type { Concept } from './reply-words/concept'

/** Words of danger: when a text denies them and says nothing else, it answers no. */
export const dangers: Concept[] = [
  'broken',
  'leak',
  'fall',
  'frozen',
  'odd',
  'smell',
  'oddSmell',
  'taste',
  'ill',
  'vomit',
  'pain',
  'blood',
]

/** What was asked for is done, or all runs well. */
export function findDone(sense: Sense): Answer | null {
  const marks = [...said(sense, 'done', 'better'), ...denied(sense, 'slow', 'blocked')]
  if (marks.length > 0) return { kind: 'done', sure: sureOf(doneSureness(sense, marks), marks) }
  // "All is well with the filter and with us".
  const isOfWater = isSaid(sense, 'filter', 'water', 'flow') && !isSaid(sense, 'not')
  if (sense.asked === 'none' && isSaid(sense, 'yes') && isOfWater) {
    return { kind: 'done', sure: 0.65 }
  }
  if (isOver(sense)) return { kind: 'done', sure: 0.75 }
  // "Works well, nobody ill".
  const isAllWell = isSaid(sense, 'good') && isDenied(sense, ...dangers)
  if (isAllWell && sense.asked === 'none') return { kind: 'done', sure: 0.7 }
  const isSound = areBeside(sense, said(sense, 'filter'), said(sense, 'good'), 4)
  if (isSound && !isSaid(sense, 'not', 'ask', 'if')) return { kind: 'done', sure: 0.7 }
  const runsWell = areBeside(sense, said(sense, 'flow'), said(sense, 'good', 'fast'), 3)
  const isWashOk = isSaid(sense, 'wash') && isSaid(sense, 'yes', 'good') && sense.words <= 3
  const isCleaned = sense.asked === 'wash' && isSaid(sense, 'clean')
  const isWellNow = isSaid(sense, 'good') && isSaid(sense, 'now') && sense.asked !== 'none'
  return runsWell || isWellNow || isCleaned || (sense.asked === 'wash' && isWashOk)
    ? { kind: 'done', sure: 0.7 }
    : null
}

/** Bengali "has become" is said of a wash as of a noise. */
const becomings = new Set(
  'হইছে হয়েছে হলো গেছে গেসে hoise hoyeche hoiche hoise holo gese geche'.split(' '),
)

/** What follows a "but" without a meaning here may be anything: a person reads it. */
function doneSureness(sense: Sense, marks: readonly Mark[]): number {
  const isVague = marks.every((mark) => becomings.has(sense.tokens[mark.to - 1]?.text ?? ''))
  if (isVague && (sense.unknownWords > 0 || isSaid(sense, 'notBack'))) return 0.5
  const settled: Concept[] = ['good', 'better', 'yes', 'done', 'fast', 'now', 'clean', 'past', 'no']
  const but = said(sense, 'but').at(-1)
  if (but === undefined) return 0.85
  const after = sense.marks.filter((mark) => mark.from >= but.to)
  const isSettled = after.some((mark) => mark.denied || settled.includes(mark.concept))
  const isFollowed = sense.tokens.length - but.to >= 2
  return isFollowed && !isSettled ? 0.5 : 0.85
}
