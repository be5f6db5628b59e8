import type { Language } from './language'
import type { Concept, LanguagePack } from './reply-words/concept'

/** A word or phrase to which the programme gave a meaning, folded as a text is. */
export type AddedWord = { language: Language; concept: Concept; phrase: string }

/** So many may be in force: they are loaded for every text that comes in. */
export const mostAdded = 500

/** Longer phrases are met too seldom to be given a meaning. Common practice, no source. */
export const mostWords = 4

/** A language's pack with the words added to it, each at the end of its concept's list. */
export function packWith(
  pack: LanguagePack,
  language: Language,
  added: readonly AddedWord[],
): LanguagePack {
  const concepts = { ...pack.concepts }
  for (const word of added) {
    if (word.language !== language) continue
    concepts[word.concept] = [concepts[word.concept], word.phrase].filter(Boolean).join(', ')
  }
  return { ...pack, concepts }
}
