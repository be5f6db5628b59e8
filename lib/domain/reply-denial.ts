import { isLightWord } from './reply-lexicon'
import type { Mark } from './reply-marks'
import type { Token } from './reply-tokens'
import type { Concept } from './reply-words/concept'

/** What can be denied. Things and people cannot: "no water" is settled by the rules for water. */
const deniable: ReadonlySet<Concept> = new Set<Concept>([
  'ceased',
  'flow',
  'fill',
  'be',
  'can',
  'wake',
  'limp',
  'end',
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
  'be',
  'can',
])

/** What a denial of the texts may pass over: everything, since an opt-out is never to be missed. */
const unabsorbed: ReadonlySet<Concept> = new Set<Concept>(['texts', 'stopWord', 'end'])

const forwardReach = 4
const backwardReach = 3

type Field = { marks: Mark[]; tokens: readonly Token[]; fences: readonly number[] }

/** Marks with `denied` set: "not cracked", "ya no está lento", "coule pas", "fate nai". */
export function denyMarks(marks: readonly Mark[], tokens: readonly Token[]): Mark[] {
  const settled = marks.map((mark) => ({ ...mark }))
  const field = { marks: settled, tokens, fences: fencesOf(settled, tokens) }
  for (const mark of settled) denyBy(mark, field)
  // "Can't stop vomiting": a denied end is no end.
  for (const mark of settled) {
    if (mark.concept === 'ceased' && !mark.denied) denyForward(mark, field, forwardReach)
  }
  return settled
}

function denyBy(mark: Mark, field: Field): void {
  if (mark.concept === 'not' && !denyForward(mark, field, forwardReach)) denyFinal(mark, field)
  if (mark.concept === 'not') denyDid(mark, field)
  if (mark.concept === 'notNext') denyForward(mark, field, 1)
  if (mark.concept === 'notBack' && !isPlea(mark, field)) denyBackward(mark, field, backwardReach)
  if (mark.concept === 'notPlus') denyPlus(mark, field)
  if (mark.concept === 'notAround' && (isOfThing(mark, field) || !denyBackward(mark, field, 1))) {
    denyForward(mark, field, forwardReach)
  }
  // "N'est plus rapide": announced by "ne", the comparison is a denial.
  if (mark.concept === 'better' && field.tokens[mark.from]?.text === 'plus') {
    mark.denied = isAnnounced(mark, field)
  }
  // "No hay fuga": what one has not is denied too; Bengali says it after the thing.
  const isAlsoNot = field.marks.some((other) => other.concept === 'not' && other.from === mark.from)
  if (mark.concept === 'lack' && mark.language !== 'bn' && !isAlsoNot) denyForward(mark, field, 3)
}

/** "Limpio está, rápido no": at the end of a clause a bare denial is of what stands just before. */
function denyFinal(denial: Mark, field: Field): void {
  const next = field.tokens[denial.to]
  if (next !== undefined && next.kind !== 'break') return
  for (const mark of field.marks) {
    if (mark.to === denial.from && ['fast', 'good', 'better', 'clean'].includes(mark.concept))
      mark.denied = true
  }
}

/** "I did not": the denial stands after the verb that it denies. */
function denyDid(denial: Mark, { marks, tokens }: Field): void {
  for (const mark of marks) {
    const isDid = tokens[mark.to - 1]?.text === 'did' && mark.to === denial.from
    if (isDid && mark.concept === 'done') mark.denied = true
  }
}

/** "Ekta pathan na": after a bare imperative Bengali "na" pleads, it does not deny. */
const pleas: ReadonlySet<string> = new Set(
  'den din dan pathan anen janan bolen bolun asen ashen দেন দিন পাঠান আনেন জানান বলেন বলুন আসেন'.split(
    ' ',
  ),
)

