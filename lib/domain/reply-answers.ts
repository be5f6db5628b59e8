import {
  areBeside,
  denied,
  isDenied,
  isNamed,
  isSaid,
  said,
  sureOf,
  type Sense,
} from './reply-sense'

/** Readings of what is left when there is neither danger nor trouble. */
export type AnswerKind =
  'done' | 'not-yet' | 'need-part' | 'ask' | 'thanks' | 'yes' | 'no' | 'start' | 'help' | 'moved'

export type Answer = { kind: AnswerKind; sure: number }

/** A number people would give for a bottle: from some seconds to half a day. */
const longestFillMinutes = 720

type Figure = { minutes: number; hasUnit: boolean }

/** The bottle-fill time a text gives, if it gives one. */
export function figureOf(sense: Sense): Figure | null {
  if (isSaid(sense, 'future', 'notYet') || isTimeOfDay(sense)) return null
  const spans = sense.figures.spans.map((span) => span.minutes).filter((minutes) => minutes > 0)
  const [first, second] = spans
  if (first !== undefined) {
    const low = sense.figures.bare.at(0)?.value
    if (second === undefined && low !== undefined && low > 0 && low < first && low >= first / 3) {
      return { minutes: (low + first) / 2, hasUnit: true }
    }
    return { minutes: spans.at(-1) ?? first, hasUnit: true }
  }
  const values = sense.figures.bare.map((bare) => bare.value).filter((value) => value > 0)
  const [one, other] = values
  if (one === undefined || values.length > 2 || one > longestFillMinutes) return null
  if (other === undefined) return { minutes: one, hasUnit: false }
  const isRange = other > one && other <= one * 2
  return isRange && one > 3 ? { minutes: (one + other) / 2, hasUnit: false } : null
}

function isTimeOfDay(sense: Sense): boolean {
  return isSaid(sense, 'ago')
}

/** How much of the text is the number itself: "about 12 now" against a story with a number in it. */
export function isMostlyFigure(sense: Sense): boolean {
  const others = sense.words - sense.figures.bare.length
  return others <= 4 && sense.unknownWords <= 1
}

export function findAnswer(sense: Sense): Answer | null {
  const rules = [needPart, notYet, moved, ask, done, keywords, thanksOnly, yesNo]
  for (const rule of rules) {
    const answer = rule(sense)
    if (answer) return answer
  }
  return null
}

function needPart(sense: Sense): Answer | null {
  const things = said(sense, 'piece', 'filter', 'cloth', 'container')
  const wants = said(sense, 'need', 'lack', 'lost').filter((mark) =>
    areBeside(sense, [mark], things, 5),
  )
  if (wants.length === 0) return null
  const lacksFilter =
    !isSaid(sense, 'piece', 'cloth', 'container') && !isSaid(sense, 'need', 'lost')
  return { kind: 'need-part', sure: lacksFilter ? 0.5 : sureOf(0.8, wants) }
}

function notYet(sense: Sense): Answer | null {
  const undone = denied(sense, 'done', 'wash', 'change')
  const planned = said(sense, 'future').filter(() => isNamed(sense, 'wash', 'change', 'done'))
  const marks = [...said(sense, 'notYet', 'forgot'), ...undone, ...planned]
  return marks.length > 0 ? { kind: 'not-yet', sure: sureOf(0.85, marks) } : null
}

function moved(sense: Sense): Answer | null {
  const marks = said(sense, 'moved')
  return marks.length > 0 ? { kind: 'moved', sure: sureOf(0.85, marks) } : null
}

function ask(sense: Sense): Answer | null {
  const isQuestion = sense.text.includes('?')
  const marks = said(sense, 'ask')
  if (marks.length > 0) return { kind: 'ask', sure: sureOf(isQuestion ? 0.85 : 0.75, marks) }
  return isQuestion && sense.words > 2 ? { kind: 'ask', sure: 0.65 } : null
}

function done(sense: Sense): Answer | null {
  const marks = [...said(sense, 'done', 'better'), ...denied(sense, 'slow', 'drip', 'blocked')]
  if (marks.length > 0) return { kind: 'done', sure: sureOf(0.85, marks) }
  const runsWell = areBeside(sense, said(sense, 'flow'), said(sense, 'good', 'fast'), 3)
  return runsWell ? { kind: 'done', sure: 0.7 } : null
}

function keywords(sense: Sense): Answer | null {
  const starts = said(sense, 'startWord')
  if (starts.length > 0) return { kind: 'start', sure: sureOf(0.8, starts) }
  const helps = said(sense, 'helpWord')
  return helps.length > 0 ? { kind: 'help', sure: sureOf(0.8, helps) } : null
}

function thanksOnly(sense: Sense): Answer | null {
  const marks = said(sense, 'thanks')
  if (marks.length === 0) return null
  if (isSaid(sense, 'yes') || isDenied(sense, 'good')) return null
  return { kind: 'thanks', sure: sureOf(sense.unknownWords > 3 ? 0.5 : 0.85, marks) }
}

function yesNo(sense: Sense): Answer | null {
  const yes = said(sense, 'yes')
  const no = said(sense, 'no')
  if (yes.length > 0 && no.length > 0) return null
  if (yes.length > 0) return { kind: 'yes', sure: sureOf(sense.unknownWords > 3 ? 0.5 : 0.85, yes) }
  if (no.length > 0) return { kind: 'no', sure: sense.words <= 4 ? 0.85 : 0.5 }
  return isSaid(sense, 'good') && sense.unknownWords <= 2 ? { kind: 'yes', sure: 0.62 } : null
}
