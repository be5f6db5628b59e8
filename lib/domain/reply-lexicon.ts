import type { Language } from './language'
import { bnPack } from './reply-words/bn'
import type { Concept, LanguagePack } from './reply-words/concept'
import { enPack } from './reply-words/en'
import { esPack } from './reply-words/es'
import { frPack } from './reply-words/fr'
import { packWith, type AddedWord } from './reply-added'
import { foldText } from './reply-tokens'
import { allowedSlips, isKeypadSlip, isLikelySlip, shareKey, slipsBetween } from './reply-slips'
import { foldBengali, foldFrench, foldRoman, foldSpanish, squeeze } from './reply-spelling'

/** The words of each language, as the coordinator's page shows them. */
export const languagePacks: Record<Language, LanguagePack> = {
  en: enPack,
  es: esPack,
  fr: frPack,
  bn: bnPack,
}

/** One way of saying a concept: a key for each word, `~` for a gap of up to two words. */
export type Entry = { concept: Concept; language: Language; keys: readonly string[] }

/** How a written word was recognised, best first. */
export type Likeness = 'exact' | 'respelled' | 'guessed'

type Lexicon = {
  entriesByFirstKey: Map<string, Entry[]>
  words: Set<string>
  /** Words that are an entry by themselves, not only part of a longer one. */
  wholes: Set<string>
  light: Set<string>
  stems: Set<string>
  respelled: Map<string, string[]>
  /** By first letter, since every stem is tried on every strange word. */
  respelledStems: Map<string, [string, string][]>
  respell: (word: string) => string
}

/** Entries of a word list, folded as a text is. */
export function listed(text: string): string[] {
  return foldText(text)
    .split(/[,\n]/)
    .map((entry) => entry.trim())
    .filter((entry) => entry !== '')
}

function respellerOf(pack: LanguagePack): (word: string) => string {
  if (pack.spelling === 'spanish') return foldSpanish
  if (pack.spelling === 'french') return foldFrench
  if (pack.spelling === 'latin') return squeeze
  return (word) => (/[a-z]/.test(word) ? foldRoman(word) : foldBengali(word))
}

/** Bengali denials stand joined to the verb or apart; the reader parts them in the text. */
function spellings(entry: string): string[] {
  const parted = entry.replace(/(?<= \S{2,})(নাই|নি|না|nai|ni|na)(?= |$)/gu, ' $1')
  return /[\u0980-\u09ff]|(?:na|ni|nai)$/.test(entry) && parted !== entry
    ? [entry, parted]
    : [entry]
}

/** Every word of a pack that belongs to a figure. */
export function numberWords(pack: LanguagePack): string[] {
  const spoken = [pack.numbers, pack.weakNumbers, pack.spans, pack.halves, pack.shifts ?? '']
  const others = Object.values(pack.units)
  return [...spoken, ...others]
    .flatMap(listed)
    .flatMap((entry) => entry.split(' '))
    .filter((word) => !/^-?[\d.]+$/.test(word))
}

/** Adds a word both as it is written and as it is respelled. */
function learn(lexicon: Lexicon, key: string): void {
  if (key === '~' || key === '.') return
  if (key.endsWith('*')) {
    const stem = key.slice(0, -1)
    if (lexicon.stems.has(stem)) return
    lexicon.stems.add(stem)
    const respelled = lexicon.respell(stem)
    const first = respelled[0] ?? ''
    const alike = lexicon.respelledStems.get(first) ?? []
    lexicon.respelledStems.set(first, [...alike, [respelled, key]])
    return
  }
  if (lexicon.words.has(key)) return
  lexicon.words.add(key)
  const respelled = lexicon.respell(key)
  lexicon.respelled.set(respelled, [...(lexicon.respelled.get(respelled) ?? []), key])
}

function buildLexicon(language: Language, added: readonly AddedWord[]): Lexicon {
  const pack = packWith(languagePacks[language], language, added)
  const lexicon: Lexicon = {
    entriesByFirstKey: new Map(),
    words: new Set(),
    light: new Set(foldText(pack.light).split(/\s+/)),
    wholes: new Set(foldText(pack.common).split(/\s+/)),
    stems: new Set(),
    respelled: new Map(),
    respelledStems: new Map(),
    respell: respellerOf(pack),
  }
  for (const [concept, words] of Object.entries(pack.concepts) as [Concept, string][]) {
    for (const entry of listed(words).flatMap(spellings)) {
      const keys = entry.split(/\s+/)
      const first = keys[0] ?? ''
      const entries = lexicon.entriesByFirstKey.get(first) ?? []
      entries.push({ concept, language, keys })
      lexicon.entriesByFirstKey.set(first, entries)
      if (keys.length === 1) lexicon.wholes.add(first)
      keys.forEach((key) => learn(lexicon, key))
    }
  }
  for (const word of [
    ...numberWords(pack),
    ...foldText(`${pack.common} ${pack.light}`).split(/\s+/),
  ])
    learn(lexicon, word)
  return lexicon
}

