import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  nextChangeOn,
  nextDue,
  nextWashOn,
  washDefaults,
  washIntervalDays,
  type SourceClass,
} from '@/lib/domain/cycle'

describe('the change of a stage', () => {
  it('is counted from the fitting, the end of the month clamped, without drift', () => {
    const fittedOn = '2025-01-31'
    const due = [1, 2, 3, 12, 13].map((count) => nextDue({ fittedOn, months: 1, count }))
    expect(due).toEqual(['2025-02-28', '2025-03-31', '2025-04-30', '2026-01-31', '2026-02-28'])
  })

  it('comes one cycle after the fitting', () => {
    expect(nextChangeOn({ fittedOn: '2025-05-15', changeMonths: 12 })).toBe('2026-05-15')
    expect(nextChangeOn({ fittedOn: '2025-11-30', changeMonths: 3 })).toBe('2026-02-28')
  })
})

describe('the wash interval', () => {
  it.each([
    ['clear', false, 30],
    ['clear', true, 21],
    ['cloudy', false, 14],
    ['cloudy', true, 9],
    ['very cloudy', false, 7],
    ['very cloudy', true, 5],
  ] as const)('for %s water, wet month %s, is %i days', (sourceClass, wet, days) => {
    expect(washIntervalDays({ sourceClass, wet })).toBe(days)
  })

  it('is brought forward by the trend and never put off', () => {
    expect(washIntervalDays({ sourceClass: 'clear', wet: false, trendDays: 12.9 })).toBe(12)
    expect(washIntervalDays({ sourceClass: 'clear', wet: false, trendDays: 90 })).toBe(30)
    expect(washIntervalDays({ sourceClass: 'clear', wet: false, trendDays: null })).toBe(30)
  })

  it('never goes under its floor, whatever the trend says', () => {
    fc.assert(
      fc.property(
        fc.constantFrom<SourceClass>('clear', 'cloudy', 'very cloudy'),
        fc.boolean(),
        fc.option(fc.double({ min: -1000, max: 1000, noNaN: true })),
        (sourceClass, wet, trendDays) => {
          const days = washIntervalDays({ sourceClass, wet, trendDays })
          expect(days).toBeGreaterThanOrEqual(washDefaults.floorDays)
          expect(days).toBeLessThanOrEqual(washDefaults.days[sourceClass])
          expect(Number.isInteger(days)).toBe(true)
        },
      ),
      { seed: 2 },
    )
  })

  it('follows what the coordinator set', () => {
    const settings = { ...washDefaults, wetShare: 0.5, floorDays: 10 }
    expect(washIntervalDays({ sourceClass: 'clear', wet: true, settings })).toBe(15)
    expect(washIntervalDays({ sourceClass: 'very cloudy', wet: false, settings })).toBe(10)
  })

  it('gives the day of the next wash', () => {
    expect(nextWashOn({ lastWashOn: '2024-02-20', intervalDays: 14 })).toBe('2024-03-05')
  })
})
