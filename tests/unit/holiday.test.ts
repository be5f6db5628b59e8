import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import {
  dayOffWords,
  daysOffOn,
  holidayOfLine,
  lineOfHoliday,
  whyOff,
  withHolidays,
} from '@/lib/domain/holiday'

describe('a line of days off', () => {
  test.each([
    ['2026-12-25 Midwinter day', { on: '2026-12-25', name: 'Midwinter day' }],
    ['  2026-12-25\tMidwinter   day ', { on: '2026-12-25', name: 'Midwinter day' }],
    ['2026-12-25', { on: '2026-12-25', name: '' }],
    ['25.12.2026 Midwinter day', { on: '25.12.2026', name: 'Midwinter day' }],
    ['Midwinter day', { on: 'Midwinter', name: 'day' }],
    ['', { on: '', name: '' }],
  ])('“%s” has its day first', (line, holiday) => {
    expect(holidayOfLine(line)).toEqual(holiday)
  })

  test('is what it was written from', () => {
    const word = fc.stringMatching(/^[A-Za-zéñ’-]{1,9}$/)
    const name = fc.array(word, { maxLength: 4 }).map((words) => words.join(' '))
    fc.assert(
      fc.property(name, (called) => {
        const holiday = { on: '2026-12-25', name: called }
        expect(holidayOfLine(lineOfHoliday(holiday))).toEqual(holiday)
      }),
    )
  })
})

describe('more days off put among those that stand there', () => {
  const more = [
    { on: '2026-05-01', name: 'Labour Day' },
    { on: '2026-12-25', name: 'Christmas Day' },
  ]

  test('come in order, and leave a day its own name', () => {
    expect(withHolidays(['2026-12-25 Midwinter day', '2026-03-02 Ford day'], more)).toEqual([
      '2026-03-02 Ford day',
      '2026-05-01 Labour Day',
      '2026-12-25 Midwinter day',
    ])
  })

  test('lose no line that is not right yet', () => {
    expect(withHolidays(['1 May off'], more)).toContain('1 May off')
  })

  test('put in twice are there once', () => {
    const once = withHolidays([], more)
    expect(withHolidays(once, more)).toEqual(once)
  })
})

describe('why no texts go', () => {
  // 2026-03-08 is a Sunday.
  const holidays = [
    { on: '2026-03-08', name: 'Ford day' },
    { on: '2026-03-10', name: '' },
  ]
  const loma = { name: 'Loma Clara', sundaysOff: true, holidays }
  const ferry = { name: 'Ferry Bank', sundaysOff: true, holidays: [] }
  const char = { name: 'Char Nodi', sundaysOff: false, holidays: [] }

  test.each([
    ['2026-03-08', 'Ford day'],
    ['2026-03-10', 'a day off'],
    ['2026-03-15', 'Sunday'],
    ['2026-03-09', null],
  ])('on %s: %s', (on, why) => {
    expect(whyOff(on, loma)).toBe(why)
  })

  test.each([
    ['2026-03-15', [loma, ferry], 'Sunday'],
    ['2026-03-08', [loma, ferry, char], 'Ford day in Loma Clara; Sunday in Ferry Bank'],
    ['2026-03-15', [loma, ferry, char], 'Sunday in Loma Clara and Ferry Bank'],
    ['2026-03-10', [loma, ferry], 'a day off in Loma Clara'],
    ['2026-03-09', [loma, ferry], ''],
    ['2026-03-08', [], ''],
  ])('on %s, by area where they differ', (on, areas, words) => {
    expect(dayOffWords(daysOffOn(on, areas))).toBe(words)
  })
})
