import { listWordsInForce } from '@/db/queries/added-word'
import type { Handle } from '@/db/client'
import { mostAdded, type AddedWord } from '@/lib/domain/reply-added'
import { concepts, type Concept } from '@/lib/domain/reply-words/concept'

const known: ReadonlySet<string> = new Set(concepts)

function isConcept(name: string): name is Concept {
  return known.has(name)
}

// The core indexes a list once, so the same words are to be the same list for every text that comes in.
let last: { key: string; words: readonly AddedWord[] } = { key: '', words: [] }

/** The programme's own words in force, for the reader. */
export async function addedWordsInForce(db: Handle): Promise<readonly AddedWord[]> {
  const rows = await listWordsInForce(db, mostAdded)
  const key = rows.map(({ id }) => id).join(' ')
  if (key !== last.key) {
    const words = rows.flatMap(({ language, concept, phrase }) =>
      isConcept(concept) ? [{ language, concept, phrase }] : [],
    )
    last = { key, words }
  }
  return last.words
}
