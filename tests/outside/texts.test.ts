import { split } from 'split-sms'
import { describe, expect, it } from 'vitest'
import { seeded } from '@/tests/factories/seeded'
import { offendingCharacters, segmentsOf, unitsPerPart } from '@/lib/domain/wording'
import { checkDraft } from '@/lib/domain/wording-checks'
import { readingGrade } from '@/lib/domain/wording-reading'

/*
 * CHECKS.md section 10. Sources: 3GPP TS 23.038 (alphabet; 160/153 septets, 70/67 units) and
 * TS 23.040 §9.2.3.24.1 (an escape pair is not split). Oracle: split-sms 0.1.7.
 */
const oracle = { split }

describe('3GPP TS 23.038 and 23.040', () => {
  it.each([
    { text: 'a'.repeat(160), segments: 1, what: '160 septets' },
    { text: 'a'.repeat(161), segments: 2, what: '161 septets' },
    { text: 'a'.repeat(306), segments: 2, what: 'two full parts' },
    { text: 'a'.repeat(307), segments: 3, what: 'one more than two full parts' },
    { text: ']'.repeat(153), segments: 3, what: 'escape pairs, none split' },
    { text: `${'a'.repeat(80)}\r\n${'a'.repeat(79)}`, segments: 2, what: 'a line end of two' },
    { text: `\u2019${'a'.repeat(70)}`, segments: 2, what: 'one curly quote in 71' },
    { text: 'ক'.repeat(70), segments: 1, what: '70 units' },
    { text: 'ক'.repeat(71), segments: 2, what: '71 units' },
    { text: 'ক'.repeat(134), segments: 2, what: 'two full parts of units' },
    { text: 'ক'.repeat(135), segments: 3, what: 'one more than two full parts of units' },
  ])('$what is $segments', ({ text, segments }) => {
    expect(segmentsOf(text).segments).toBe(segments)
  })

  it.each(Array.from('^{}\\[~]|€\f'))('%j takes two septets', (character) => {
    expect(segmentsOf(character)).toEqual({ encoding: 'GSM-7', segments: 1, units: 2 })
  })

  it.each(Array.from('çáíóú\u2018\u2019\u201c\u201d`'))(
    '%s is not in the basic alphabet',
    (character) => {
      expect(segmentsOf(`water ${character}`).encoding).toBe('UCS-2')
      expect(offendingCharacters(`water ${character}, ${character}`)).toEqual([character])
    },
  )

  it.each(Array.from('éèàùìòñüöäÇÑÉ¿¡£@'))('%s is', (character) => {
    expect(segmentsOf(character)).toEqual({ encoding: 'GSM-7', segments: 1, units: 1 })
  })

  it('knows the room in each part', () => {
    const rooms = [1, 2].flatMap((parts) => [
      unitsPerPart('GSM-7', parts),
      unitsPerPart('UCS-2', parts),
    ])
    expect(rooms).toEqual([160, 70, 153, 67])
  })
})

const mixes: string[][] = [
  Array.from('abc DEF 123 .,?!'),
  Array.from('abc ñéèàü¿¡ €[]{}^|~\\'),
  Array.from('abc áíóú ’“”`ç'),
  Array.from('কখগঘ চছজ ০১২'),
  ['কি', 'খু', 'গে', 'ঘো', 'চ', ' ', 'আ', 'মি', 'ক্ষ'],
  ['a', 'b', ' ', '💧', '👍🏽', '👩‍👧', '🇧🇩'],
  ['a', '\n', '\r\n', '€', 'é', 'e\u0301'],
]
const borders = [20, 70, 70, 70, 134, 160, 160, 306]

function randomText(random: () => number): string {
  const pick = <T>(from: readonly T[]) => from[Math.floor(random() * from.length)] as T
  const mix = pick(mixes)
  const units = pick(borders) + Math.floor(random() * 9) - 4
  let text = ''
  while (text.length < units) text += pick(mix)
  return text
}

const clusters = new Intl.Segmenter('en', { granularity: 'grapheme' })

/** Whether a character that people see as one is made of several code points. */
function hasJoined(text: string): boolean {
  return [...clusters.segment(text)].some(({ segment }) => Array.from(segment).length > 1)
}

describe('split-sms as oracle', () => {
  it('counts the same on 20,000 texts, or one more where a character is made of several', () => {
    const random = seeded(20_260_301)
    const seen = { plain: 0, joined: 0, more: 0 }
    const wrong: string[] = []
    for (let index = 0; index < 20_000; index += 1) {
      const text = randomText(random)
      const { segments, encoding } = segmentsOf(text)
      const { parts, characterSet } = oracle.split(text)
      const isJoined = hasJoined(text)
      const more = segments - parts.length
      seen[isJoined ? 'joined' : 'plain'] += 1
      seen.more += more
      const isSameCount = more === 0 || (isJoined && more === 1)
      if (!isSameCount || (encoding === 'GSM-7') !== (characterSet === 'GSM')) wrong.push(text)
    }
    expect(wrong).toEqual([])
    expect(seen.plain).toBeGreaterThan(5_000)
    expect(seen.joined).toBeGreaterThan(5_000)
    expect(seen.more).toBeGreaterThan(0)
  }, 600_000)
})

describe('plain words', () => {
  /** Counts and grades as read in the README of a package that computes them. */
  it.each([
    { sentences: 1, words: 13, syllables: 26, grade: 13.08 },
    { sentences: 1, words: 6, syllables: 6, grade: -1.45 },
  ])('Flesch–Kincaid of $words words is $grade', ({ grade, ...counts }) => {
    expect(readingGrade(counts)).toBeCloseTo(grade, 2)
  })

  it('takes one action a text and ten words a sentence', () => {
    const ten = 'Push clean water back through the long stage ten times.'
    const notes = (body: string) =>
      checkDraft({ moment: 'wash-due', language: 'en', body }).map(({ kind }) => kind)
    expect(notes(ten)).toEqual([])
    expect(notes(ten.replace('times', 'full times'))).toEqual(['long sentence'])
    expect(notes(`${ten} Then change the cloth.`)).toEqual(['two actions'])
  })
})
