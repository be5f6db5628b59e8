import { conceptGroups, conceptNames } from './reply-concept-names'
import type { Concept } from './reply-words/concept'

/**
 * Meanings that a programme may give to words of its own. Denials, the grammar around them and the ways
 * of ending the texts are not among them: those stand in the packs, which are tested as a whole.
 */
const offered: ReadonlySet<Concept> = new Set<Concept>([
  'slow',
  'long',
  'drip',
  'dry',
  'blocked',
  'better',
  'same',
  'broken',
  'leak',
  'fall',
  'frozen',
  'tooFast',
  'odd',
  'oddSmell',
  'fuel',
  'ill',
  'vomit',
  'sign',
  'done',
  'notYet',
  'forgot',
  'need',
  'lost',
  'ask',
  'thanks',
  'yes',
  'no',
  'wrongNumber',
  'moved',
  'water',
  'filter',
  'piece',
  'cloth',
  'container',
  'child',
  'person',
])

/** True if a programme may give this meaning to a word. */
export function isOffered(concept: Concept): boolean {
  return offered.has(concept)
}

/** The meanings on offer, under their headings. */
export const offeredGroups = conceptGroups
  .map(({ name, concepts }) => ({
    name,
    concepts: concepts
      .filter((concept) => offered.has(concept))
      .map((concept) => ({ concept, name: conceptNames[concept] })),
  }))
  .filter(({ concepts }) => concepts.length > 0)
