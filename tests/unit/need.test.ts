import { describe, expect, it } from 'vitest'
import { dailyNeed, enough, neededLitresPerHour } from '@/lib/domain/need'

describe('what a house needs', () => {
  it('goes with its people', () => {
    expect(dailyNeed({ people: 1 })).toBeCloseTo(5.3, 12)
    expect(dailyNeed({ people: 6 })).toBeCloseTo(31.8, 12)
    expect(dailyNeed({ people: 0 })).toBe(0)
  })

  it('never falls under the floor, even if set so', () => {
    expect(dailyNeed({ people: 4, litresPerPersonDay: 2 })).toBe(12)
    expect(dailyNeed({ people: 4, litresPerPersonDay: 3.5 })).toBe(14)
  })

  it('grows with the season and does not shrink with it', () => {
    expect(dailyNeed({ people: 4, litresPerPersonDay: 5, seasonExtraLitres: 1 })).toBe(24)
    expect(dailyNeed({ people: 4, litresPerPersonDay: 5, seasonExtraLitres: -1 })).toBe(20)
  })
})

describe('enough water', () => {
  it.each([
    [4, 32, 'enough', 8],
    [3.99, 32, 'slow', 32 / 3.99],
    [1, 24, 'slow', 24],
    [0.99, 24, 'short', 24 / 0.99],
    [0, 24, 'short', Infinity],
  ] as const)('%d L/h for %d L a day is %s', (litresPerHour, litresPerDay, kind, hours) => {
    expect(enough({ litresPerHour, litresPerDay })).toEqual({ kind, hours })
  })

  it('takes the hours that were set', () => {
    expect(enough({ litresPerHour: 2, litresPerDay: 24, enoughHours: 12 }).kind).toBe('enough')
    expect(enough({ litresPerHour: 2, litresPerDay: 24, enoughHours: 9 }).kind).toBe('slow')
    expect(enough({ litresPerHour: 2, litresPerDay: 26, slowHours: 13 }).kind).toBe('slow')
    expect(enough({ litresPerHour: 2, litresPerDay: 26, slowHours: 12 }).kind).toBe('short')
    expect(neededLitresPerHour({ litresPerDay: 24 })).toBe(3)
    expect(neededLitresPerHour({ litresPerDay: 24, enoughHours: 12 })).toBe(2)
  })
})
