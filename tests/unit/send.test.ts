import { describe, expect, it } from 'vitest'
import { decideDoubt, type ListedOutbound } from '@/lib/domain/doubt'
import { decideSend } from '@/lib/domain/send'
import { silenceWords } from '@/lib/domain/silence-words'

const second = 1_000
const hour = 3_600 * second
/** 15:00 on a Wednesday in Nairobi. */
const now = Date.parse('2026-03-04T12:00:00Z')
const window = {
  timeZone: 'Africa/Nairobi',
  opensMinute: 8 * 60,
  closesMinute: 20 * 60,
  sundaysOff: true,
  holidays: [],
}
const willing = { consent: 'given', phoneState: 'active', carrierBlocked: false } as const

type Text = Parameters<typeof decideSend>[0]

function decided(change: Partial<Text> = {}) {
  const text: Text = {
    now,
    sendAfter: now - hour,
    notAfter: now + hour,
    anyHour: false,
    moment: 'wash-due',
    window,
    phone: willing,
  }
  return decideSend({ ...text, ...change })
}

describe('a text whose hour has come', () => {
  it('goes, also in the last instant that it is of use', () => {
    expect(decided()).toEqual({ kind: 'send' })
    expect(decided({ sendAfter: now, notAfter: now })).toEqual({ kind: 'send' })
  })

  it('is dropped when it is of no use any more', () => {
    expect(decided({ notAfter: now - 1 })).toEqual({ kind: 'drop', why: 'too late' })
    expect(decided({ notAfter: null })).toEqual({ kind: 'send' })
  })

  it('waits for its own hour', () => {
    expect(decided({ sendAfter: now + 1 })).toEqual({ kind: 'wait', until: now + 1 })
  })

  it('waits for the window, unless it may go at any hour or belongs to no area', () => {
    const night = Date.parse('2026-03-04T18:00:00Z')
    const late = { now: night, sendAfter: night, notAfter: null }
    const opens = Date.parse('2026-03-05T05:00:00Z')
    expect(decided(late)).toEqual({ kind: 'wait', until: opens })
    expect(decided({ ...late, anyHour: true })).toEqual({ kind: 'send' })
    expect(decided({ ...late, window: null })).toEqual({ kind: 'send' })
  })

  it('is dropped where nobody may be texted, at whatever hour, and says why', () => {
    const phone = { ...willing, consent: 'withdrawn' } as const
    const why = { kind: 'drop', why: 'withdrawn' }
    expect(decided({ phone })).toEqual(why)
    expect(decided({ phone, anyHour: true, notAfter: now - 1 })).toEqual(why)
    expect(decided({ phone: { ...willing, phoneState: 'suspended' }, moment: null })).toEqual({
      kind: 'drop',
      why: 'suspended',
    })
  })

  it.each(['stopped', 'wrong-number'])(
    'that is the last word, %s, still goes to who wants no more',
    (moment) => {
      expect(decided({ moment, phone: { ...willing, consent: 'withdrawn' } })).toEqual({
        kind: 'send',
      })
      expect(decided({ moment, phone: { ...willing, phoneState: 'suspended' } })).toEqual({
        kind: 'send',
      })
    },
  )

  it('that is the last word does not go to a number that is gone or blocked', () => {
    const phone = { ...willing, consent: 'withdrawn' } as const
    expect(decided({ moment: 'stopped', phone: { ...phone, carrierBlocked: true } })).toEqual({
      kind: 'drop',
      why: 'withdrawn',
    })
    expect(decided({ moment: 'stopped', phone: { ...willing, phoneState: 'gone' } })).toEqual({
      kind: 'drop',
      why: 'gone',
    })
  })
})

describe('an attempt in doubt', () => {
  const attempt = { now, postingAt: now - hour, looks: 0, lookedAt: null, body: 'Wash it.' }
  const listed = (after: number, sid: string, body = 'Wash it.'): ListedOutbound => ({
    sid,
    body,
    createdAt: attempt.postingAt + after,
  })

  it.each([
    [-5 * second, true],
    [-5 * second - 1, false],
    [120 * second, true],
    [120 * second + 1, false],
  ])('is the text made %d ms after the post: %s', (after, isOurs) => {
    const decision = decideDoubt({ ...attempt, listed: [listed(after, 'SM1')] })
    expect(decision.kind).toBe(isOurs ? 'found' : 'look again')
  })

  it('is the oldest of several, and says how many are surplus', () => {
    const all = [listed(9, 'SM9'), listed(1, 'SM1'), listed(5, 'SM5'), listed(0, 'SM0', 'Other.')]
    expect(decideDoubt({ ...attempt, listed: all })).toEqual({
      kind: 'found',
      sid: 'SM1',
      surplus: 2,
    })
  })

  it('is held not to exist only after two looks two minutes apart', () => {
    const looked = (ago: number) =>
      decideDoubt({ ...attempt, looks: 1, lookedAt: now - ago, listed: [] }).kind
    expect(decideDoubt({ ...attempt, listed: [] }).kind).toBe('look again')
    expect(decideDoubt({ ...attempt, looks: 0, lookedAt: now - hour, listed: [] }).kind).toBe(
      'look again',
    )
    expect(decideDoubt({ ...attempt, looks: 1, listed: [] }).kind).toBe('look again')
    expect(looked(120 * second - 1)).toBe('wait')
    expect(looked(120 * second)).toBe('not created')
  })
})

describe('why nothing may be texted to a phone, for staff', () => {
  const phone = { consent: 'given', state: 'active', stateWhy: '', carrierBlocked: false } as const

  it('is nothing where something may', () => {
    expect(silenceWords(phone)).toBeNull()
  })

  it.each([
    [{ consent: 'none' }, 'no consent yet'],
    [{ consent: 'withdrawn' }, 'opted out'],
    [{ carrierBlocked: true }, 'blocked by the carrier'],
    [{ state: 'suspended' }, 'suspended'],
    [{ state: 'suspended', stateWhy: 'wrong number' }, 'suspended: wrong number'],
    [{ state: 'gone' }, 'number gone'],
    [{ state: 'gone', stateWhy: 'code 30005' }, 'number gone: code 30005'],
  ] as const)('%o: %s', (change, words) => {
    expect(silenceWords({ ...phone, ...change })).toBe(words)
  })
})
