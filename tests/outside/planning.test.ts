/*
 * DESIGN section 5, Rounds: a prompt leaves inside the window, nobody is prompted twice for one thing nor
 * over the weekly limit, and no change of the clocks loses or doubles one. Oracles: zones.ts.
 */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { addDays } from '@/lib/domain/day'
import { hasRoom, localDay, sendAfter, type Due, type Window } from '@/lib/domain/round'
import { textFor } from '@/lib/domain/round-text'
import { changing, dayByLuxon, end, openByLuxon, start, zones } from './zones'

const hour = 3_600_000
const day = 24 * hour

type Leaving = { at: number; due: Due[] }
type Course = {
  window: Window
  due: readonly Due[]
  from: number
  days: number
  everyHours: number
  /** Texts of others that wait before each of these, at one a minute. */
  waiting: number
}

/** The desk's sweeps over one household: what is due and was not asked yet is planned where there is room. */
function sweepThrough({ window, due, from, days, everyHours, waiting }: Course) {
  const { timeZone } = window
  const leaving: Leaving[] = []
  let left = [...due]
  for (let now = from; now <= from + days * day; now += everyHours * hour) {
    const text = textFor(left, localDay(now, timeZone))
    if (text === null) continue
    if (!hasRoom({ sentAt: leaving.map((one) => one.at), now, timeZone })) continue
    left = left.filter((one) => !text.due.includes(one))
    const at = sendAfter({ now, window, spreadIndex: waiting, perMinute: 1 })
    leaving.push({ at, due: text.due })
  }
  return { leaving, left }
}

/** What must hold of a household's prompts, whatever the course: the faults found, in words. */
function faultsOf({ window, due }: Course, { leaving, left }: ReturnType<typeof sweepThrough>) {
  const hours = leaving.map(({ at }) => at)
  const days = hours.map((at) => dayByLuxon(at, window.timeZone))
  const asked = leaving.flatMap((one) => one.due)
  const inAWeekBefore = (last: number) => hours.filter((at) => at <= last && at > last - 7 * day)
  return [
    hours.some((at) => !openByLuxon(at, window)) && 'outside the window',
    new Set(days).size < days.length && 'two on one day',
    hours.some((at) => inAWeekBefore(at).length > 2) && 'over the weekly limit',
    new Set(asked).size < asked.length && 'two for one thing',
    left.length > 0 && 'one is lost',
    asked.length + left.length !== due.length && 'one came from nowhere',
    leaving.some(({ at, due: about }) =>
      about.every(({ dueOn }) => dueOn > dayByLuxon(at, window.timeZone)),
    ) && 'before anything is due',
  ].filter((fault) => fault !== false)
}

/** One of each kind around a day, some before it, some after: more than one week may hear of. */
function dueAround(instant: number, timeZone: string): Due[] {
  const middle = dayByLuxon(instant, timeZone)
  return [
    { kind: 'welcome', dueOn: addDays(middle, -3) },
    { kind: 'wash', dueOn: middle },
    { kind: 'change', dueOn: addDays(middle, 1), stagePosition: 1 },
    { kind: 'flow check', dueOn: addDays(middle, -1) },
  ]
}

const daytime = { opensMinute: 480, closesMinute: 1200, sundaysOff: true, holidays: [] }
/** Opens in the hours that clocks skip or repeat: the hardest for a planner. */
const night = { opensMinute: 0, closesMinute: 180, sundaysOff: false, holidays: [] }

// Seconds on an idle machine; other work beside it must not fail it.
const patience = { timeout: 120_000 }

describe('the prompts of a household', patience, () => {
  it('keep their manners over every change of the clocks of every zone, 2024 to 2030', () => {
    const changes = changing.flatMap(({ timeZone, changes: all }) =>
      all.map((change) => ({ timeZone, change })),
    )
    expect(changes.length).toBeGreaterThan(1000)
    const faults = changes.flatMap(({ timeZone, change }, index) => {
      const window = { timeZone, ...(index % 2 === 0 ? daytime : night) }
      const due = dueAround(change, timeZone)
      // Sweeps at odd minutes, so that some fall into the skipped and the repeated hour.
      const from = change - 3 * day - (index % 60) * 60_000
      const course = { window, due, from, days: 17, everyHours: 1, waiting: index % 90 }
      return faultsOf(course, sweepThrough(course)).map((fault) => `${timeZone}: ${fault}`)
    })
    expect(faults).toEqual([])
  })

  it('keep them in every zone, with any window, days off, things due and texts that wait', () => {
    const windows = fc.record({
      opensMinute: fc.integer({ min: 0, max: 88 }).map((quarter) => quarter * 15),
      length: fc.integer({ min: 8, max: 96 }).map((quarter) => quarter * 15),
      sundaysOff: fc.boolean(),
    })
    const things = fc.array(
      fc.record({
        kind: fc.constantFrom<Due['kind']>('wash', 'flow check', 'change', 'welcome'),
        ahead: fc.integer({ min: -10, max: 10 }),
        stagePosition: fc.constantFrom<1 | 2 | 3>(1, 2, 3),
      }),
      { minLength: 1, maxLength: 5 },
    )
    fc.assert(
      fc.property(
        fc.constantFrom(...zones),
        fc.integer({ min: start, max: end - 60 * day }),
        windows,
        things,
        // At one a minute: up to five days of a window of two hours.
        fc.integer({ min: 0, max: 600 }),
        (timeZone, from, { opensMinute, length, sundaysOff }, given, waiting) => {
          const today = dayByLuxon(from, timeZone)
          const holidays = [addDays(today, 2), addDays(today, 3), addDays(today, 9)]
          const closesMinute = Math.min(1440, opensMinute + length)
          const window = { timeZone, opensMinute, closesMinute, sundaysOff, holidays }
          const due = given.map(({ kind, ahead, stagePosition }): Due => {
            const dueOn = addDays(today, ahead)
            return kind === 'change' ? { kind, dueOn, stagePosition } : { kind, dueOn }
          })
          const course = { window, due, from, days: 60, everyHours: 3, waiting }
          expect(faultsOf(course, sweepThrough(course))).toEqual([])
        },
      ),
      { seed: 85, numRuns: 400 },
    )
  })

  it('tell a fault where there is one, so that the rest means something', () => {
    const { timeZone, changes } = changing[0]!
    const window = { timeZone, ...daytime }
    const due = dueAround(changes[0]!, timeZone)
    const course = { window, due, from: changes[0]!, days: 1, everyHours: 1, waiting: 0 }
    const closed = Date.parse('2025-01-01T03:00:00Z')
    const twice = [1, 2, 3].map((n) => ({ at: closed + n, due: [due[0]!] }))
    expect(
      faultsOf(
        { ...course, window: { ...window, closesMinute: 481 } },
        { leaving: twice, left: due },
      ),
    ).toEqual([
      'outside the window',
      'two on one day',
      'over the weekly limit',
      'two for one thing',
      'one is lost',
      'one came from nowhere',
    ])
  })
})
