import type { Mark } from './reply-marks'
import type { Token } from './reply-tokens'
import type { Concept } from './reply-words/concept'

/** What can be denied. Things and people cannot: "no water" is settled by the rules for water. */
const deniable: ReadonlySet<Concept> = new Set<Concept>([
  'ceased',
  'flow',
  'drip',
  'slow',
  'blocked',
  'fast',
  'tooFast',
  'good',
  'bad',
  'better',
  'broken',
  'leak',
  'fall',
  'frozen',
  'mended',
  'odd',
  'oddSmell',
  'smell',
  'taste',
  'clean',
  'fuel',
  'ill',
  'pain',
  'blood',
  'vomit',
  'sign',
  'sleepy',
  'drink',
  'done',
  'wash',
  'change',
  'need',
  'lost',
  'texts',
  'receive',
  'moved',
  'stopWord',
  'little',
  'long',
  'water',
  'none',
  'piece',
  'cloth',
  'dirty',
])

/** Things that a denial passes over on its way to what is said of them. */
const passedOver: ReadonlySet<Concept> = new Set<Concept>([
  'water',
  'texts',
  'little',
  'piece',
  'cloth',
])

const forwardReach = 4
const backwardReach = 3

/** Marks with `denied` set: "not cracked", "ya no está lento", "coule pas", "fate nai". */
export function denyMarks(marks: readonly Mark[], tokens: readonly Token[]): Mark[] {
  const settled = marks.map((mark) => ({ ...mark }))
  const fences = fencesOf(settled, tokens)
  for (const mark of settled) {
    if (mark.concept === 'not') denyForward(mark, settled, fences, forwardReach)
    // "No hay fuga": what one has not is denied too; Bengali says it after the thing.
    const isAlsoNot = settled.some((other) => other.concept === 'not' && other.from === mark.from)
    if (mark.concept === 'lack' && mark.language !== 'bn' && !isAlsoNot)
      denyForward(mark, settled, fences, 3)
    if (mark.concept === 'notNext') denyForward(mark, settled, fences, 1)
    if (mark.concept === 'notBack') denyBackward(mark, settled, fences, backwardReach)
    if (mark.concept === 'notAround' && !denyBackward(mark, settled, fences, 1)) {
      denyForward(mark, settled, fences, forwardReach)
    }
  }
  for (const mark of settled) {
    if (mark.concept === 'notPlus') denyPlus(mark, settled, fences)
  }
  // "Can't stop vomiting": a denied end is no end.
  for (const mark of settled) {
    if (mark.concept === 'ceased' && !mark.denied) denyForward(mark, settled, fences, forwardReach)
  }
  return settled
}

/** After "plus" these compare ("plus lent") unless "ne" stands before it. */
const comparable: ReadonlySet<Concept> = new Set<Concept>([
  'slow',
  'fast',
  'tooFast',
  'good',
  'bad',
  'better',
  'odd',
  'clean',
  'little',
  'long',
])

function denyPlus(plus: Mark, marks: Mark[], fences: readonly number[]): void {
  const isAnnounced = marks.some(
    (mark) =>
      mark.concept === 'ne' &&
      mark.to <= plus.from &&
      plus.from - mark.to <= 3 &&
      !crosses(mark.to, plus.from, fences),
  )
  const compares = marks.some((mark) => mark.from === plus.to && comparable.has(mark.concept))
  if (compares && !isAnnounced) return
  if (denyBackward(plus, marks, fences, 1)) return
  denyForward(plus, marks, fences, isAnnounced ? forwardReach : 2)
}

/** Places a denial does not cross: punctuation and "but". */
function fencesOf(marks: readonly Mark[], tokens: readonly Token[]): number[] {
  const breaks = tokens.flatMap((token, at) => (token.kind === 'break' ? [at] : []))
  return [...breaks, ...marks.filter((mark) => mark.concept === 'but').map((mark) => mark.from)]
}

function crosses(from: number, to: number, fences: readonly number[]): boolean {
  return fences.some((fence) => fence >= from && fence < to)
}

function denyForward(
  denial: Mark,
  marks: Mark[],
  fences: readonly number[],
  reach: number,
): boolean {
  const ahead = marks.filter(
    (mark) =>
      mark.from >= denial.to &&
      mark.from - denial.to < reach &&
      !crosses(denial.to, mark.from, fences),
  )
  return denyFirst(ahead, marks)
}

function denyBackward(
  denial: Mark,
  marks: Mark[],
  fences: readonly number[],
  reach: number,
): boolean {
  const behind = marks.filter(
    (mark) =>
      mark.to <= denial.from &&
      denial.from - mark.to < reach &&
      !crosses(mark.to, denial.from, fences),
  )
  return denyFirst(behind.reverse(), marks)
}

/** The nearest predicate is denied, and those joined to it by "or". */
function denyFirst(nearest: readonly Mark[], marks: readonly Mark[]): boolean {
  let hit: Mark | null = null
  for (const mark of nearest) {
    if (!deniable.has(mark.concept)) continue
    const sameWord = hit !== null && mark.from === hit.from
    if (hit === null || sameWord || isJoined(hit, mark, marks)) {
      mark.denied = !mark.denied
      if (!passedOver.has(mark.concept)) hit = mark
    }
  }
  return hit !== null
}

function isJoined(first: Mark, second: Mark, marks: readonly Mark[]): boolean {
  const [left, right] = first.from < second.from ? [first, second] : [second, first]
  return marks.some(
    (mark) => mark.concept === 'or' && mark.from >= left.to && mark.to <= right.from,
  )
}
