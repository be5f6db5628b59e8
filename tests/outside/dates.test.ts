/*
 * CHECKS section 8: dates and sending windows.
 * [C] read in a copy of the source · [D] from the IANA time zone data.
 * Oracles: temporal-polyfill (TC39 Temporal) and luxon, each with its own calendar.
 */
import fc from 'fast-check'
import { DateTime } from 'luxon'
import { Temporal } from 'temporal-polyfill'
import { describe, expect, it } from 'vitest'
import { nextDue } from '@/lib/domain/cycle'
import { addDays, dayNumber, weekdayOf } from '@/lib/domain/day'
import { bundle, insideWindow, localDay, localMinute, nextInsideWindow } from '@/lib/domain/round'
import { sendAfter, type Window } from '@/lib/domain/round'
import { at, changing, end, openByLuxon, start, zones } from './zones'

const minute = 60_000
const hour = 60 * minute

const always = { sundaysOff: false, holidays: [] as string[] }

describe('the window of 47 CFR 64.1200(c)(1), 08:00 ≤ t < 21:00 local', () => {
  // The rule [C]; its instants from IANA [D]
  it.each([
    ['Asia/Kathmandu', '2025-07-01T02:14:59Z', false],
    ['Asia/Kathmandu', '2025-07-01T02:15:00Z', true],
    ['America/New_York', '2025-03-09T11:59:59Z', false],
    ['America/New_York', '2025-03-09T12:00:00Z', true],
    ['America/New_York', '2025-11-02T12:59:00Z', false],
    ['America/New_York', '2025-11-02T13:00:00Z', true],
    ['Africa/Nairobi', '2025-07-01T17:59:59Z', true],
    ['Africa/Nairobi', '2025-07-01T18:00:00Z', false],
  ])('in %s at %s is open: %s', (timeZone, instant, open) => {
    const window: Window = { timeZone, opensMinute: 8 * 60, closesMinute: 21 * 60, ...always }
    expect(insideWindow(at(instant), window)).toBe(open)
  })
})

describe('months from a date', () => {
  // RFC 7529, SKIP=BACKWARD
  it.each([
    ['2025-01-31', ['2025-02-28', '2025-03-31', '2025-04-30']],
    ['2024-01-31', ['2024-02-29', '2024-03-31', '2024-04-30']],
  ])('from %s clamp at the month’s end and do not drift', (fittedOn, expected) => {
    const found = [1, 2, 3].map((count) => nextDue({ fittedOn, months: 1, count }))
    expect(found).toEqual(expected)
  })

  it('agree with Temporal for every date from 2024 to 2036', () => {
    let oracle = Temporal.PlainDate.from('2024-01-01')
    const failures: string[] = []
    for (let fittedOn = '2024-01-01'; fittedOn <= '2036-12-31'; fittedOn = addDays(fittedOn, 1)) {
      if (fittedOn !== oracle.toString()) failures.push(`day ${fittedOn}`)
      if (weekdayOf(fittedOn) !== oracle.dayOfWeek % 7) failures.push(`weekday ${fittedOn}`)
      for (const months of [1, 3, 12]) {
        const expected = oracle.add({ months }, { overflow: 'constrain' }).toString()
        if (nextDue({ fittedOn, months, count: 1 }) !== expected) failures.push(fittedOn)
      }
      oracle = oracle.add({ days: 1 })
    }
    expect(failures).toEqual([])
  })

  it('agree with Temporal for any count and cycle', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: dayNumber('2024-01-01'), max: dayNumber('2036-12-31') }),
        fc.integer({ min: 1, max: 60 }),
        fc.integer({ min: 0, max: 40 }),
        (number, months, count) => {
          const fittedOn = addDays('1970-01-01', number)
          const expected = Temporal.PlainDate.from(fittedOn).add({ months: months * count })
          expect(nextDue({ fittedOn, months, count })).toBe(expected.toString())
        },
      ),
      { seed: 81, numRuns: 500 },
    )
  })
})

/** A moment in some zone between 2024 and 2030; every other one near a change of its clocks. */
const moments = fc.oneof(
  fc.record({
    timeZone: fc.constantFrom(...zones),
    instant: fc.integer({ min: start, max: end }),
  }),
  fc.constantFrom(...changing).chain(({ timeZone, changes }) =>
    fc.record({
      timeZone: fc.constant(timeZone),
      instant: fc
        .tuple(fc.constantFrom(...changes), fc.integer({ min: -30 * hour, max: 30 * hour }))
        .map(([change, away]) => change + away),
    }),
  ),
)

