import type { Mark } from './reply-marks'
import { isNamed, isSaid, said, type Sense } from './reply-sense'

/** A number people would give for a bottle: from some seconds to half a day. */
const longestFillMinutes = 720

type Figure = { minutes: number; hasUnit: boolean }

/** The bottle-fill time a text gives, if it gives one. */
export function figureOf(sense: Sense): Figure | null {
  if (isSaid(sense, 'future', 'notYet') || isPastTime(sense) || promised(sense).length > 0)
    return null
  const spans = sense.figures.spans.filter((span) => span.minutes > 0)
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

/** "10 minutes ago", "hace 10 minutos". */
function isPastTime(sense: Sense): boolean {
  return said(sense, 'ago').some((ago) =>
    sense.figures.spans.some((span) => span.from - ago.to === 0 || ago.from - span.to === 0),
  )
}

function bareFigure(sense: Sense): Figure | null {
  const values = sense.figures.bare.map((bare) => bare.value).filter((value) => value > 0)
  const [one, other] = values
  if (one === undefined || values.length > 2 || one > longestFillMinutes) return null
  if (other === undefined) return { minutes: one, hasUnit: false }
  const isRange = other > one && other <= one * 2
  return isRange && one > 3 ? { minutes: (one + other) / 2, hasUnit: false } : null
}

/** How much of the text is the number itself: "about 12 now" against a story with a number in it. */
export function isMostlyFigure(sense: Sense): boolean {
  const others = sense.words - sense.figures.bare.length
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
