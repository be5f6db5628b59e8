import { describe, expect, it } from 'vitest'
import {
  bundle,
  expiresAt,
  hadLastNudge,
  hasRoom,
  insideWindow,
  localDay,
  localMinute,
  nextInsideWindow,
  overWeeklyLimit,
  waitUntil,
  type Window,
} from '@/lib/domain/round'
import { windowClosesAt } from '@/lib/domain/round-window'

const utc = (text: string) => Date.parse(text)
const iso = (at: number) => new Date(at).toISOString()
const hour = 3_600_000

const kathmandu: Window = {
  timeZone: 'Asia/Kathmandu',
  opensMinute: 8 * 60,
  closesMinute: 20 * 60,
  sundaysOff: true,
  holidays: ['2025-10-02'],
}

describe('local time', () => {
  it('is the wall clock of the zone, not of the machine', () => {
    const at = utc('2025-06-30T19:00:00Z')
    expect(localDay(at, 'Asia/Kathmandu')).toBe('2025-07-01')
    expect(localMinute(at, 'Asia/Kathmandu')).toBe(45)
    expect(localDay(at, 'America/Lima')).toBe('2025-06-30')
    expect(localMinute(at, 'America/Lima')).toBe(14 * 60)
    expect(localMinute(at + 59_999, 'Etc/UTC')).toBe(19 * 60)
  })

  it('refuses a zone that does not exist', () => {
    expect(() => localDay(0, 'Mars/Olympus')).toThrow(
      new RangeError('no such time zone: Mars/Olympus'),
    )
  })
})

describe('the sending window', () => {
  it.each([
    ['2025-07-01T02:14:59Z', false],
    ['2025-07-01T02:15:00Z', true],
    ['2025-07-01T14:14:59Z', true],
    ['2025-07-01T14:15:00Z', false],
    ['2025-07-06T06:00:00Z', false], // a Sunday
    ['2025-10-02T06:00:00Z', false], // a named holiday
  ])('at %s: %s', (at, inside) => {
    expect(insideWindow(utc(at), kathmandu)).toBe(inside)
  })

  it('opens next where it should', () => {
    const next = (at: string, window = kathmandu) => iso(nextInsideWindow(utc(at), window))
    expect(next('2025-07-01T05:00:00Z')).toBe('2025-07-01T05:00:00.000Z')
    expect(next('2025-07-01T01:00:00Z')).toBe('2025-07-01T02:15:00.000Z')
    expect(next('2025-07-01T15:00:00Z')).toBe('2025-07-02T02:15:00.000Z')
    expect(next('2025-07-05T15:00:00Z')).toBe('2025-07-07T02:15:00.000Z')
    expect(next('2025-10-01T15:00:00Z')).toBe('2025-10-03T02:15:00.000Z')
    expect(next('2025-07-05T15:00:00Z', { ...kathmandu, sundaysOff: false })).toBe(
      '2025-07-06T02:15:00.000Z',
    )
  })

  it('opens at the change itself when its opening falls into the gap', () => {
    const window = {
      ...kathmandu,
      timeZone: 'America/New_York',
      sundaysOff: false,
      opensMinute: 150,
    }
    expect(iso(nextInsideWindow(utc('2025-03-09T05:00:00Z'), window))).toBe(
      '2025-03-09T07:00:00.000Z',
    )
  })

  it('finds the change also where it happened on the day before by UTC', () => {
    // Lebanon skips from midnight to 01:00 on 30 March 2025, at 22:00 UTC on the 29th.
    const window = { ...kathmandu, timeZone: 'Asia/Beirut', sundaysOff: false, opensMinute: 30 }
    expect(iso(nextInsideWindow(utc('2025-03-29T20:00:00Z'), window))).toBe(
      '2025-03-29T22:00:00.000Z',
    )
  })

  it('opens again when the clocks go back over its opening', () => {
    const window = {
      ...kathmandu,
      timeZone: 'America/New_York',
      sundaysOff: false,
      opensMinute: 60,
      closesMinute: 105,
    }
    expect(iso(nextInsideWindow(utc('2025-11-02T05:50:00Z'), window))).toBe(
      '2025-11-02T06:00:00.000Z',
    )
  })

  it('that never opens is a fault, not an endless search', () => {
    const never = { ...kathmandu, opensMinute: 600, closesMinute: 600 }
    expect(() => nextInsideWindow(0, never)).toThrow(
      new RangeError('the sending window never opens'),
    )
  })

  it('finds the change also far to the west, where its day has long begun by UTC', () => {
    // Adak skips from 02:00 to 03:00 on 9 March 2025, at noon by UTC.
    const adak = { ...kathmandu, timeZone: 'America/Adak', sundaysOff: false, opensMinute: 150 }
    expect(iso(nextInsideWindow(utc('2025-03-09T10:30:00Z'), adak))).toBe(
      '2025-03-09T12:00:00.000Z',
    )
    // Nuuk says 23:00 twice on 25 October 2025; the change is on the 26th by UTC.
    const nuuk = {
      ...kathmandu,
      timeZone: 'America/Nuuk',
      opensMinute: 23 * 60,
      closesMinute: 23 * 60 + 30,
    }
    expect(iso(nextInsideWindow(utc('2025-10-26T00:40:00Z'), nuuk))).toBe(
      '2025-10-26T01:00:00.000Z',
    )
  })
})

