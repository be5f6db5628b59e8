import { beforeAll, describe, expect, it, vi } from 'vitest'
import { languages } from '@/lib/domain/language'
import { mostAdded, type AddedWord } from '@/lib/domain/reply-added'
import { explainReply } from '@/lib/domain/reply-explain'
import {
  readReply,
  type Asked,
  type Reply,
  type ReplyKind,
  type ReplyReading,
} from '@/lib/domain/reply'
import { readByWords } from '@/lib/domain/reply-by-words'
import { addedRefusalWords, mayAddWord } from '@/lib/domain/reply-may-add'
import { senseOf } from '@/lib/domain/reply-sense'
import { offeredGroups } from '@/lib/domain/reply-offered'
import type { Concept } from '@/lib/domain/reply-words/concept'
import { bnReplies } from '../outside/replies/bn'
import { enReplies } from '../outside/replies/en'
import { esReplies } from '../outside/replies/es'
import { frReplies } from '../outside/replies/fr'

const sets = { en: enReplies, es: esReplies, fr: frReplies, bn: bnReplies }
const one = (concept: Concept, phrase: string): AddedWord[] => [{ language: 'en', concept, phrase }]
const read = (text: string, added?: readonly AddedWord[], asked: Asked = 'none') =>
  readReply({ text, language: 'en', asked, added })

describe('a word that the programme added', () => {
  const alone: [Concept, ReplyKind][] = [
    ['slow', 'slow'],
    ['long', 'slow'],
    ['drip', 'slow'],
    ['dry', 'no-flow'],
    ['blocked', 'no-flow'],
    ['better', 'done'],
    ['broken', 'broken'],
    ['leak', 'broken'],
    ['fall', 'broken'],
    ['frozen', 'broken'],
    ['tooFast', 'broken'],
    ['odd', 'odd-water'],
    ['oddSmell', 'odd-water'],
    ['fuel', 'odd-water'],
    ['ill', 'unwell'],
    ['vomit', 'unwell'],
    ['sign', 'unwell'],
    ['done', 'done'],
    ['notYet', 'not-yet'],
    ['forgot', 'not-yet'],
    ['ask', 'ask'],
    ['thanks', 'thanks'],
    ['yes', 'yes'],
    ['no', 'no'],
    ['wrongNumber', 'wrong-number'],
    ['moved', 'moved'],
  ]

  it.each(alone)('as “%s” makes the text be read as %s', (concept, kind) => {
    expect(read('zorblax').kind).toBe('unclear')
    expect(read('zorblax', one(concept, 'zorblax')).kind).toBe(kind)
  })

  it('may be denied like any other', () => {
    const added = one('broken', 'zorblaxed')
    expect(read('the cap is zorblaxed', added).kind).toBe('broken')
    expect(read('the cap is not zorblaxed', added, 'step').kind).toBe('no')
  })

  it('may be misspelled a little, like any other', () => {
    expect(read('zorblaxxed', one('slow', 'zorblaxed')).kind).toBe('slow')
  })

  it('of several words needs them all', () => {
    const added = one('slow', 'like an old goat')
    expect(read('water like an old goat', added).kind).toBe('slow')
    expect(read('water like an old', added).kind).not.toBe('slow')
  })

  it('is only known where it was handed over', () => {
    const added = one('slow', 'zorblax')
    expect(read('zorblax', added).kind).toBe('slow')
    expect(read('zorblax').kind).toBe('unclear')
    expect(read('zorblax', []).kind).toBe('unclear')
    expect(read('zorblax', one('thanks', 'zorblax')).kind).toBe('thanks')
  })

  it('is named in an explanation, with its place', () => {
    const added = one('slow', 'zorblax')
    const { found, words } = explainReply({
      text: 'Water, zorblax!',
      language: 'en',
      asked: 'none',
      added,
    })
    const mark = found.find(({ concept }) => concept === 'slow')
    expect(words.slice(mark?.from, mark?.to)).toEqual([
      { text: 'zorblax', kind: 'word', known: true },
    ])
  })
})

describe('a pack with added words', () => {
  const taken: AddedWord[] = [
    { language: 'en', concept: 'slow', phrase: 'slow' },
    { language: 'en', concept: 'broken', phrase: 'cracked' },
    { language: 'es', concept: 'slow', phrase: 'despacio' },
    { language: 'es', concept: 'done', phrase: 'listo' },
    { language: 'fr', concept: 'done', phrase: 'fait' },
    { language: 'bn', concept: 'slow', phrase: 'আস্তে' },
    { language: 'bn', concept: 'slow', phrase: 'aste' },
  ]
  const replies = languages.flatMap((language) => sets[language].filter((_, at) => at % 12 === 0))
  let without: (reply: Reply) => ReplyReading
  const byLists = (reply: Reply) =>
    readByWords(senseOf(reply.text, reply.language, reply.asked, reply.added))

  beforeAll(async () => {
    vi.resetModules()
    const { languagePacks } = await import('@/lib/domain/reply-lexicon')
    for (const { language, concept, phrase } of taken) {
      const pack = languagePacks[language]
      const entries = (pack.concepts[concept] ?? '').split(/[,\n]/).map((entry) => entry.trim())
      if (!entries.includes(phrase)) throw new Error(`${phrase} does not stand in the pack.`)
      pack.concepts[concept] = entries.filter((entry) => entry && entry !== phrase).join(', ')
    }
    const lists = await import('@/lib/domain/reply-by-words')
    const sense = await import('@/lib/domain/reply-sense')
    without = ({ text, language, asked, added }) =>
      lists.readByWords(sense.senseOf(text, language, asked, added))
  })

  it('reads every reply as if they had always stood in it', () => {
    for (const reply of replies) {
      expect({ reply, ...without({ ...reply, added: taken }) }).toEqual({
        reply,
        ...byLists(reply),
      })
    }
  }, 60_000)

  it('misses them when they are not handed over', () => {
    const missed = replies.filter((reply) => without(reply).kind !== byLists(reply).kind)
    expect(missed.length).toBeGreaterThan(3)
  }, 60_000)
})

