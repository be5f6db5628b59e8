import type { Mark } from './reply-marks'
import { isNamed, isSaid, said, type Sense } from './reply-sense'

/** A number people would give for a bottle: from some seconds to half a day. */
const longestFillMinutes = 720

type Figure = { minutes: number; hasUnit: boolean }

/** The bottle-fill time a text gives, if it gives one. */
export function figureOf(sense: Sense): Figure | null {
  if (isSaid(sense, 'future', 'notYet', 'ago') || promised(sense).length > 0) return null
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

/** How much of the text is the number itself: "about 12 now" against a story with a number in it. */
export function isMostlyFigure(sense: Sense): boolean {
  const others = sense.words - sense.figures.bare.length
  return others <= 4 && sense.unknownWords <= 1
}

/** "In ten minutes", when no flow was asked for and none is spoken of. */
export function promised(sense: Sense): Mark[] {
  if (sense.asked === 'flow' || isNamed(sense, 'water', 'flow', 'container', 'filter')) return []
  return said(sense, 'within').filter((mark) =>
    sense.figures.spans.some((span) => span.from === mark.to || span.to === mark.from),
  )
}
