import { minutesBetweenClocks } from './reply-clock'
import type { Mark } from './reply-marks'
import { isNamed, said, type Sense } from './reply-sense'
import type { Concept } from './reply-words/concept'

/** A number people would give for a bottle: from some seconds to half a day. */
const longestFillMinutes = 720

type Figure = { minutes: number; hasUnit: boolean }
type Place = { from: number; to: number }

/** The bottle-fill time a text gives, if it gives one. */
export function figureOf(sense: Sense): Figure | null {
  const clock = minutesBetweenClocks(sense)
  if (clock !== null) return { minutes: clock, hasUnit: true }
  if (isPutOff(sense) || isPastTime(sense) || promised(sense).length > 0) return null
  const spans = presentOf(
    sense,
    unrefused(
      sense,
      sense.figures.spans.filter((span) => span.minutes > 0),
    ),
  )
  const last = spans.at(-1)
  if (last === undefined) return bareFigure(sense)
  // "12 con 30 segundos": minutes stand bare before their seconds.
  const whole = sense.figures.bare.find((bare) => bare.to <= last.from && last.from - bare.to === 1)
  const isJoint = whole && secondsJoints.has(sense.tokens[whole.to]?.text ?? '')
  if (isJoint && last.minutes < 1) return { minutes: whole.value + last.minutes, hasUnit: true }
  // "5 to 6 minutes": the low end stands bare just before the high one.
  const low = sense.figures.bare.find((bare) => isRangeBetween(sense, bare.to, last.from))
  const isRange = low && low.value > 0 && low.value < last.minutes && low.value >= last.minutes / 3
  return { minutes: isRange ? (low.value + last.minutes) / 2 : last.minutes, hasUnit: true }
}

/** A plan puts the answer off, unless a figure was asked for and stands before the plan. */
function isPutOff(sense: Sense): boolean {
  const plans = said(sense, 'future', 'notYet')
  if (sense.asked !== 'flow') return plans.length > 0
  const first = Math.min(...sense.figures.spans.map((span) => span.from))
  return plans.some((plan) => plan.from < first)
}

const secondsJoints = new Set(['con', 'y', 'and', 'et'])

/** Words that stand between the ends of a range. */
const rangeWords = new Set('to or and a o y u ou et ba theke থেকে বা'.split(' '))

function isRangeBetween(sense: Sense, from: number, to: number): boolean {
  const between = sense.tokens.slice(from, to)
  return (
    from <= to &&
    between.length <= 1 &&
    between.every((token) => token.text === '-' || rangeWords.has(token.text))
  )
}

const denials: readonly Concept[] = ['no', 'not', 'notNext', 'notAround', 'notBack']

/** "Not 5, 8": of several figures those that are not taken back. */
function unrefused<Figured extends Place>(sense: Sense, figures: readonly Figured[]): Figured[] {
  const all = [...sense.figures.spans, ...sense.figures.bare]
  if (all.length < 2) return [...figures]
  const denied = sense.marks.filter(({ concept }) => denials.includes(concept))
  const isRefused = (figure: Place): boolean =>
    denied.some((mark) => {
      const isBengali = mark.language === 'bn'
      const gap = isBengali ? mark.from - figure.to : figure.from - mark.to
      return gap >= 0 && gap <= (isBengali ? 0 : 1)
    })
  const kept = figures.filter((figure) => !isRefused(figure))
  return all.every(isRefused) ? [...figures] : kept
}

/** "It was 4, now it is 9": of several figures those that are not of the past. */
function presentOf<Figured extends Place>(sense: Sense, figures: readonly Figured[]): Figured[] {
  const times = said(sense, 'past', 'now')
  if (figures.length < 2 || times.length === 0) return [...figures]
  const timed = figures.map((figure) => ({ figure, time: timeOf(sense, figure, times) }))
  const present = timed.filter(({ time }) => time === 'now')
  const notPast = timed.filter(({ time }) => time !== 'past')
  const kept = present.length > 0 ? present : notPast
  return (kept.length > 0 ? kept : timed).map(({ figure }) => figure)
}

/** Past or now, by the nearest word of time; the one before counts where two are as near. */
function timeOf(sense: Sense, figure: Place, times: readonly Mark[]): 'past' | 'now' | null {
  const distanceTo = (time: Mark): number => {
    const isBefore = time.to <= figure.from
    const [from, to] = isBefore ? [time.to, figure.from] : [figure.to, time.from]
    const breaks = sense.tokens.slice(from, to).filter((token) => token.kind === 'break').length
    return to - from + breaks * 3 + (isBefore ? 0 : 0.5)
  }
  const [nearest] = [...times].sort((one, other) => distanceTo(one) - distanceTo(other))
  return nearest === undefined || nearest.concept === 'now' ? 'now' : 'past'
}

/** "It used to take 10 minutes, now an hour": the figure of now, where it is at least twice that of before. */
export function worsenedTo(sense: Sense): number | null {
  const times = said(sense, 'past', 'now')
  const timed = sense.figures.spans.map((span) => ({ span, time: timeOf(sense, span, times) }))
  const before = timed.find(({ time }) => time === 'past')?.span.minutes
  const now = timed.findLast(({ time }) => time === 'now')?.span.minutes
  if (times.length < 2 || before === undefined || now === undefined) return null
  return now >= before * 2 ? now : null
}

/** "10 minutes ago", "hace 10 minutos". */
function isPastTime(sense: Sense): boolean {
  return said(sense, 'ago').some((ago) =>
    sense.figures.spans.some((span) => span.from - ago.to === 0 || ago.from - span.to === 0),
  )
}

function bareFigure(sense: Sense): Figure | null {
  const bare = unrefused(
    sense,
    sense.figures.bare.filter(({ value }) => value > 0),
  )
  const values = presentOf(sense, bare).map(({ value }) => value)
  const [one, other] = values
  if (one === undefined || values.length > 2 || one > longestFillMinutes) return null
  if (other === undefined) return { minutes: one, hasUnit: false }
  // "Less than 5, maybe 4 and a half".
  if (other < one && sense.asked === 'flow') return { minutes: other, hasUnit: false }
  const isRange = other > one && other <= one * 2
  return isRange && one > 3 ? { minutes: (one + other) / 2, hasUnit: false } : null
}

/** How much of the text is the number itself: "about 12 now" against a story with a number in it. */
export function isMostlyFigure(sense: Sense): boolean {
  const times = said(sense, 'past', 'now', 'but', 'and').map((mark) => mark.to - mark.from)
  const timing = times.reduce((sum, words) => sum + words, 0)
  const others = sense.words - sense.figures.bare.length - timing
  return sense.asked === 'flow'
    ? others <= 6 && sense.unknownWords <= 2
    : others <= 4 && sense.unknownWords <= 1
}

/** "In ten minutes", when no flow was asked for and none is spoken of. */
export function promised(sense: Sense): Mark[] {
  if (sense.asked === 'flow' || isNamed(sense, 'water', 'flow', 'fill', 'container', 'filter'))
    return []
  return said(sense, 'within').filter((mark) =>
    sense.figures.spans.some((span) => span.from === mark.to || span.to === mark.from),
  )
}
