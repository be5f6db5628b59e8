import { describe, expect, test } from 'vitest'
import { findInShift, holdShift } from '@/components/shift/held-shift'
import type { Shift, ShiftRow } from '@/lib/schemas/shift'

const row = (ticketId: string, change: Partial<ShiftRow> = {}): ShiftRow => ({
  ticketId,
  house: `${ticketId} house`,
  area: 'Loma Clara',
  language: 'es',
  sentence: '6 people; slow.',
  sentenceLanguage: 'en',
  words: null,
  about: null,
  waited: '0 h 10',
  since: 'since 10:00',
  bead: 'half',
  beadWords: 'slow',
  tone: 'water',
  waits: false,
  marks: [],
  column: { stages: [], level: null, description: '' },
  ...change,
})

type Name = Shift['bands'][number]['name']
const band = (name: Name, rows: ShiftRow[], note = '') => ({ name, note, rows })

describe('a held shift', () => {
  const base = { bands: [band('Slow', [row('Orellana'), row('Whitlock')], '2 houses')] }

  test('keeps the order under the eye though the harm has changed it', () => {
    const fresh = {
      bands: [
        band('No safe water', [row('Whitlock', { sentence: 'nothing safe' })]),
        band('Slow', [row('Orellana')], '1 house'),
      ],
    }
    const { bands, newcomers } = holdShift(base, fresh)
    expect(bands.map(({ name, note, rows }) => [name, note, rows.map((one) => one.house)])).toEqual(
      [['Slow', '1 house', ['Orellana house', 'Whitlock house']]],
    )
    expect(bands[0]?.rows[1]?.sentence).toBe('nothing safe')
    expect(newcomers).toEqual([])
  })

  test('leaves an ended row in its place, and says so', () => {
    const { bands } = holdShift(base, { bands: [band('Slow', [row('Whitlock')])] })
    expect(bands[0]?.rows.map(({ house, gone }) => [house, gone ?? false])).toEqual([
      ['Orellana house', true],
      ['Whitlock house', false],
    ])
  })

  test('keeps what is new apart, worst first', () => {
    const fresh = {
      bands: [
        band('Unwell', [row('Quispe')]),
        band('Slow', [row('Adeyo'), row('Orellana'), row('Whitlock')]),
      ],
    }
    const { newcomers } = holdShift(base, fresh)
    expect(newcomers.map(({ ticketId }) => ticketId)).toEqual(['Quispe', 'Adeyo'])
  })
})

describe('finding in the shift', () => {
  const bands = [
    band('Slow', [row('Orellana', { words: 'Sale POCA agua' }), row('Whitlock')]),
    band('Silent', [row('Perrin')]),
  ]

  test('looks at houses and words, whatever their case, and drops empty bands', () => {
    expect(findInShift(bands, ' poca ').map(({ rows }) => rows.map((one) => one.house))).toEqual([
      ['Orellana house'],
    ])
    expect(findInShift(bands, 'whit')[0]?.rows).toHaveLength(1)
    expect(findInShift(bands, 'nobody of that name')).toEqual([])
  })

  test('shows all when nothing is looked for', () => {
    expect(findInShift(bands, '  ')).toEqual(bands)
  })
})
