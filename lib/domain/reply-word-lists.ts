import type { Language } from './language'
import { conceptGroups, conceptNames } from './reply-concept-names'
import { languagePacks, listed } from './reply-lexicon'
import { emojiOf } from './reply-tokens'
import type { LanguagePack } from './reply-words/concept'

export type WordList = { name: string; words: string[]; more: number }

/** A list is cut after so many: nobody reads further. */
const mostListed = 400

function listOf(name: string, words: readonly string[]): WordList {
  const shown = words.slice(0, mostListed).map((word) => emojiOf(word) ?? word)
  return { name, words: shown, more: words.length - shown.length }
}

function figureLists(pack: LanguagePack): WordList[] {
  const lists: [string, string][] = [
    ['Numbers', pack.numbers],
    ['Numbers before a unit only', pack.weakNumbers],
    ['Minutes', pack.units.minute],
    ['Hours', pack.units.hour],
    ['Seconds', pack.units.second],
    ['Spans of time, in minutes', pack.spans],
    ['And a half', pack.halves],
    ['Half more, a quarter less', pack.shifts ?? ''],
    ['Units of something else', pack.units.other],
  ]
  return lists.map(([name, words]) => listOf(name, listed(words)))
}

/** Every word the desk knows in a language, by what it takes it for, under headings. */
export function wordLists(language: Language): { name: string; lists: WordList[] }[] {
  const pack = languagePacks[language]
  const groups = conceptGroups.map(({ name, concepts }) => ({
    name,
    lists: concepts.map((concept) =>
      listOf(conceptNames[concept], listed(pack.concepts[concept] ?? '')),
    ),
  }))
  const common = pack.common.split(/\s+/).filter((word) => word !== '')
  return [
    ...groups,
    { name: 'Figures', lists: figureLists(pack) },
    { name: 'Other words', lists: [listOf('everyday words that mean nothing here', common)] },
  ]
    .map(({ name, lists }) => ({ name, lists: lists.filter(({ words }) => words.length > 0) }))
    .filter(({ lists }) => lists.length > 0)
}
