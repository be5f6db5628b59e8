import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { daysBetween } from '@/lib/domain/day'
import { sendingDefaults, type Due } from '@/lib/domain/round'
import { carriedADay, goingOut, openingsAhead, type KitDue } from '@/lib/domain/round-going'
import { insideWindow, localDay, type Window } from '@/lib/domain/round-window'
import { dueWords, listWords } from '@/lib/domain/round-words'

const hour = 3_600_000
const day = 24 * hour

const window: Window = {
  timeZone: 'America/La_Paz',
  opensMinute: 480,
  closesMinute: 1200,
  sundaysOff: true,
  holidays: ['2026-03-04'],
}
// A Monday, 10:00 in La Paz.
const now = Date.parse('2026-03-02T14:00:00Z')

function kit(kitId: string, due: readonly Due[], sentAt: readonly number[] = []): KitDue {
  return { kitId, householdId: `house of ${kitId}`, areaId: 'area', due, sentAt }
}

function plan(
  kits: readonly KitDue[],
  { perMinute = 60, days = 14, settings = sendingDefaults } = {},
) {
  return goingOut({ kits, windows: new Map([['area', window]]), now, days, perMinute, settings })
}

describe('the openings ahead', () => {
  test('begin now where the window is open, and leave out Sundays and holidays', () => {
    const openings = openingsAhead(window, now, now + 8 * day)
    expect(openings.map(({ on }) => on)).toEqual([
      '2026-03-02',
      '2026-03-03',
      '2026-03-05',
      '2026-03-06',
      '2026-03-07',
      '2026-03-09',
      '2026-03-10',
    ])
    expect(openings[0]?.at).toBe(now)
    expect(openings[1]?.at).toBe(Date.parse('2026-03-03T12:00:00Z'))
  })

  test('go on day by day where the window never closes', () => {
    const always = {
      ...window,
      opensMinute: 0,
      closesMinute: 1440,
      sundaysOff: false,
      holidays: [],
    }
    const openings = openingsAhead(always, now, now + 3 * day)
    expect(new Set(openings.map(({ on }) => on)).size).toBe(openings.length)
    expect(openings.length).toBeGreaterThanOrEqual(3)
  })
})