describe('the closing of the window', () => {
  const closes = (at: string, until: string, window = kathmandu) => {
    const closesAt = windowClosesAt(utc(at), utc(until), window)
    return closesAt === null ? null : iso(closesAt)
  }

  it('is told up to the last instant asked about, and not after it', () => {
    expect(closes('2025-07-01T05:00:00Z', '2025-07-01T14:14:59Z')).toBeNull()
    expect(closes('2025-07-01T05:00:00Z', '2025-07-01T14:15:00Z')).toBe('2025-07-01T14:15:00.000Z')
    expect(closes('2025-07-01T05:00:00Z', '2025-07-03T00:00:00Z')).toBe('2025-07-01T14:15:00.000Z')
  })

  it('is midnight before a day off, where the window is open to the end of the day', () => {
    const late = { ...kathmandu, opensMinute: 0, closesMinute: 1440 }
    // Saturday evening; Sunday the 6th begins at 18:15 by UTC.
    expect(closes('2025-07-05T12:00:00Z', '2025-07-07T00:00:00Z', late)).toBe(
      '2025-07-05T18:15:00.000Z',
    )
  })

  it('comes an hour sooner when the clocks go forward before it', () => {
    const early = {
      ...kathmandu,
      timeZone: 'America/New_York',
      sundaysOff: false,
      opensMinute: 60,
      closesMinute: 4 * 60,
    }
    expect(closes('2025-03-09T06:30:00Z', '2025-03-09T08:30:00Z', early)).toBe(
      '2025-03-09T08:00:00.000Z',
    )
  })
})

describe('a bundle', () => {
  it('is empty while nothing is due', () => {
    expect(bundle([{ kind: 'wash', dueOn: '2025-07-02' }], '2025-07-01')).toEqual([])
    expect(bundle([], '2025-07-01')).toEqual([])
    expect(bundle([{ kind: 'wash', dueOn: '2025-07-02' }], '2025-07-02')).toHaveLength(1)
  })

  it('takes what is due and what falls within four days, the oldest first', () => {
    const due = [
      { kind: 'change', dueOn: '2025-07-05', stagePosition: 1 },
      { kind: 'flow check', dueOn: '2025-07-06' },
      { kind: 'wash', dueOn: '2025-07-01' },
      { kind: 'change', dueOn: '2025-06-20', stagePosition: 2 },
    ] as const
    expect(bundle(due, '2025-07-01')).toEqual([due[3], due[2], due[0]])
    expect(bundle(due, '2025-07-01', { bundleDays: 3 })).toEqual([due[3], due[2]])
    expect(bundle(due, '2025-07-01', { bundleDays: 5 })).toHaveLength(4)
  })
})

describe('the manners of prompting', () => {
  const now = utc('2025-07-08T06:00:00Z')
  const week = 7 * 24 * hour

  it('stops at two in seven days', () => {
    expect(overWeeklyLimit({ sentAt: [now - hour], now })).toBe(false)
    expect(overWeeklyLimit({ sentAt: [now - hour, now - week + 1], now })).toBe(true)
    expect(overWeeklyLimit({ sentAt: [now - hour, now - week], now })).toBe(false)
    expect(overWeeklyLimit({ sentAt: [now, now + hour], now })).toBe(false)
    expect(overWeeklyLimit({ sentAt: [now], now, limit: 1 })).toBe(true)
  })

  it('drops a prompt after 36 hours', () => {
    expect(expiresAt(now) - now).toBe(36 * hour)
  })

  it('waits three days for an answer, seven after a nudge, three after the last', () => {
    expect(waitUntil(now, 0)).toBe(now + 72 * hour)
    expect(waitUntil(now, 1)).toBe(now + week)
    expect(waitUntil(now, 2)).toBe(now + 72 * hour)
    expect([0, 1, 2, 3].map(hadLastNudge)).toEqual([false, false, true, true])
    const set = { firstNudgeDays: 1, secondNudgeDays: 2 }
    const waits = [0, 1, 2].map((nudges) => waitUntil(now, nudges, set) - now)
    expect(waits).toEqual([24 * hour, 48 * hour, 72 * hour])
  })

  it.each([
    ['nothing was sent', [], true],
    ['one went yesterday', [-24], true],
    ['one went this local day', [-2], false],
    ['one went late on the day before', [-11.9], true],
    ['one waits for later today', [3], false],
    ['one waits for tomorrow', [24], false],
    ['two went in the week', [-48, -24], false],
    ['the older of two went a week ago', [-168, -24], true],
  ])('has room for a prompt when %s: %s', (_, hours, room) => {
    // 11:45 in Kathmandu.
    const sentAt = hours.map((ahead) => now + ahead * hour)
    expect(hasRoom({ sentAt, now, timeZone: 'Asia/Kathmandu' })).toBe(room)
    expect(hasRoom({ sentAt, now, timeZone: 'Asia/Kathmandu', limit: 0 })).toBe(false)
  })
})
