import { describe, expect, it } from 'vitest'
import { shortOn, trend, type Forecast, type Reading } from '@/lib/domain/flow'

const day = 86_400_000
const start = 1_750_000_000_000

function falling(
  perDay: number,
  days: readonly number[],
  noise: readonly number[] = [],
): Reading[] {
  return days.map((at, index) => ({
    takenAt: start + at * day,
    normalised: 16 * Math.exp(-perDay * at + (noise[index] ?? 0)),
  }))
}

function falls(forecast: Forecast) {
  if (forecast.kind !== 'falls') throw new Error(`expected a fall, got ${forecast.kind}`)
  return forecast
}

describe('the trend of a filter', () => {
  it('needs three readings at more than one moment, and flowing ones', () => {
    expect(trend(falling(0.02, [0, 10]), 4)).toEqual({ kind: 'too few' })
    expect(trend([], 4)).toEqual({ kind: 'too few' })
    expect(trend(falling(0.02, [5, 5, 5]), 4)).toEqual({ kind: 'too few' })
    const dry = { takenAt: start + 20 * day, normalised: 0 }
    expect(trend([...falling(0.02, [0, 10]), dry], 4)).toEqual({ kind: 'too few' })
  })

  it('finds the day an exponential fall meets the need', () => {
    const rate = Math.log(4) / 60 // 16 L/h falls to 4 in 60 days
    const forecast = falls(trend(falling(rate, [0, 10, 20, 30, 40]), 4))
    expect((forecast.onAt - start) / day).toBeCloseTo(60, 6)
    expect(forecast.perDay).toBeCloseTo(1 - Math.exp(-rate), 12)
  })

  it('is not surer than its readings, even when they lie on one line', () => {
    const forecast = falls(trend(falling(Math.log(4) / 60, [0, 10, 20, 30, 40]), 4))
    expect(forecast.earliestAt).toBeLessThan(forecast.onAt - 5 * day)
    expect(forecast.latestAt).toBeGreaterThan(forecast.onAt + 5 * day)
    const exact = { timeErrorShare: 0, bottleErrorShare: 0 }
    const naive = falls(trend(falling(Math.log(4) / 60, [0, 10, 20, 30, 40]), 4, exact))
    expect(naive.latestAt).toBeCloseTo(naive.onAt, -3)
  })

  it('has no latest day when the fall cannot be told from noise', () => {
    const noisy = falling(0.01, [0, 3, 6, 9], [0, 0.3, -0.3, 0.1])
    const forecast = falls(trend(noisy, 4))
    expect(forecast.latestAt).toBeNull()
    expect(forecast.earliestAt).toBeLessThan(forecast.onAt)
  })

  it('holds when the flow rises, or falls so slowly that a year will not matter', () => {
    expect(trend(falling(-0.01, [0, 10, 20]), 4)).toEqual({ kind: 'holds' })
    expect(trend(falling(0.0001, [0, 10, 20]), 4)).toEqual({ kind: 'holds' })
  })

  it('says so when the line is under the need already', () => {
    const forecast = falls(trend(falling(0.05, [0, 10, 20, 30, 40]), 8))
    expect((forecast.onAt - start) / day).toBeCloseTo(Math.log(2) / 0.05, 6)
    const low = falls(trend(falling(-0.001, [0, 10, 20]), 20))
    expect(low).toEqual({
      kind: 'falls',
      onAt: start + 20 * day,
      earliestAt: start,
      latestAt: null,
      perDay: 0,
    })
  })

  it('never looks before the first reading', () => {
    const forecast = falls(trend(falling(0.05, [0, 10, 20, 30, 40]), 30))
    expect(forecast.onAt).toBe(start)
    expect(forecast.earliestAt).toBe(start)
    expect(forecast.latestAt).toBeGreaterThanOrEqual(start)
  })

  it('puts the ends of the interval where its 95 % band meets the need', () => {
    const days = [0, 7, 15, 22, 30, 41]
    const noise = [0.06, -0.1, 0.12, -0.05, -0.08, 0.05]
    const readings = falling(0.03, days, noise)
    const logs = readings.map(({ normalised }) => Math.log(normalised))
    // The band of the mean of a straight line, from the textbook, apart from the code under test.
    const mean = (values: readonly number[]) => values.reduce((a, b) => a + b) / values.length
    const away = days.map((at) => at - mean(days))
    const sxx = away.reduce((sum, at) => sum + at * at, 0)
    const slope = away.reduce((sum, at, index) => sum + at * (logs[index] ?? NaN), 0) / sxx
    const fit = (at: number) => mean(logs) + slope * (at - mean(days))
    const residue = days.reduce((sum, at, index) => sum + ((logs[index] ?? NaN) - fit(at)) ** 2, 0)
    const student = 2.776445 // t of 4 degrees of freedom at 97.5 %
    const scatter = student * Math.sqrt(residue / 4)
    const half = (at: number) => scatter * Math.sqrt(1 / 6 + (at - mean(days)) ** 2 / sxx)
    expect(scatter).toBeGreaterThan(1.96 * 0.1118) // so that the scatter decides, not the error

    const { onAt, earliestAt, latestAt } = falls(trend(readings, 4))
    const dayOf = (at: number | null) => ((at ?? NaN) - start) / day
    expect(fit(dayOf(onAt))).toBeCloseTo(Math.log(4), 6)
    expect(fit(dayOf(earliestAt)) - half(dayOf(earliestAt))).toBeCloseTo(Math.log(4), 5)
    expect(fit(dayOf(latestAt)) + half(dayOf(latestAt))).toBeCloseTo(Math.log(4), 5)
  })

  it('opens the interval at the near end only, where the slope may be none', () => {
    const noisy = falling(0.01, [0, 3, 6, 9, 12], [0, 0.05, -0.05, 0.05, 0])
    const { onAt, earliestAt, latestAt } = falls(trend(noisy, 11))
    expect(latestAt).toBeNull()
    expect(earliestAt).toBeGreaterThan(start)
    expect(earliestAt).toBeLessThan(onAt)
  })

  it('begins the interval at the first reading only if the band is under the need by then', () => {
    // On one line: the band is 1.96 errors of a reading, at the first of these five times
    // √(1/5 + 20²/1000); so it reaches 16.97 % under the first flow of 16.
    const flows = falling(0.01, [0, 10, 20, 30, 40])
    const under = (share: number) => falls(trend(flows, 16 * Math.exp(-share))).earliestAt
    expect(under(0.169)).toBe(start)
    expect(under(0.171)).toBeGreaterThan(start)
    expect(under(0.171)).toBeLessThan(start + 10 * day)
  })

  it('holds where a rising flow has passed the need, though its mean has not', () => {
    expect(trend(falling(-0.06, [0, 10, 20]), 30)).toEqual({ kind: 'holds' })
  })

  it('takes a rising flow at its last reading, not at what it may come to', () => {
    // 16 L/h becomes 53 in 20 days; it would pass 100 in another 11.
    expect(falls(trend(falling(-0.06, [0, 10, 20]), 100))).toMatchObject({
      onAt: start + 20 * day,
      perDay: 0,
    })
  })

  it('takes a level flow for what it is: under the need, or holding', () => {
    const level = [0, 10, 20].map((at) => ({ takenAt: start + at * day, normalised: 1 }))
    expect(falls(trend(level, 2))).toMatchObject({ onAt: start + 20 * day, latestAt: null })
    expect(trend(level, 1)).toEqual({ kind: 'holds' })
    expect(trend(level, 0.5)).toEqual({ kind: 'holds' })
  })

  it('tells the wash the local day on which a fall meets the need', () => {
    // 60 days after 15 June 2025, 15:06 UTC: the 14th of August, and the 15th east of UTC+9.
    const forecast = trend(falling(Math.log(4) / 60, [0, 10, 20, 30, 40]), 4)
    expect(shortOn(forecast, 'Africa/Nairobi')).toBe('2025-08-14')
    expect(shortOn(forecast, 'Pacific/Auckland')).toBe('2025-08-15')
  })

  it('tells the wash of no day where nothing falls, though the flow be low', () => {
    expect(shortOn({ kind: 'holds' }, 'UTC')).toBeNull()
    expect(shortOn({ kind: 'too few' }, 'UTC')).toBeNull()
    const low = trend(falling(-0.001, [0, 10, 20]), 20)
    expect(low.kind).toBe('falls')
    expect(shortOn(low, 'UTC')).toBeNull()
  })

  it('does not depend on the order the readings were stored in', () => {
    const readings = falling(0.02, [0, 10, 20, 30], [0.1, -0.05, 0.02, 0])
    expect(trend([...readings].reverse(), 4)).toEqual(trend(readings, 4))
  })
})