describe('what is going out', () => {
  test('is bundled and limited by what the coordinator set', () => {
    const due: Due[] = [
      { kind: 'change', dueOn: '2026-03-02', stagePosition: 1 },
      { kind: 'change', dueOn: '2026-03-05', stagePosition: 2 },
      { kind: 'wash', dueOn: '2026-03-02' },
    ]
    const days = (settings = sendingDefaults) =>
      plan([kit('a', due)], { settings }).map((text) => [text.on, text.due.length])
    expect(days()).toEqual([
      ['2026-03-02', 2],
      ['2026-03-03', 1],
    ])
    expect(days({ ...sendingDefaults, bundleDays: 0, promptsAWeek: 1 })).toEqual([
      ['2026-03-02', 1],
      ['2026-03-09', 1],
      ['2026-03-16', 1],
    ])
  })

  test('says one thing a text, the rest on the days that follow, under the weekly limit', () => {
    const due: Due[] = [
      { kind: 'wash', dueOn: '2026-03-06' },
      { kind: 'change', dueOn: '2026-03-09', stagePosition: 1 },
      { kind: 'flow check', dueOn: '2026-03-12' },
    ]
    const going = plan([kit('a', due)])
    expect(going.map(({ on, due: about }) => [on, ...about.map(({ kind }) => kind)])).toEqual([
      ['2026-03-06', 'wash'],
      ['2026-03-09', 'change'],
      ['2026-03-13', 'flow check'],
    ])
  })

  test('waits for the next day with a window when it is due on a day off', () => {
    const [going] = plan([kit('a', [{ kind: 'wash', dueOn: '2026-03-04' }])])
    expect(going).toMatchObject({ on: '2026-03-05' })
  })

  test('waits for room in the weekly limit', () => {
    const twice = [now - 2 * day, now - 3 * day]
    const [going] = plan([kit('a', [{ kind: 'wash', dueOn: '2026-03-01' }], twice)])
    // The older of the two leaves the seven days on 6 March at 10:00.
    expect(going).toMatchObject({ on: '2026-03-06', at: now + 4 * day })
  })

  test('goes to a household once a day, though the week has room for two', () => {
    const [going] = plan([kit('a', [{ kind: 'wash', dueOn: '2026-03-01' }], [now - hour])])
    expect(going).toMatchObject({ on: '2026-03-03' })
  })

  test('has no room in the hours when nobody may be texted', () => {
    // The older of the two leaves the seven days on Friday at 22:00, after the window has closed.
    const sentAt = [Date.parse('2026-02-28T02:00:00Z'), Date.parse('2026-02-28T14:00:00Z')]
    const [going] = plan([kit('a', [{ kind: 'wash', dueOn: '2026-03-01' }], sentAt)])
    expect(going?.at).toBe(Date.parse('2026-03-07T12:00:00Z'))
  })

  test('takes the first hour with room, whatever order the texts were sent in', () => {
    const sentAt = [now - 3 * day + 2 * hour, now - 3 * day]
    const [going] = plan([kit('a', [{ kind: 'wash', dueOn: '2026-03-01' }], sentAt)])
    expect(going?.at).toBe(now + 4 * day)
  })

  test('bundles by the day on which it goes, not by the day on which it waits', () => {
    const due: Due[] = [
      { kind: 'change', dueOn: '2026-03-01', stagePosition: 1 },
      { kind: 'change', dueOn: '2026-03-10', stagePosition: 2 },
    ]
    const [going] = plan([kit('a', due, [now - 2 * day, now - 3 * day])])
    expect(going?.on).toBe('2026-03-06')
    expect(going?.due).toEqual(due)
  })

  test('is looked for up to the last instant asked about', () => {
    const opensOn = Date.parse('2026-03-03T12:00:00Z')
    expect(openingsAhead(window, now, opensOn)).toHaveLength(2)
    expect(openingsAhead(window, now, opensOn - 1)).toHaveLength(1)
  })

  test('waits in one row for each area, in the order of the hours', () => {
    const due: Due[] = [{ kind: 'wash', dueOn: '2026-03-02' }]
    const full = [now - 7 * day + 3 * hour, now - 6 * day]
    const kits = [kit('a', due, full), kit('b', due), { ...kit('c', due), areaId: 'other' }]
    const windows = new Map([
      ['area', window],
      ['other', window],
    ])
    const going = goingOut({ kits, windows, now, days: 0, perMinute: 1 })
    expect(going.map(({ kitId, at }) => [kitId, at - now])).toEqual([
      ['b', 0],
      ['a', 3 * hour + 60_000],
      ['c', 0],
    ])
  })

  test('is spread at the pace of the sender', () => {
    const kits = ['a', 'b', 'c'].map((id) => kit(id, [{ kind: 'wash', dueOn: '2026-03-02' }]))
    const hours = plan(kits, { perMinute: 1 }).map(({ at }) => at - now)
    expect(hours).toEqual([0, 60_000, 120_000])
  })

  test('says each thing due once, inside the window, never before it is within four days', () => {
    const dueOn = fc
      .integer({ min: -5, max: 20 })
      .map((ahead) => localDay(now + ahead * day, window.timeZone))
    const kind = fc.constantFrom('wash' as const, 'flow check' as const)
    const due = fc.array(fc.record({ kind, dueOn }), { maxLength: 6 })
    fc.assert(
      fc.property(fc.array(due, { maxLength: 5 }), (dueOfKits) => {
        const kits = dueOfKits.map((things, index) => kit(String(index), things))
        const going = plan(kits)
        for (const { at, due: about, on } of going) {
          expect(insideWindow(at, window)).toBe(true)
          expect(about.every((one) => daysBetween(on, one.dueOn) <= 4)).toBe(true)
        }
        const said = going.flatMap(({ due: about }) => about)
        expect(new Set(said).size).toBe(said.length)
      }),
    )
  })
})

test('a sender carries its pace times the minutes of the window', () => {
  expect(carriedADay({ opensMinute: 480, closesMinute: 1200 }, 10)).toBe(7200)
})

describe('the words for what is due', () => {
  test.each([
    ['wash', [], 'wash'],
    ['change', [], 'change'],
    ['change', [1], 'change of cloth'],
    ['change', [3, 1], 'change of cloth and fibre'],
    ['change', [2, 3, 1], 'change of cloth, carbon and fibre'],
    ['change', [4, 1], 'change of cloth and stage 4'],
  ] as const)('%s of %j: %s', (kind, positions, words) => {
    expect(dueWords({ kind, positions })).toBe(words)
  })

  test('name a thing once', () => {
    expect(listWords(['wash', 'change of cloth', 'wash'])).toBe('wash, change of cloth')
  })
})
