import { expect, it } from 'vitest'
import { conceptGroups } from '@/lib/domain/reply-concept-names'
import { concepts } from '@/lib/domain/reply-words/concept'

it('the headings of the word lists hold every concept once', () => {
  const listed = conceptGroups.flatMap((group) => group.concepts)
  expect(listed.toSorted()).toEqual([...concepts].toSorted())
})