const noneAdded: readonly AddedWord[] = []
const lexicons = new WeakMap<readonly AddedWord[], Map<Language, Lexicon>>()

/** The added words of the reading under way: it awaits nothing, so no other reading can meet them. */
let inForce = noneAdded

/** Reads with added words beside the packs. A list is indexed once: hand the same one over each time. */
export function readingWith<T>(added: readonly AddedWord[] | undefined, read: () => T): T {
  const before = inForce
  inForce = added ?? noneAdded
  try {
    return read()
  } finally {
    inForce = before
  }
}

function lexiconOf(language: Language, added = inForce): Lexicon {
  const ofList = lexicons.get(added) ?? new Map<Language, Lexicon>()
  lexicons.set(added, ofList)
  const known = ofList.get(language)
  if (known) return known
  const isBare = added !== noneAdded && !added.some((word) => word.language === language)
  const built = isBare ? lexiconOf(language, noneAdded) : buildLexicon(language, added)
  ofList.set(language, built)
  return built
}

/** A word without what writers of the language leave to chance. */
export function respelt(word: string, language: Language): string {
  return respellerOf(languagePacks[language])(word)
}

export function isLightWord(word: string, language: Language): boolean {
  return lexiconOf(language).light.has(word)
}

export function isWholeWord(word: string, language: Language): boolean {
  return lexiconOf(language).wholes.has(word)
}

export function entriesStartingWith(language: Language, key: string): readonly Entry[] {
  return lexiconOf(language).entriesByFirstKey.get(key) ?? []
}

/** Keys under which a word stands in the language as it is written. */
export function exactKeys(word: string, language: Language): string[] {
  const lexicon = lexiconOf(language)
  const keys = lexicon.words.has(word) ? [word] : []
  for (let end = 2; end <= word.length; end += 1) {
    if (lexicon.stems.has(word.slice(0, end))) keys.push(`${word.slice(0, end)}*`)
  }
  return keys
}

/** A Bengali letter carries its vowel; three Latin letters begin too many other words. */
function shortestStem(stem: string): number {
  return /[a-z]/.test(stem) ? 4 : 3
}

/** Keys after taking away what writers of the language leave to chance. */
export function respelledKeys(word: string, language: Language): string[] {
  if (word.length < 4 && language !== 'bn') return []
  const lexicon = lexiconOf(language)
  const respelled = lexicon.respell(word)
  const keys = [...(lexicon.respelled.get(respelled) ?? [])]
  for (const [stem, key] of lexicon.respelledStems.get(respelled[0] ?? '') ?? []) {
    if (stem.length >= shortestStem(stem) && respelled.startsWith(stem)) keys.push(key)
  }
  return keys
}

/** People seldom miss the first letter, but for a neighbour on its key or a swap with the second. */
function beginsAlike(written: string, known: string): boolean {
  const [first = '', second = ''] = written
  return first === known[0] || second === known[0] || shareKey(first, known[0] ?? '')
}

/** Keys within the allowed slips; only the nearest are kept. */
export function guessedKeys(word: string, language: Language): string[] {
  const isBengali = /\p{Script=Bengali}/u.test(word)
  // A Bengali letter carries its vowel sign, so that words count longer than they are.
  const length = isBengali ? Math.floor((word.length * 2) / 3) : word.length
  if (allowedSlips(length) === 0 || !/^\p{L}[\p{L}\p{M}]+$/u.test(word)) return []
  const lexicon = lexiconOf(language)
  let best = Number.POSITIVE_INFINITY
  let keys: string[] = []
  const consider = (key: string, slips: number): void => {
    if (slips > best) return
    if (slips < best) keys = []
    best = slips
    keys.push(key)
  }
  const squeezed = squeeze(word)
  for (const known of lexicon.words) {
    if (known.length < 4 || Math.abs(known.length - word.length) > 2) continue
    if (!beginsAlike(word, known)) continue
    if (known.length === 4 && word.length !== 4 && squeezed !== squeeze(known)) continue
    if (length < 7 && !isBengali && !isLikelySlip(word, known)) continue
    const slips = isKeypadSlip(word, known)
      ? 1
      : Math.min(slipsBetween(word, known), slipsBetween(squeezed, known))
    if (slips <= Math.min(allowedSlips(length), allowedSlips(known.length))) consider(known, slips)
  }
  for (const stem of lexicon.stems) {
    if (stem.length < 5 || !beginsAlike(word, stem)) continue
    const heads = [-1, 0, 1]
      .map((extra) => word.slice(0, stem.length + extra))
      // A head that the stem only lengthens is another word: "rosario" is no slip of "rosad*".
      .filter((head) => isLikelySlip(head, stem) && !stem.startsWith(head))
    if (heads.some((head) => slipsBetween(head, stem) === 1)) consider(`${stem}*`, 1)
  }
  return keys
}
