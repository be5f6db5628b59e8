import type { Language } from './language'
import type { Likeness } from './reply-lexicon'
import { readTwice, type Reply, type TwiceRead } from './reply'
import type { Token } from './reply-tokens'
import type { Concept } from './reply-words/concept'

/** One thing the reader found in a text: its words `from` up to, not including, `to`. */
export type Found = {
  words: string
  from: number
  to: number
  concept: Concept
  language: Language
  likeness: Likeness
  denied: boolean
}

/** A text as the reader cuts it. */
export type SeenWord = { text: string; kind: Token['kind']; known: boolean }

/** A number in the text; its minutes where it says so. */
export type FoundFigure = { from: number; to: number; minutes: number | null }

export type Explained = Pick<TwiceRead, 'reading' | 'byWords' | 'byExamples'> & {
  words: SeenWord[]
  found: Found[]
  figures: FoundFigure[]
  unknownWords: string[]
}

/** A reading with what it rests on, for the page on which a coordinator tries a text. */
export function explainReply(reply: Reply): Explained {
  const { sense, ...readings } = readTwice(reply)
  const wordsBetween = (from: number, to: number): string =>
    sense.tokens
      .slice(from, to)
      .map((token) => token.text)
      .join(' ')
  return {
    ...readings,
    words: sense.tokens.map(({ text, kind }, at) => ({
      text,
      kind,
      known: !sense.unknownAt.includes(at),
    })),
    found: sense.marks.map(({ from, to, concept, language, likeness, denied }) => ({
      words: wordsBetween(from, to),
      from,
      to,
      concept,
      language,
      likeness,
      denied,
    })),
    figures: [
      ...sense.figures.spans,
      ...sense.figures.bare.map(({ from, to }) => ({ from, to, minutes: null })),
    ],
    unknownWords: sense.unknownAt.map((at) => wordsBetween(at, at + 1)),
  }
}
