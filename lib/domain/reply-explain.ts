import type { Language } from './language'
import type { Likeness } from './reply-lexicon'
import { readReply, type Asked, type ReplyReading } from './reply'
import { senseOf } from './reply-sense'
import type { Concept } from './reply-words/concept'

/** One thing the reader found in a text. */
export type Found = {
  words: string
  concept: Concept
  language: Language
  likeness: Likeness
  denied: boolean
}

/** A reading with what it rests on, for the page on which a coordinator tries a text. */
export function explainReply(reply: { text: string; language: Language; asked: Asked }): {
  reading: ReplyReading
  found: Found[]
  unknownWords: string[]
} {
  const sense = senseOf(reply.text, reply.language, reply.asked)
  const wordsBetween = (from: number, to: number): string =>
    sense.tokens
      .slice(from, to)
      .map((token) => token.text)
      .join(' ')
  return {
    reading: readReply(reply),
    found: sense.marks.map(({ from, to, concept, language, likeness, denied }) => ({
      words: wordsBetween(from, to),
      concept,
      language,
      likeness,
      denied,
    })),
    unknownWords: sense.unknownAt.map((at) => wordsBetween(at, at + 1)),
  }
}
