import { describe, expect, it } from 'vitest'
import { normalQuantile, studentQuantile } from '@/lib/domain/quantile'

describe('the normal quantile', () => {
  it('is odd about one half', () => {
    expect(normalQuantile(0.5)).toBe(0)
    for (const chance of [0.6, 0.9, 0.975, 0.9999, 1 - 1e-9]) {
      expect(normalQuantile(1 - chance)).toBeCloseTo(-normalQuantile(chance), 6)
    }
  })

  it.each([0, 1, -0.1, 1.1, NaN])('is refused for %s', (chance) => {
    expect(() => normalQuantile(chance)).toThrow(RangeError)
  })
})

describe('the quantile of Student', () => {
  it('comes down to the normal one as readings grow', () => {
    expect(studentQuantile(0.975, 100_000)).toBeCloseTo(normalQuantile(0.975), 4)
    expect(studentQuantile(0.975, 5)).toBeGreaterThan(studentQuantile(0.975, 6))
  })

  it.each([
    [0.5, 3],
    [1, 3],
    [NaN, 3],
    [0.975, 0],
    [0.975, 1.5],
  ])('is refused for %s with %s', (chance, freedom) => {
    expect(() => studentQuantile(chance, freedom)).toThrow(RangeError)
  })
})