describe('what may be added', () => {
  const ask = (phrase: string, concept: Concept = 'slow', added: AddedWord[] = []) =>
    mayAddWord({ language: 'en', concept, phrase }, added)

  it.each([
    ['zorblax', 'zorblax'],
    ['  Zörblax  FROTZ ', 'zorblax frotz'],
    ['zorb-lax', 'zorb lax'],
    ['জরব্লাক্স', 'জরব্লাক্স'],
    ['one two three zorb', 'one two three zorb'],
  ])('%j is kept as %j', (phrase, kept) => {
    expect(ask(phrase)).toMatchObject({ ok: true, word: { phrase: kept } })
  })

  it.each([
    ['', 'not letters'],
    ['12 zorblax', 'not letters'],
    ['zorb, lax', 'not letters'],
    ['zorb*', 'not letters'],
    ['~', 'not letters'],
    ['zorblax 👍', 'not letters'],
    ['z', 'too short'],
    ['a b c d e', 'too long'],
    ['STOP', 'keyword'],
    ['opt-out', 'keyword'],
    ['unstop', 'keyword'],
    ['info', 'keyword'],
    ['stop texting zorblax', 'keyword'],
    ['slow', 'known already'],
    ['trickling', 'known already'],
    ['thanks', 'means something else'],
    ['never', 'means something else'],
    ['table', 'everyday'],
    ['the', 'everyday'],
    ['twelve', 'everyday'],
    ['litres', 'everyday'],
  ])('%j is refused: %s', (phrase, reason) => {
    expect(ask(phrase)).toMatchObject({ ok: false, reason })
  })

  it.each([
    ['zorblax and cracked', 'thanks'],
    ['my belly zorblax', 'done'],
    ['never drinks', 'no'],
    ['bad water', 'thanks'],
    ['zorblax convulsing', 'broken'],
  ] as const)('%j may not hide its danger as “%s”', (phrase, concept) => {
    expect(ask(phrase, concept)).toMatchObject({ ok: false, reason: 'hides danger' })
  })

  it.each([
    ['zorblax and cracked', 'broken'],
    ['cracked zorblax', 'ill'],
    ['baby wont wake zorblax', 'sign'],
  ] as const)('%j may be as grave or graver: “%s”', (phrase, concept) => {
    expect(ask(phrase, concept)).toMatchObject({ ok: true })
  })

  it('a wrong guess at a danger may be set right', () => {
    expect(read('crackod').kind).toBe('broken')
    expect(ask('crackod', 'thanks')).toMatchObject({ ok: true })
  })

  it('denials, grammar and the ends of texts are not on offer', () => {
    const on = new Set(offeredGroups.flatMap(({ concepts: each }) => each.map((c) => c.concept)))
    for (const concept of ['not', 'notNext', 'ne', 'calm', 'stopAsk', 'stopWord', 'end'] as const) {
      expect(on.has(concept)).toBe(false)
      expect(ask('zorblax', concept)).toMatchObject({ ok: false, reason: 'not offered' })
    }
  })

  it('a phrase has one meaning in a language, but may have another in the next', () => {
    const added = one('slow', 'zorblax')
    expect(ask('Zorblax', 'slow', added)).toMatchObject({ ok: false, reason: 'known already' })
    expect(ask('zorblax', 'thanks', added)).toMatchObject({
      ok: false,
      reason: 'means something else',
      concept: 'slow',
    })
    const spanish = { language: 'es', concept: 'thanks', phrase: 'zorblax' } as const
    expect(mayAddWord(spanish, added)).toMatchObject({ ok: true })
  })

  it('there is an end to it', () => {
    const many = Array.from({ length: mostAdded }, (_, at) => ({
      language: 'en' as const,
      concept: 'slow' as const,
      phrase: `zorb${String.fromCharCode(97 + (at % 26))}${'x'.repeat(at)}`,
    }))
    expect(ask('frotz', 'slow', many.slice(1))).toMatchObject({ ok: true })
    expect(ask('frotz', 'slow', many)).toMatchObject({ ok: false, reason: 'full' })
  })

  it('a refusal says what the phrase means to the desk', () => {
    const refused = ask('thanks')
    if (refused.ok) throw new Error('It was not refused.')
    expect(addedRefusalWords(refused)).toContain('“thanks”')
  })
})
