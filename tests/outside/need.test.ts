/*
 * CHECKS section 3: what people drink.
 * [C] read in a copy of the source · [M] from memory of a published source · [D] by arithmetic.
 */
import { describe, expect, it } from 'vitest'
import {
  dailyNeed,
  designLitresPerPersonDay,
  enough,
  floorLitresPerPersonDay,
} from '@/lib/domain/need'
import { adequateIntake, humanitarianRange } from '@/lib/domain/need-intake'

describe('the need', () => {
  // Sphere Handbook: survival 2.5 to 3, total basic 7.5 to 15 L a person and day [C]
  it('of seven people lies in the humanitarian ranges', () => {
    expect(humanitarianRange(7)).toEqual({
      survival: { low: 17.5, high: 21 },
      basic: { low: 52.5, high: 105 },
    })
  })

  it('never goes under survival, and by default lies between it and all basic needs', () => {
    const { survival, basic } = humanitarianRange(7)
    expect(dailyNeed({ people: 7, litresPerPersonDay: 0 })).toBe(survival.high)
    expect(floorLitresPerPersonDay).toBe(3)
    expect(dailyNeed({ people: 7 })).toBeGreaterThan(survival.high)
    expect(dailyNeed({ people: 7 })).toBeLessThan(basic.low)
  })

  // WHO, Domestic water quantity, service level and health, 2nd ed. 2020 [M]
  it('is designed for 5.3 L a person and day', () => {
    expect(designLitresPerPersonDay).toBe(5.3)
    expect(dailyNeed({ people: 10 })).toBeCloseTo(53, 12)
  })

  // EFSA Journal 2010;8(3):1459, total water [C values, D sums]
  it('covers what a family should take in', () => {
    expect(adequateIntake(['woman'])).toBe(2.0)
    expect(adequateIntake(['man'])).toBe(2.5)
    expect(adequateIntake(['nursing woman'])).toBeCloseTo(2.7, 12)
    expect(adequateIntake(['pregnant woman'])).toBeCloseTo(2.3, 12)
    expect(adequateIntake(['child of 4 to 8'])).toBe(1.6)
    const family = adequateIntake(['nursing woman', 'man', 'child of 4 to 8'])
    expect(family).toBeCloseTo(6.8, 12)
    expect(dailyNeed({ people: 3 })).toBeGreaterThan(family)
  })
})

describe('a trickle', () => {
  // Arithmetic [D]
  it.each([
    [50, 300, 'enough'],
    [10, 1500, 'short'],
  ])('of %d mL a minute takes %d minutes for five people at 3 L', (millilitres, minutes, kind) => {
    const litresPerDay = dailyNeed({ people: 5, litresPerPersonDay: 3 })
    const found = enough({ litresPerHour: (millilitres * 60) / 1000, litresPerDay })
    expect(found.hours * 60).toBeCloseTo(minutes, 9)
    expect(found.kind).toBe(kind)
  })
})
