import { expect, it } from 'vitest'
import { isPhraseOf } from '@/lib/domain/reply-may-add'

it.each([
  ['zurumbo', 'El agua, muy ZURUMBO', true],
  ['muy zurumbo', 'El agua, muy ZURUMBO', true],
  ['zurumb', 'El agua muy zurumbo', false],
  ['agua zurumbo', 'El agua muy zurumbo', false],
  ['agua muy', 'Hay agua. Muy zurumbo', false],
])('“%s” stands in “%s”: %s', (phrase, body, stands) => {
  expect(isPhraseOf(phrase, body)).toBe(stands)
})
