/*
 * CHECKS section 5: what to drink meanwhile, as printed.
 * [C] read in a copy of the source · [D] by arithmetic.
 */
import { describe, expect, it } from 'vitest'
import { adviceTables, drinkAdvice, lintTable, type AdviceTable } from '@/lib/domain/advice'

function given(question: Partial<Parameters<typeof drinkAdvice>[0]>) {
  const advice = drinkAdvice({ tableId: '', altitudeMetres: 0, cloudy: false, ...question })
  if (!advice.ok) throw new Error(`refused: ${advice.reason}`)
  return advice
}

function dropsOf(question: Parameters<typeof given>[0]) {
  const { drink } = given(question)
  if (drink.method !== 'bleach') throw new Error('not bleach')
  return drink.doses.map(({ measure, drops }) => [measure, drops])
}

describe('boiling', () => {
  // CDC, Making Water Safe in an Emergency: 1 minute, above 6,500 feet 3 minutes [C]
  it.each([
    [0, 1],
    [1980, 1],
    [1982, 3],
  ])('by the first table at %d m takes %d minutes', (altitudeMetres, minutes) => {
    expect(given({ tableId: 'boil-cdc', altitudeMetres }).drink).toEqual({
      method: 'boil',
      minutes,
    })
  })

  // WHO, Boil Water, 2015: reach a rolling boil, at any altitude; let cool, covered [C]
  it.each([0, 2500, 4500])('by the second needs only the boil at %d m', (altitudeMetres) => {
    const { drink, cautions } = given({ tableId: 'boil-who', altitudeMetres })
    expect(drink).toEqual({ method: 'boil', minutes: 0 })
    expect(cautions).toContain('cool covered')
  })

  // EPA prints "above 5,000 feet (1,000 meters)"; where it is chosen, 1,000 m [C]
  it.each([
    [1000, 1],
    [1001, 3],
    [1600, 3],
  ])('by the third at %d m takes %d minutes', (altitudeMetres, minutes) => {
    expect(given({ tableId: 'boil-epa', altitudeMetres }).drink).toEqual({
      method: 'boil',
      minutes,
    })
  })

  it('warns of scalding, and of what boiling does not remove', () => {
    for (const { id } of adviceTables.filter(({ kind }) => kind === 'boil')) {
      expect(given({ tableId: id }).cautions).toEqual(
        expect.arrayContaining(['scald', 'not for fuel or chemicals']),
      )
    }
  })
})

describe('bleach', () => {
  // CDC, Making Water Safe in an Emergency: per US gallon, wait at least 30 minutes [C]
  it.each([
    [5, false, 8],
    [5.25, false, 8],
    [6, true, 16],
    [8.25, false, 6],
    [8.25, true, 12],
  ])('of %d %, cloudy %s: %d drops a gallon', (bleachPercent, cloudy, drops) => {
    expect(dropsOf({ tableId: 'bleach-cdc', bleachPercent, cloudy })).toEqual([
      ['1 US gallon', drops],
    ])
  })

  // EPA, Emergency Disinfection of Drinking Water: double if cloudy, coloured or very cold [C]
  it.each([
    [6, false, 2, 8],
    [8.25, false, 2, 6],
    [6, true, 4, 16],
    [8.25, true, 4, 12],
  ])(
    'of %d %, cloudy %s: %d drops a litre, %d a gallon',
    (bleachPercent, cloudy, litre, gallon) => {
      expect(dropsOf({ tableId: 'bleach-epa', bleachPercent, cloudy })).toEqual([
        ['1 litre or quart', litre],
        ['1 US gallon', gallon],
      ])
    },
  )

  it.each(['bleach-cdc', 'bleach-epa'])(
    'waits half an hour, unmixed, after the filter: %s',
    (tableId) => {
      const { drink, cautions } = given({ tableId, bleachPercent: 6 })
      expect(drink).toMatchObject({ waitMinutes: 30 })
      expect(cautions).toEqual(expect.arrayContaining(['after the filter', 'never mix']))
    },
  )

  it.each([{ bleachPercent: 3 }, { bleachPercent: 7 }, { bleachPercent: 6, scented: true }])(
    'that no table prints is refused: %o',
    (question) => {
      for (const tableId of ['bleach-cdc', 'bleach-epa']) {
        const asked = { tableId, altitudeMetres: 0, cloudy: false, ...question }
        expect(drinkAdvice(asked).ok).toBe(false)
      }
    },
  )
})

// Wilhelm et al. 2017, Journal of Water and Health 16:112 [C]
describe('a programme’s own doses', () => {
  it.each([
    [false, 1.88, 24],
    [true, 3.75, 8],
  ])(
    'cloudy %s: %d mg a litre, used within %d hours',
    (cloudy, milligramsPerLitre, useWithinHours) => {
      expect(given({ tableId: 'dose-wilhelm', cloudy }).drink).toEqual({
        method: 'dose',
        milligramsPerLitre,
        useWithinHours,
      })
    },
  )
})

// The rule of the linter on printed rows [D]
describe('the linter', () => {
  it.each(adviceTables.map((table) => [table.id, table] as const))('passes %s', (_, table) => {
    expect(lintTable(table)).toEqual([])
  })

  it('fails the table that circulates with 2 and 4 drops a quart, 8 and 10 a gallon', () => {
    const bleach = { fromPercent: 5, toPercent: 6 }
    const table: AdviceTable = {
      kind: 'bleach',
      id: 'circulating',
      name: 'As it circulates',
      source: 'no one in particular',
      waitMinutes: 30,
      rows: [
        { ...bleach, measure: '1 quart', litres: 0.946, clearDrops: 2, cloudyDrops: 4 },
        { ...bleach, measure: '1 gallon', litres: 3.785, clearDrops: 8, cloudyDrops: 10 },
      ],
    }
    expect(lintTable(table)).toEqual(['1 gallon: cloudy is not about twice clear'])
  })

  const line = { measure: '1 litre', litres: 1, fromPercent: 6, toPercent: 6 }
  const printed = (rows: readonly [clear: number, cloudy: number][]): AdviceTable => ({
    kind: 'bleach',
    id: 'printed',
    name: 'As printed',
    source: 'a source',
    waitMinutes: 30,
    rows: rows.map(([clearDrops, cloudyDrops], at) => ({
      ...line,
      measure: `line ${at + 1}`,
      clearDrops,
      cloudyDrops,
    })),
  })

  // Of 60 and 140 the mean is 100: just 40 % off; of 59 and 141 it is more.
  it('lets a dose per litre vary by 40 % down a column, and no more', () => {
    const differ = (column: string) => `${column} doses a litre differ by more than 40 %`
    expect(
      lintTable(
        printed([
          [60, 120],
          [140, 280],
        ]),
      ),
    ).toEqual([])
    expect(
      lintTable(
        printed([
          [59, 118],
          [141, 282],
        ]),
      ),
    ).toEqual([differ('clear'), differ('cloudy')])
  })

  it.each([
    [179, false],
    [180, true],
    [220, true],
    [221, false],
  ])('with 100 drops clear and %d cloudy passes: %s', (cloudy, passes) => {
    expect(lintTable(printed([[100, cloudy]])).length === 0).toBe(passes)
  })

  it('holds a wait of half an hour', () => {
    const hasty = { ...printed([[2, 4]]), waitMinutes: 29 } as AdviceTable
    expect(lintTable(hasty)).toEqual(['waits less than 30 minutes'])
  })
})
