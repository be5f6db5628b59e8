import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  addDays,
  addMonths,
  dayNumber,
  dayOfNumber,
  daysBetween,
  monthOf,
  weekdayOf,
} from '@/lib/domain/day'

describe('a day', () => {
  it('counts from 1970', () => {
    expect(dayNumber('1970-01-01')).toBe(0)
    expect(dayNumber('2000-03-01')).toBe(11_017)
    expect(dayNumber('1969-12-31')).toBe(-1)
  })

  it('comes back from its number', () => {
    fc.assert(
      fc.property(fc.integer({ min: -700_000, max: 2_900_000 }), (number) => {
        expect(dayNumber(dayOfNumber(number))).toBe(number)
      }),
      { seed: 1 },
    )
  })

  it.each([
    '2025-02-29',
    '2025-13-01',
    '2025-00-10',
    '2025-01-00',
    '2025-04-31',
    '2025-4-1',
    '12025-04-01',
    '2025-04-011',
    'today',
    '',
  ])('is refused when it is none: %j', (text) => {
    expect(() => dayNumber(text)).toThrow(new RangeError(`not a day: ${text}`))
  })

  it('has a weekday and a month', () => {
    expect(weekdayOf('1970-01-01')).toBe(4)
    expect(weekdayOf('2025-06-01')).toBe(0)
    expect(weekdayOf('1969-12-28')).toBe(0)
    expect(monthOf('2025-06-01')).toBe(6)
  })

  it('moves by days and months, also backwards', () => {
    expect(addDays('2024-02-28', 2)).toBe('2024-03-01')
    expect(addDays('2025-01-01', -1)).toBe('2024-12-31')
    expect(addMonths('2025-11-30', 3)).toBe('2026-02-28')
    expect(addMonths('2025-03-31', -1)).toBe('2025-02-28')
    expect(addMonths('2100-01-29', 1)).toBe('2100-02-28')
    expect(addMonths('2000-01-30', 1)).toBe('2000-02-29')
    expect(daysBetween('2025-03-01', '2024-03-01')).toBe(-365)
  })
})
