import type { Mark } from './reply-marks'
import type { Token } from './reply-tokens'
import type { Concept } from './reply-words/concept'

/** Troubles that the text itself says are over no longer speak: a stopped leak, an illness got over. */
export function dropResolved(marks: readonly Mark[], tokens: readonly Token[]): Mark[] {
  return dropRecovered(endLeaks(dropLittleThings(marks), tokens), tokens)
}

/** "Le petit joint" is a small seal, no child. */
function dropLittleThings(marks: readonly Mark[]): Mark[] {
  const isThing = (at: number): boolean =>
    marks.some((mark) => mark.from === at && ['piece', 'filter', 'cloth'].includes(mark.concept))
  return marks.filter((mark) => mark.concept !== 'child' || !isThing(mark.to))
}

const ends: ReadonlySet<Concept> = new Set<Concept>(['ceased', 'stopWord', 'itStopped', 'blocked'])

/** "The leak stopped": the leak is denied, and the stopping is not of the texts or the water. */
function endLeaks(marks: readonly Mark[], tokens: readonly Token[]): Mark[] {
  const isEnd = (mark: Mark): boolean => ends.has(mark.concept) && !mark.denied
  const areClose = (one: Mark, other: Mark): boolean => wordsBetween(one, other, tokens) <= 1
  const leaks = marks.filter((mark) => mark.concept === 'leak')
  const ending = marks.filter((mark) => isEnd(mark) && leaks.some((leak) => areClose(leak, mark)))
  return marks
    .filter((mark) => !ending.includes(mark))
    .map((mark) =>
      leaks.includes(mark) && ending.some((end) => areClose(end, mark))
        ? { ...mark, denied: true }
        : mark,
    )
}

const illness: ReadonlySet<Concept> = new Set<Concept>([
  'ill',
  'care',
  'vomit',
  'pain',
  'belly',
  'stool',
  'frail',
  'sleepy',
  'body',
  'bad',
])
const things: ReadonlySet<Concept> = new Set<Concept>([
  'water',
  'filter',
  'flow',
  'piece',
  'drip',
  'cloth',
])

/** "He was ill but is fine now". A general danger sign is never taken as over. */
function dropRecovered(marks: readonly Mark[], tokens: readonly Token[]): Mark[] {
  const ills = marks.filter((mark) => illness.has(mark.concept) && !mark.denied)
  const last = ills.at(-1)
  if (last === undefined) return [...marks]
  const has = (concept: Concept): boolean =>
    marks.some((mark) => mark.concept === concept && !mark.denied)
  if (has('sign') || has('still')) return [...marks]
  const isWell = (mark: Mark): boolean => {
    // "Over the fever now" puts the recovery first.
    const reach = mark.concept === 'recovered' ? mark.from + 4 : mark.from
    if (mark.denied || reach < last.to) return false
    if (mark.concept === 'recovered') return !isButBetween(mark, last, marks)
    if (!['good', 'better', 'yes'].includes(mark.concept)) return false
    return !marks.some((other) => things.has(other.concept) && isNear(other, mark, tokens))
  }
  const isTold = has('recovered') || has('now') || has('past')
  const isOver = isTold && marks.some(isWell)
  return isOver ? marks.filter((mark) => !ills.includes(mark)) : [...marks]
}

function isButBetween(one: Mark, other: Mark, marks: readonly Mark[]): boolean {
  return marks.some(
    (mark) => mark.concept === 'but' && mark.from >= one.to && mark.to <= other.from,
  )
}

function isNear(one: Mark, other: Mark, tokens: readonly Token[]): boolean {
  return wordsBetween(one, other, tokens) <= 2
}

/** Words between two marks; Infinity across a break. */
function wordsBetween(one: Mark, other: Mark, tokens: readonly Token[]): number {
  const [left, right] = one.from <= other.from ? [one, other] : [other, one]
  const between = tokens.slice(left.to, right.from)
  return between.some((token) => token.kind === 'break') ? Infinity : between.length
}
