import type { Language } from './language'
import { languages } from './language'
import {
  entriesStartingWith,
  exactKeys,
  guessedKeys,
  respelledKeys,
  type Entry,
  type Likeness,
} from './reply-lexicon'
import type { Token } from './reply-tokens'
import type { Concept } from './reply-words/concept'

/** A concept found at some place of a text: tokens `from` up to, not including, `to`. */
export type Mark = {
  concept: Concept
  from: number
  to: number
  language: Language
  likeness: Likeness
  denied: boolean
}

type Known = Map<Language, { keys: Set<string>; likeness: Likeness }>

/** Household's own language first, then English, then the others. */
export function languageOrder(own: Language): Language[] {
  return [...new Set<Language>([own, 'en', ...languages])]
}

/** The languages that know a word as it stands. */
function knowWord(word: string): Known {
  const known: Known = new Map()
  for (const language of languages) addKeys(known, language, exactKeys(word, language), 'exact')
  return known
}

/**
 * A spelling is only stretched where nobody the household is likely to write to us in knows the
 * word as it stands.
 */
function respellWord(known: Known, word: string, likely: readonly Language[]): void {
  if (likely.some((language) => known.has(language))) return
  for (const language of new Set(likely)) {
    addKeys(known, language, respelledKeys(word, language), 'respelled')
  }
}

/** Guesses at words that no language knows, in the languages the text is likely to be in. */
function guessWord(known: Known, word: string, likely: readonly Language[]): void {
  if (known.size > 0) return
  for (const language of new Set(likely))
    addKeys(known, language, guessedKeys(word, language), 'guessed')
}

/**
 * In a language that the text is not in, only whole words are known: a stem of three letters begins a
 * word of every language.
 */
function forgetForeignStems(known: Known, likely: readonly Language[]): void {
  for (const [language, { keys }] of known) {
    const isStemOnly = [...keys].every((key) => key.endsWith('*'))
    if (isStemOnly && !likely.includes(language)) known.delete(language)
  }
}

function addKeys(known: Known, language: Language, keys: string[], likeness: Likeness): void {
  if (keys.length > 0) known.set(language, { keys: new Set(keys), likeness })
}

const weight: Record<Likeness, number> = { exact: 1, respelled: 0.8, guessed: 0.5 }

/** The language that the text is most likely in: the own one, unless another knows more words. */
function mainLanguage(known: readonly Known[], own: Language): Language {
  let best = own
  let bestScore = -1
  for (const language of languageOrder(own)) {
    let score = language === own ? 1.4 : 0
    for (const word of known) {
      const found = word.get(language)
      if (found) score += weight[found.likeness]
    }
    if (score > bestScore) {
      best = language
      bestScore = score
    }
  }
  return best
}

/** End of an entry that starts at `at`, or nothing. A gap may take up to two words. */
function matchEnd(entry: Entry, at: number, known: readonly (Known | null)[]): number | null {
  let ends = [at]
  for (const [index, key] of entry.keys.entries()) {
    if (key === '.') {
      ends = ends.filter((end) => known[end] === undefined || known[end] === null)
      if (ends.length === 0) return null
      if (index === entry.keys.length - 1) return Math.min(...ends)
      continue
    }
    if (key === '~') {
      ends = [...new Set(ends.flatMap((end) => gapEnds(end, known)))]
      continue
    }
    ends = ends.flatMap((end) => (hasKey(known[end], entry.language, key) ? [end + 1] : []))
    if (ends.length === 0) return null
    if (index === entry.keys.length - 1) return Math.min(...ends)
  }
  return null
}

function hasKey(word: Known | null | undefined, language: Language, key: string): boolean {
  return word?.get(language)?.keys.has(key) ?? false
}

function gapEnds(end: number, known: readonly (Known | null)[]): number[] {
  const ends = [end]
  for (let extra = 1; extra <= 2 && known[end + extra - 1]; extra += 1) ends.push(end + extra)
  return ends
}

function likenessOf(
  from: number,
  to: number,
  language: Language,
  known: readonly (Known | null)[],
): Likeness {
  let worst: Likeness = 'exact'
  for (let at = from; at < to; at += 1) {
    const likeness = known[at]?.get(language)?.likeness
    if (likeness === 'guessed') worst = 'guessed'
    if (likeness === 'respelled' && worst === 'exact') worst = 'respelled'
  }
  return worst
}

