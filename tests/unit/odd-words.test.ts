import { expect, it } from 'vitest'
import { oddWordsOf } from '@/db/seed/odd-words'
import { readReply } from '@/lib/domain/reply'

it('the odd words of the demo are read by nobody but its agent, so that there is something to propose', () => {
  const words = Array.from({ length: 28 }, (_, day) => oddWordsOf(day)).flat()
  expect(words).toHaveLength(4)
  for (const { body: text, language } of words) {
    for (const asked of ['wash', 'change', 'flow', 'none'] as const) {
      expect(readReply({ text, language, asked }).kind, text).toBe('unclear')
    }
  }
})
