import { isHelpKeyword, isStartKeyword, isStopKeyword } from './consent'
import type { Language } from './language'
import type { AddedWord } from './reply-added'
import { chancesOf } from './reply-by-examples'
import { readByWords } from './reply-by-words'
import { sureEnough, type ReplyReading } from './reply-kind'
import { senseOf, type Asked, type Sense } from './reply-sense'
import { traitsOf } from './reply-traits'
import { weigh, type Chance } from './reply-weigh'

export { sureEnough, type ReplyKind, type ReplyReading } from './reply-kind'
export type { Asked } from './reply-sense'

export type Reply = {
  text: string
  language: Language
  asked: Asked
  /** The programme's own words beside the packs. */
  added?: readonly AddedWord[] | undefined
}

/**
 * What a household's text means, by two readers: the word lists with their rules (opt-out, danger, wrong number, what
 * was asked, the rest), and what texts like it have meant. Where they cannot agree a person reads it.
 *
 * @example readReply({ text: 'sale poca agua', language: 'es', asked: 'wash' }).kind // 'slow'
 */
export function readReply(reply: Reply): ReplyReading {
  return readTwice(reply).reading
}

/** A reading with what each of the two readers made of the text; `byExamples` has the likeliest first. */
export type TwiceRead = {
  sense: Sense
  byWords: ReplyReading
  byExamples: readonly Chance[]
  reading: ReplyReading
}

/** What `readReply` rests on. */
export function readTwice(reply: Reply): TwiceRead {
  const sense = senseOf(reply.text, reply.language, reply.asked, reply.added)
  const byWords = readByWords(sense)
  const byExamples = chancesOf(traitsOf(sense, byWords))
  const isDecided = isPlain(sense, byWords) || isDecidedByAdded(reply, byWords)
  const read = isDecided ? byWords : weigh(sense, byWords, byExamples)
  const sure = Math.round(read.sure * 100) / 100
  const reading: ReplyReading =
    sure < sureEnough ? { ...read, kind: 'unclear', sure } : { ...read, sure }
  return { sense, byWords, byExamples, reading }
}

/** What a word of the programme's own changes, it decides: no example knows it. */
function isDecidedByAdded({ added, ...reply }: Reply, byWords: ReplyReading): boolean {
  if (!added || added.length === 0) return false
  const without = readByWords(senseOf(reply.text, reply.language, reply.asked))
  return without.kind !== byWords.kind
}

/** A keyword of consent, one known word, or nothing but a figure: it means what the word lists say. */
function isPlain({ text, tokens, figures, words }: Sense, byWords: ReplyReading): boolean {
  if (isStopKeyword(text) || isStartKeyword(text) || isHelpKeyword(text)) return true
  if (words === 1 && byWords.kind !== 'unclear') return true
  // "No mas": nothing beside the order to end the texts.
  if (words <= 3 && byWords.kind === 'stop') return true
  const [only, ...others] = [...figures.spans, ...figures.bare]
  return only !== undefined && others.length === 0 && only.to - only.from === tokens.length
}
