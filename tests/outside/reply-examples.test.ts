import { createHash } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { languages } from '@/lib/domain/language'
import learned from '@/lib/domain/reply-examples/learned.json'
import { unseenReplies } from './replies/unseen'

const folder = 'lib/domain/reply-examples'
const examples = languages
  .toSorted()
  .map((language) => readFileSync(`${folder}/${language}.txt`, 'utf8'))
const rows = examples.flatMap((text) => text.trim().split('\n')).map((line) => line.split('\t'))

describe('the texts that the second reader learned from', () => {
  it('are those its weights were made of: run `npm run replies:learn` after a change', () => {
    expect(learned.examples).toBe(createHash('sha256').update(examples.join('')).digest('hex'))
  })

  it('each have a source, a language, what was asked, a meaning and words', () => {
    const asked = new Set(['wash', 'change', 'flow', 'step', 'none'])
    const bad = rows.filter(
      ([known = '', language = '', question = '', kind = '', text = '', ...rest]) =>
        !['known', 'new'].includes(known) ||
        !languages.some((one) => one === language) ||
        !asked.has(question) ||
        !learned.kinds.includes(kind) ||
        text.trim() === '' ||
        rest.length > 0,
    )
    expect(bad).toEqual([])
  })

  it('are more than a thousand a language, of every kind', () => {
    for (const language of languages) {
      const own = rows.filter((row) => row[1] === language)
      expect(own.length).toBeGreaterThan(1000)
      expect(new Set(own.map((row) => row[3])).size).toBe(20)
    }
  })

  it('are none of the unseen texts by which it is judged', () => {
    const plain = (text: string) =>
      text
        .toLowerCase()
        .replace(/[^\p{L}\p{M}\p{N}]+/gu, ' ')
        .trim()
    const taught = new Set(rows.map((row) => `${row[1]} ${plain(row[4] ?? '')}`))
    const leaked = unseenReplies.filter(
      ({ language, text }) =>
        plain(text).split(' ').length > 3 && taught.has(`${language} ${plain(text)}`),
    )
    expect(leaked.map(({ text }) => text)).toEqual([])
  })
})
