import { isHelpKeyword, isStartKeyword, isStopKeyword } from './consent'
import type { Language } from './language'
import { mostAdded, mostWords, type AddedWord } from './reply-added'
import { conceptNames } from './reply-concept-names'
import { findDanger } from './reply-danger'
import { languagePacks, listed, numberWords } from './reply-lexicon'
import { isOffered } from './reply-offered'
import { optOutSureness } from './reply-opt-out'
import { senseOf, type Sense } from './reply-sense'
import { foldText, tokenise } from './reply-tokens'
import type { Concept } from './reply-words/concept'

/** How grave what a word speaks of is: a word may be added over another only if it is no less grave. */
const gravity: Partial<Record<Concept, number>> = {
  sign: 3,
  ill: 2,
  vomit: 2,
  blood: 2,
  sleepy: 2,
  limp: 2,
  wake: 2,
  drink: 2,
  breast: 2,
  frail: 2,
  pain: 2,
  belly: 2,
  stool: 2,
  care: 2,
  body: 2,
  broken: 1,
  leak: 1,
  fall: 1,
  frozen: 1,
  tooFast: 1,
  ooze: 1,
  overflow: 1,
  odd: 1,
  creature: 1,
  oddSmell: 1,
  fuel: 1,
  smell: 1,
  taste: 1,
}

export type AddedRefusal =
  | { reason: 'not offered' | 'not letters' | 'too short' | 'too long' | 'keyword' | 'everyday' }
  | { reason: 'known already' | 'hides danger' | 'full' }
  | { reason: 'means something else'; concept: Concept }

export type MayAdd = { ok: true; word: AddedWord } | ({ ok: false } & AddedRefusal)

/**
 * Whether the programme may give a phrase a meaning, beside the words it has added before. The answer
 * holds the phrase folded as texts are. A longer phrase owns its words, so one that holds a word of
 * danger or asks for no more texts is refused: nobody would hear of it again.
 *
 * @example mayAddWord({ language: 'es', concept: 'slow', phrase: 'un Chisguete' }, []).word.phrase // 'un chisguete'
 */
export function mayAddWord(asked: AddedWord, added: readonly AddedWord[]): MayAdd {
  const { language, concept } = asked
  const words = wordsOf(asked.phrase)
  const phrase = words.join(' ')
  const refusal =
    refusedForm(asked, words) ??
    refusedKeyword(phrase, language) ??
    refusedMeaning({ language, concept, phrase }, added) ??
    refusedHiding({ language, concept, phrase })
  return refusal ? { ok: false, ...refusal } : { ok: true, word: { language, concept, phrase } }
}

/** The two joiners are part of how Bengali is written. */
const lettersOnly = /^(?:[\p{L}\p{M}\s'’-]|\u200c|\u200d)+$/u

/** The words as the reader sees them; empty where something but letters stands among them. */
function wordsOf(phrase: string): string[] {
  if (!lettersOnly.test(phrase.trim())) return []
  const tokens = tokenise(phrase)
  return tokens.every(({ kind }) => kind === 'word') ? tokens.map(({ text }) => text) : []
}

/** True if a phrase, folded as texts are, is of a text's own words, in a row and within one sentence. */
export function isPhraseOf(phrase: string, body: string): boolean {
  const words = tokenise(body).map(({ kind, text }) => (kind === 'break' ? '|' : text))
  return ` ${words.join(' ')} `.includes(` ${phrase} `)
}

function refusedForm(asked: AddedWord, words: string[]): AddedRefusal | null {
  if (!isOffered(asked.concept)) return { reason: 'not offered' }
  if (words.length === 0) return { reason: 'not letters' }
  if (words.length > mostWords) return { reason: 'too long' }
  if (words.join('').length < 2) return { reason: 'too short' }
  return null
}

function refusedKeyword(phrase: string, language: Language): AddedRefusal | null {
  const isKeyword = isStopKeyword(phrase) || isStartKeyword(phrase) || isHelpKeyword(phrase)
  const asksToStop = optOutSureness(senseOf(phrase, language, 'none')) > 0
  return isKeyword || asksToStop ? { reason: 'keyword' } : null
}

function refusedMeaning(word: AddedWord, added: readonly AddedWord[]): AddedRefusal | null {
  const before = added
    .filter(({ language, phrase }) => language === word.language && phrase === word.phrase)
    .map(({ concept }) => concept)
  const meanings = [...packMeanings(word.phrase, word.language), ...before]
  if (meanings.includes(word.concept)) return { reason: 'known already' }
  const [other] = meanings
  if (other !== undefined) return { reason: 'means something else', concept: other }
  if (isEveryday(word)) return { reason: 'everyday' }
  return added.length >= mostAdded ? { reason: 'full' } : null
}

/** What the language's own pack takes exactly this phrase for. */
function packMeanings(phrase: string, language: Language): Concept[] {
  const words = phrase.split(' ')
  const isEntry = (entry: string): boolean => {
    const keys = entry.split(/\s+/)
    return keys.length === words.length && keys.every((key, at) => fits(key, words[at] ?? ''))
  }
  const lists = Object.entries(languagePacks[language].concepts) as [Concept, string][]
  return lists.filter(([, list]) => listed(list).some(isEntry)).map(([concept]) => concept)
}

function fits(key: string, word: string): boolean {
  return key.endsWith('*') ? word.startsWith(key.slice(0, -1)) : key === word
}

/** One small word, or one of a figure, would carry its meaning into every other text. */
function isEveryday({ phrase, language }: AddedWord): boolean {
  const pack = languagePacks[language]
  const everyday = foldText(`${pack.light} ${pack.common}`).split(/\s+/)
  return everyday.includes(phrase) || numberWords(pack).some((key) => fits(key, phrase))
}

function refusedHiding({ phrase, language, concept }: AddedWord): AddedRefusal | null {
  const held = gravityOf(senseOf(phrase, language, 'none'))
  return held > (gravity[concept] ?? 0) ? { reason: 'hides danger' } : null
}

/** Of words that had to be guessed nothing is known: setting such a guess right is what adding is for. */
function gravityOf(sense: Sense): number {
  const sureMarks = sense.marks.filter(({ likeness }) => likeness !== 'guessed')
  const named = Math.max(0, ...sureMarks.map((mark) => gravity[mark.concept] ?? 0))
  const danger = sureMarks.length === sense.marks.length ? findDanger(sense) : null
  if (danger === null) return named
  const graver = danger.kind === 'unwell' ? 2 : 1
  return Math.max(named, danger.dangerSign ? 3 : graver)
}

/** Why a phrase may not be added, in words for staff. */
export function addedRefusalWords(refusal: AddedRefusal): string {
  switch (refusal.reason) {
    case 'not offered':
      return 'Choose one of the meanings on offer.'
    case 'not letters':
      return 'A phrase is made of words only: no numbers, signs or pictures.'
    case 'too short':
      return 'One letter is too little to go by.'
    case 'too long':
      return `A phrase has at most ${mostWords} words.`
    case 'keyword':
      return 'It asks to stop, start or explain the texts. What such words mean is not changed here.'
    case 'everyday':
      return 'By itself it is an everyday word and says too little. Take a word beside it as well.'
    case 'known already':
      return 'The desk takes it for that already.'
    case 'means something else':
      return `The desk takes it for “${conceptNames[refusal.concept]}”. Take a word beside it as well.`
    case 'hides danger':
      return 'It holds words that may speak of a danger, which the desk would no longer see. Take fewer words.'
    case 'full':
      return `The programme has added ${mostAdded} words, which is the most. Retire some first.`
  }
}
