import type { Language } from '@/lib/domain/language'
import type { AddedWord } from '@/lib/domain/reply-added'
import { mayAddWord, type AddedRefusal } from '@/lib/domain/reply-may-add'
import type { NewWord } from '@/lib/schemas/reply-words'

export type CheckedWords = {
  allowed: AddedWord[]
  refused: { phrase: string; refusal: AddedRefusal }[]
}

/** Which of these words may be added to those in force, each beside the ones before it. */
export function checkNewWords(
  { language, words }: { language: Language; words: readonly NewWord[] },
  inForce: readonly AddedWord[],
): CheckedWords {
  const checked: CheckedWords = { allowed: [], refused: [] }
  for (const { phrase, concept } of words) {
    const may = mayAddWord({ language, concept, phrase }, [...inForce, ...checked.allowed])
    if (may.ok) checked.allowed.push(may.word)
    else checked.refused.push({ phrase, refusal: may })
  }
  return checked
}