/** Windows of every kind, also those that open or close in the hours the clocks skip or repeat. */
const windows = fc
  .record({
    opensMinute: fc.integer({ min: 0, max: 92 }).map((quarter) => quarter * 15),
    length: fc.integer({ min: 2, max: 96 }).map((quarter) => quarter * 15),
    sundaysOff: fc.boolean(),
  })
  .map(({ opensMinute, length, sundaysOff }) => ({
    opensMinute,
    closesMinute: Math.min(1440, opensMinute + length),
    sundaysOff,
    holidays: ['2025-01-01', '2027-03-28', '2028-11-05'],
  }))

// Seconds on an idle machine; other work beside it must not fail it.
const patience = { timeout: 60_000 }

describe('in every IANA zone, 2024 to 2030', patience, () => {
  it('there are zones that change their clocks, so that the rest means something', () => {
    expect(zones.length).toBeGreaterThan(400)
    expect(changing.length).toBeGreaterThan(100)
  })

  it('the wall clock is that of the zone', () => {
    fc.assert(
      fc.property(moments, ({ timeZone, instant }) => {
        const local = DateTime.fromMillis(instant, { zone: timeZone })
        expect(localDay(instant, timeZone)).toBe(local.toISODate())
        expect(localMinute(instant, timeZone)).toBe(local.hour * 60 + local.minute)
      }),
      { seed: 82, numRuns: 800 },
    )
  })

  it('the next opening is inside, and nothing before it was', () => {
    fc.assert(
      fc.property(moments, windows, ({ timeZone, instant }, rest) => {
        const window = { timeZone, ...rest }
        expect(insideWindow(instant, window)).toBe(openByLuxon(instant, window))
        const next = nextInsideWindow(instant, window)
        expect(next).toBeGreaterThanOrEqual(instant)
        expect(openByLuxon(next, window)).toBe(true)
        // Offsets and windows move in quarters of an hour: no opening hides between two of them.
        const firstQuarter = Math.ceil(instant / (15 * minute)) * 15 * minute
        for (let quarter = firstQuarter; quarter < next; quarter += 15 * minute) {
          expect(openByLuxon(quarter, window)).toBe(false)
        }
        expect(nextInsideWindow(next, window)).toBe(next)
      }),
      { seed: 83, numRuns: 250 },
    )
  })

  it('a spread round leaves inside the window, in order, at the rate', () => {
    fc.assert(
      fc.property(
        moments,
        windows,
        fc.integer({ min: 1, max: 60 }),
        fc.integer({ min: 0, max: 5000 }),
        ({ timeZone, instant }, rest, perMinute, spreadIndex) => {
          const window = { timeZone, ...rest }
          const leaves = (index: number) =>
            sendAfter({ now: instant, window, perMinute, spreadIndex: index })
          const one = leaves(spreadIndex)
          expect(openByLuxon(one, window)).toBe(true)
          expect(leaves(spreadIndex + 1)).toBeGreaterThan(one)
          expect(leaves(spreadIndex + perMinute) - one).toBeGreaterThanOrEqual(minute)
        },
      ),
      { seed: 84, numRuns: 200 },
    )
  })
})

describe('across each change of the clocks', patience, () => {
  // Every hour a sweep plans what is due and not yet planned, as the desk does.
  function sweep(window: Window, change: number) {
    const planned = new Map<string, number[]>()
    for (let now = change - 48 * hour; now <= change + 48 * hour; now += hour) {
      const today = localDay(now, window.timeZone)
      for (const { dueOn } of bundle([{ kind: 'wash', dueOn: today }], today)) {
        if (planned.has(dueOn)) continue
        planned.set(dueOn, [sendAfter({ now, window, spreadIndex: 0, perMinute: 1 })])
      }
    }
    return planned
  }

  it('no prompt leaves outside its window, none is lost and none is doubled', () => {
    const sample = changing.flatMap(({ timeZone, changes }, index) =>
      changes.filter((_, nth) => (nth + index) % 14 === 0).map((change) => ({ timeZone, change })),
    )
    expect(sample.length).toBeGreaterThan(100)
    for (const { timeZone, change } of sample) {
      const window: Window = { timeZone, opensMinute: 480, closesMinute: 1200, ...always }
      const planned = sweep(window, change)
      const [first = '', ...days] = planned.keys()
      expect(days.length).toBeGreaterThanOrEqual(3)
      // Every day once: none lost, none doubled.
      expect(days).toEqual(days.map((_, index) => addDays(first, index + 1)))
      const sends = [...planned.values()].flat()
      expect(sends).toHaveLength(days.length + 1)
      expect(sends.filter((sent) => !openByLuxon(sent, window))).toEqual([])
      // Planned in the first hour of its day, a prompt leaves that same day.
      expect(sends.slice(1).map((sent) => localDay(sent, timeZone))).toEqual(days)
    }
  })
})
