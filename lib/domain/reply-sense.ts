import type { Language } from './language'
import type { AddedWord } from './reply-added'
import { denyMarks } from './reply-denial'
import { readFigures, type Figures } from './reply-figures'
import { partJoinedDenials } from './reply-joined-denial'
import { readingWith } from './reply-lexicon'
import { markTokens, type Mark } from './reply-marks'
import { dropResolved } from './reply-resolved'
import { tokenise, type Token } from './reply-tokens'
import type { Concept } from './reply-words/concept'

export type Asked = 'wash' | 'change' | 'flow' | 'step' | 'none'

/** A text with its concepts found, ready for the rules. */
export type Sense = {
  text: string
  asked: Asked
  tokens: Token[]
  marks: Mark[]
  figures: Figures
  /** Words that no language of the desk knows. */
  unknownWords: number
  /** Their places among the tokens. */
  unknownAt: number[]
  words: number
}

/** A text with its concepts found; `added` are the programme's own words beside the packs. */
export function senseOf(
  text: string,
  language: Language,
  asked: Asked,
  added?: readonly AddedWord[],
): Sense {
  return readingWith(added, () => findSense(text, language, asked))
}

function findSense(text: string, language: Language, asked: Asked): Sense {
  const tokens = partJoinedDenials(tokenise(text), language)
  const { marks, knownWords } = markTokens(tokens, language)
  const figures = readFigures(tokens, language)
  // In "bish minit" (twenty minutes) "bish" is no poison.
  const isInFigure = (mark: Mark): boolean =>
    figures.spans.some((span) => mark.from >= span.from && mark.to <= span.to)
  const spoken = marks.filter((mark) => !isInFigure(mark))
  return {
    text,
    asked,
    tokens,
    marks: dropResolved(denyMarks(spoken, tokens), tokens),
    figures,
    unknownAt: knownWords.flatMap((known, at) => (known ? [] : [at])),
    unknownWords: knownWords.filter((known) => !known).length,
    words: tokens.filter((token) => token.kind !== 'break').length,
  }
}

/** Marks of these concepts that stand undenied. */
export function said(sense: Sense, ...concepts: Concept[]): Mark[] {
  return sense.marks.filter((mark) => !mark.denied && concepts.includes(mark.concept))
}

/** Marks of these concepts that the text denies. */
export function denied(sense: Sense, ...concepts: Concept[]): Mark[] {
  return sense.marks.filter((mark) => mark.denied && concepts.includes(mark.concept))
}

export function isSaid(sense: Sense, ...concepts: Concept[]): boolean {
  return said(sense, ...concepts).length > 0
}

export function isDenied(sense: Sense, ...concepts: Concept[]): boolean {
  return denied(sense, ...concepts).length > 0
}

/** Named at all, denied or not. */
export function isNamed(sense: Sense, ...concepts: Concept[]): boolean {
  return sense.marks.some((mark) => concepts.includes(mark.concept))
}

/** Words between two marks, or Infinity when a sentence ends between them. */
export function gapBetween(sense: Sense, one: Mark, other: Mark): number {
  const [left, right] = one.from <= other.from ? [one, other] : [other, one]
  const between = sense.tokens.slice(left.to, right.from)
  if (between.some((token) => token.kind === 'break' && token.strength === 'strong'))
    return Infinity
  return Math.max(0, right.from - left.to)
}

/** Some mark of the first kind stands within `reach` words of one of the second. */
export function areBeside(
  sense: Sense,
  ones: readonly Mark[],
  others: readonly Mark[],
  reach = 5,
): boolean {
  return ones.some((one) =>
    others.some((other) => one !== other && gapBetween(sense, one, other) <= reach),
  )
}

/** "But" stands between: what is said of the one is not said of the other. */
export function areParted(sense: Sense, one: Mark, other: Mark): boolean {
  const [left, right] = one.from <= other.from ? [one, other] : [other, one]
  return said(sense, 'but').some((but) => but.from >= left.to && but.to <= right.from)
}

/** "What if it cracks?" reports nothing. */
export function isSupposed(sense: Sense): boolean {
  return isSaid(sense, 'if') && (sense.text.includes('?') || isSaid(sense, 'ask', 'or'))
}

const trust = { exact: 1, respelled: 0.95, guessed: 0.78 } as const

/** Sureness of a rule, lowered when the words it rests on had to be guessed. */
export function sureOf(base: number, marks: readonly Mark[]): number {
  const best = Math.max(0, ...marks.map((mark) => trust[mark.likeness]))
  return marks.length === 0 ? base : base * best
}