/** The one language in which a lone word is read. */
function readerOf(word: Known, order: readonly Language[]): Language | null {
  for (const likeness of ['exact', 'respelled', 'guessed'] as const) {
    const reader = order.find((language) => word.get(language)?.likeness === likeness)
    if (reader) return reader
  }
  return null
}

function candidates(
  known: readonly (Known | null)[],
  order: readonly Language[],
  own: Language,
): Mark[] {
  const likely = [order[0] ?? own, own]
  const marks: Mark[] = []
  known.forEach((word, from) => {
    if (!word) return
    const reader = readerOf(word, order)
    for (const [language, { keys }] of word) {
      for (const key of keys) {
        for (const entry of entriesStartingWith(language, key)) {
          if (entry.keys.length === 1 && language !== reader) continue
          const to = matchEnd(entry, from, known)
          if (to === null || isForeignChance(known.slice(from, to), language, likely)) continue
          const likeness = likenessOf(from, to, language, known)
          marks.push({ concept: entry.concept, from, to, language, likeness, denied: false })
        }
      }
    }
  })
  return marks
}

/** "No Mama here" is no Spanish: a wording of another language needs a word that is not of the text's own. */
function isForeignChance(
  words: readonly (Known | null)[],
  language: Language,
  [main, own]: readonly Language[],
): boolean {
  if (words.length === 1 || language === main || language === own || main === undefined)
    return false
  return words.every((word) => word === null || word.get(main)?.likeness === 'exact')
}

/** Longer wordings own their words: in "no problem" neither "no" nor "problem" speaks. */
function keepLongest(marks: readonly Mark[], order: readonly Language[]): Mark[] {
  const rank = (mark: Mark): number => (mark.to - mark.from) * 10 - order.indexOf(mark.language)
  const kept: Mark[] = []
  for (const mark of [...marks].sort((a, b) => rank(b) - rank(a))) {
    const clashes = kept.some(
      (other) =>
        mark.from < other.to &&
        other.from < mark.to &&
        !(mark.from === other.from && mark.to === other.to),
    )
    const twice = kept.some((other) => other.concept === mark.concept && other.from === mark.from)
    if (!clashes && !twice) kept.push(mark)
  }
  return kept.sort((a, b) => a.from - b.from)
}

function eachWord(
  tokens: readonly Token[],
  known: readonly (Known | null)[],
  act: (word: Known, text: string) => void,
): void {
  tokens.forEach((token, at) => {
    const word = known[at]
    if (word && token.kind === 'word') act(word, token.text)
  })
}

/** Three letters by themselves are a word of every language: "dan", "san". */
function isTiny(tokens: readonly Token[], { from, to }: Mark): boolean {
  return to - from === 1 && (tokens[from]?.text.length ?? 0) <= 3
}

export type Marked = {
  marks: Mark[]
  main: Language
  /** For each token, whether any language knows the word. */
  knownWords: boolean[]
}

/** Finds every concept in a text. Denial is settled afterwards by `denyMarks`. */
export function markTokens(tokens: readonly Token[], own: Language): Marked {
  const known = tokens.map((token) => (token.kind === 'word' ? knowWord(token.text) : null))
  const wordsOf = (): Known[] => known.filter((word) => word !== null)
  const likely = new Set<Language>([mainLanguage(wordsOf(), own), own, 'en'])
  eachWord(tokens, known, (word) => forgetForeignStems(word, [...likely]))
  eachWord(tokens, known, (word, text) => respellWord(word, text, [...likely]))
  const main = mainLanguage(wordsOf(), own)
  eachWord(tokens, known, (word, text) => guessWord(word, text, [main, own]))
  const order = [...new Set([main, ...languageOrder(own)])]
  return {
    marks: keepLongest(candidates(known, order, own), order).filter(
      (mark) => likely.has(mark.language) || mark.language === main || !isTiny(tokens, mark),
    ),
    main,
    knownWords: known.map((word) => word === null || word.size > 0),
  }
}