function isPlea(denial: Mark, { tokens }: Field): boolean {
  const before = tokens[denial.from - 1]?.text ?? ''
  return pleas.has(before) && !tokens.some((token) => ['ar', 'aar', 'r', 'আর'].includes(token.text))
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

function denyPlus(plus: Mark, field: Field): void {
  const compares = field.marks.some((mark) => mark.from === plus.to && comparable.has(mark.concept))
  const announced = isAnnounced(plus, field)
  if (compares && !announced) return
  if (!isOfThing(plus, field) && denyBackward(plus, field, 1)) return
  denyForward(plus, field, announced ? forwardReach : 2)
}

/** "Ne" stands shortly before. */
function isAnnounced(denial: Mark, field: Field): boolean {
  return field.marks.some(
    (mark) =>
      mark.concept === 'ne' &&
      mark.to <= denial.from &&
      denial.from - mark.to <= 3 &&
      !isFenced(mark.to, denial.from, field),
  )
}

/** "Pas d'eau": what is denied is the thing after it, never the verb before. */
function isOfThing(denial: Mark, { tokens }: Field): boolean {
  return ['d', 'de'].includes(tokens[denial.to]?.text ?? '')
}

/** "Mange pas il a le corps chaud": a new subject begins a new clause, unless it hangs on the one before. */
const subjectWords = new Set('il elle ils elles he she'.split(' '))
const linkWords = new Set('qu que if si that think believe crois pense'.split(' '))

/** Places a denial does not cross: punctuation, "but" and "and". */
function fencesOf(marks: readonly Mark[], tokens: readonly Token[]): number[] {
  const breaks = tokens.flatMap((token, at) => (token.kind === 'break' ? [at] : []))
  const joints = marks.filter((mark) => mark.concept === 'but' || mark.concept === 'and')
  const subjects = tokens.flatMap((token, at) =>
    subjectWords.has(token.text) && !linkWords.has(tokens[at - 1]?.text ?? '') ? [at] : [],
  )
  return [...breaks, ...joints.map((mark) => mark.from), ...subjects]
}

function isFenced(from: number, to: number, { fences }: Field): boolean {
  return fences.some((fence) => fence >= from && fence < to)
}

/** In "won't close and water pours" it is the closing, a word without a meaning here, that is denied. */
function isAbsorbed(denial: Mark, mark: Mark, { tokens, marks }: Field): boolean {
  if (unabsorbed.has(mark.concept)) return false
  for (let at = denial.to; at < mark.from; at += 1) {
    const token = tokens[at]
    const isMarked = marks.some(
      (other) => other.from <= at && at < other.to && other.likeness !== 'guessed',
    )
    if (token?.kind === 'word' && !isMarked && !isLightWord(token.text, denial.language))
      return true
  }
  return false
}

function denyForward(denial: Mark, field: Field, reach: number): boolean {
  const ahead = field.marks.filter(
    (mark) =>
      mark.from >= denial.to &&
      mark.from - denial.to < reach &&
      !isFenced(denial.to, mark.from, field) &&
      !isAbsorbed(denial, mark, field),
  )
  return denyFirst(ahead, field)
}

function denyBackward(denial: Mark, field: Field, reach: number): boolean {
  const behind = field.marks.filter(
    (mark) =>
      mark.to <= denial.from &&
      denial.from - mark.to < reach &&
      !isFenced(mark.to, denial.from, field),
  )
  return denyFirst(behind.reverse(), field)
}

/** The nearest predicate is denied, and those joined to it by "or". */
function denyFirst(nearest: readonly Mark[], field: Field): boolean {
  let hit: Mark | null = null
  for (const mark of nearest) {
    if (!deniable.has(mark.concept)) continue
    const sameWord = hit !== null && mark.from === hit.from
    if (hit === null || sameWord || isJoined(hit, mark, field)) {
      mark.denied = true
      if (!passedOver.has(mark.concept)) hit = mark
    }
  }
  return hit !== null
}

function isJoined(first: Mark, second: Mark, { marks }: Field): boolean {
  const [left, right] = first.from < second.from ? [first, second] : [second, first]
  return marks.some(
    (mark) => mark.concept === 'or' && mark.from >= left.to && mark.to <= right.from,
  )
}
