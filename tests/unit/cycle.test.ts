import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  nextChangeOn,
  nextDue,
  planWash,
  washDefaults,
  washIntervalDays,
  type SourceClass,
} from '@/lib/domain/cycle'
import { addDays } from '@/lib/domain/day'

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
})

describe('the plan of a wash', () => {
  const dry = { countedFrom: '2026-03-01', sourceClass: 'clear', wetMonths: [] } as const
  const calendarWashOn = '2026-03-31'

  it.each([
    ['no fall is foretold', null, '2026-03-05', calendarWashOn],
    ['the flow meets the need before the calendar', '2026-03-20', '2026-03-05', '2026-03-20'],
    ['it meets it on the calendar’s day', calendarWashOn, '2026-03-05', calendarWashOn],
    ['it meets it later', '2026-06-01', '2026-03-05', calendarWashOn],
    ['it met it before today', '2026-03-10', '2026-03-15', '2026-03-15'],
    ['it met it before the last wash', '2026-02-10', '2026-03-01', '2026-03-06'],
    ['it meets it tomorrow, under the floor', '2026-03-03', '2026-03-02', '2026-03-06'],
    ['the calendar’s day is past already', '2026-03-20', '2026-04-04', calendarWashOn],
  ])('when %s: falls on %s, today %s', (_case, shortOn, today, nextWashOn) => {
    expect(planWash({ ...dry, shortOn, today })).toEqual({ nextWashOn, calendarWashOn })
  })

  it('goes by the month the days are counted from, and by what the coordinator set', () => {
    const wet = { ...dry, wetMonths: [3], shortOn: null, today: '2026-03-01' }
    expect(planWash(wet).nextWashOn).toBe('2026-03-22')
    const settings = { ...washDefaults, wetShare: 1, days: { ...washDefaults.days, clear: 10 } }
    expect(planWash({ ...wet, settings }).nextWashOn).toBe('2026-03-11')
  })

  it('never puts a wash off, never brings it under its floor or into the past', () => {
    const day = fc.integer({ min: -100, max: 100 }).map((days) => addDays('2026-03-01', days))
    fc.assert(
      fc.property(fc.option(day), day, (shortOn, today) => {
        const plan = planWash({ ...dry, shortOn, today })
        expect(plan.calendarWashOn).toBe(calendarWashOn)
        expect(plan.nextWashOn <= calendarWashOn).toBe(true)
        expect(plan.nextWashOn >= '2026-03-06').toBe(true)
        expect(plan.nextWashOn >= today || plan.nextWashOn === calendarWashOn).toBe(true)
      }),
      { seed: 4 },
    )
  })
})
