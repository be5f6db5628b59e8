import { describe, expect, it } from 'vitest'
import { adviceTables, drinkAdvice, lintTable, type AdviceTable } from '@/lib/domain/advice'

const plain = { altitudeMetres: 200, cloudy: false }

function given(tableId: string, rest: object = {}) {
  const advice = drinkAdvice({ ...plain, tableId, ...rest })
  if (!advice.ok) throw new Error(`refused: ${advice.reason}`)
  return advice
}

describe('an advice', () => {
  it('prints the source of its table', () => {
    for (const { id, source } of adviceTables) {
      expect(given(id, { bleachPercent: 6 }).source).toBe(source)
    }
  })

  it('is read in plain words', () => {
    expect(given('boil-cdc').text).toContain('rolling boil for 1 minute.')
    expect(given('boil-cdc', { altitudeMetres: 3000 }).text).toContain('for 3 minutes.')
    expect(given('boil-who').text).toContain('Bring the water to a rolling boil.')
    expect(given('bleach-cdc', { bleachPercent: 6 }).text).toContain('8 drops to 1 US gallon')
    expect(given('dose-wilhelm', { cloudy: true }).text).toContain('within 8 hours')
  })

  it('gives the longest boil where nobody knows the altitude', () => {
    expect(given('boil-cdc', { altitudeMetres: NaN }).drink).toEqual({ method: 'boil', minutes: 3 })
  })

  it('never claims that water is safe', () => {
    for (const { id } of adviceTables) {
      expect(given(id, { bleachPercent: 6 }).text).not.toMatch(/safe|pure|100 %/i)
    }
  })

  it.each([
    [{ tableId: 'tea' }, 'no such table'],
    [{ tableId: 'bleach-cdc' }, 'strength not told'],
    [{ tableId: 'bleach-cdc', bleachPercent: 7 }, 'strength not in the table'],
    [{ tableId: 'bleach-cdc', bleachPercent: 6, scented: true }, 'scented'],
  ])('is refused for %o: %s', (question, reason) => {
    expect(drinkAdvice({ ...plain, ...question })).toEqual({ ok: false, reason })
  })

  it('is refused from a table that its linter refuses', () => {
    const boil: AdviceTable = { kind: 'boil', id: 'own', name: 'Own', source: '', rows: [] }
    expect(drinkAdvice({ ...plain, tableId: 'own', tables: [boil] })).toEqual({
      ok: false,
      reason: 'table is faulty',
    })
  })
})

describe('the linter of tables', () => {
  const named = { id: 'own', name: 'Own', source: 'a printed page' }
  const row = { measure: '1 litre', litres: 1, fromPercent: 6, toPercent: 6 }

  it('wants a source and rows', () => {
    expect(lintTable({ ...named, kind: 'boil', source: ' ', rows: [] })).toEqual([
      'has no source',
      'has no rows',
    ])
    expect(lintTable({ ...named, kind: 'bleach', waitMinutes: 30, rows: [] })).toEqual([
      'has no rows',
    ])
  })

  it('wants boiling to be told for every height, and longer higher up', () => {
    const rows = [
      { aboveMetres: 2000, minutes: 1 },
      { aboveMetres: -Infinity, minutes: 3 },
    ]
    expect(lintTable({ ...named, kind: 'boil', rows })).toEqual(['asks for less boiling higher up'])
    expect(lintTable({ ...named, kind: 'boil', rows: rows.slice(0, 1) })).toEqual([
      'does not say what holds at sea level',
    ])
  })

  it('wants half an hour, an even dose and twice as much for cloudy water', () => {
    const rows = [
      { ...row, clearDrops: 2, cloudyDrops: 4 },
      { ...row, measure: '10 litres', litres: 10, clearDrops: 2, cloudyDrops: 3 },
    ]
    expect(lintTable({ ...named, kind: 'bleach', waitMinutes: 10, rows })).toEqual([
      'waits less than 30 minutes',
      'clear doses a litre differ by more than 40 %',
      'cloudy doses a litre differ by more than 40 %',
      '10 litres: cloudy is not about twice clear',
    ])
  })

  it.each([
    [1.79, 1],
    [1.8, 0],
    [2.2, 0],
    [2.21, 1],
  ])('with cloudy at %d times clear finds %i faults', (cloudyDrops, count) => {
    const rows = [{ ...row, clearDrops: 1, cloudyDrops }]
    expect(lintTable({ ...named, kind: 'bleach', waitMinutes: 30, rows })).toHaveLength(count)
  })

  it('looks at measured doses too', () => {
    const dose = (milligramsPerLitre: number) => ({ milligramsPerLitre, useWithinHours: 24 })
    expect(lintTable({ ...named, kind: 'dose', clear: dose(2), cloudy: dose(2) })).toEqual([
      'the dose: cloudy is not about twice clear',
    ])
  })
})
