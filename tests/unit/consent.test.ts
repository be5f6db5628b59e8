import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  isHelpKeyword,
  isStartKeyword,
  isStopKeyword,
  mayText,
  optOutBusinessDays,
  optOutDeadline,
} from '@/lib/domain/consent'

describe('keywords of the carrier', () => {
  it('count whatever their case and the full stops around them', () => {
    for (const text of [
      'stop',
      'Stop',
      ' STOP ',
      '"stop"',
      'stop.',
      'STOP!!!',
      '...stop',
      '​stop',
    ]) {
      expect(isStopKeyword(text)).toBe(true)
    }
    expect(isStopKeyword('ＳＴＯＰ')).toBe(true)
    expect(isStopKeyword('opt  out')).toBe(true)
    expect(isStopKeyword('stop-all')).toBe(true)
    expect(isStopKeyword('Stop  all')).toBe(true)
  })

  it('count only alone', () => {
    for (const text of ['stop please', 'stopped', 'end?', 'quit it', '', 'nonstop', 'the end']) {
      expect(isStopKeyword(text)).toBe(false)
    }
    // What stands between the letters of a word is no full stop around it.
    for (const text of ['s.top', 'un subscribe', 'bus stop all', 'stop all day', 'stop_xall']) {
      expect(isStopKeyword(text)).toBe(false)
    }
    for (const text of ['co-opt out', 'opt out please']) expect(isStopKeyword(text)).toBe(false)
  })

  it('ask for help or a new start', () => {
    expect(isHelpKeyword('Help!')).toBe(true)
    expect(isHelpKeyword('INFO')).toBe(true)
    expect(isHelpKeyword('help me')).toBe(false)
    expect(isStartKeyword('Start.')).toBe(true)
    expect(isStartKeyword('unstop')).toBe(true)
    expect(isStartKeyword('yes')).toBe(false)
    expect(isStartKeyword('start now')).toBe(false)
  })
})

describe('a text', () => {
  const free = { consent: 'given', phoneState: 'active', carrierBlocked: false } as const

  it('may go to an active phone with consent and no block', () => {
    expect(mayText(free)).toEqual({ ok: true })
  })

  it.each([
    [{ ...free, consent: 'none' as const }, 'no consent'],
    [{ ...free, consent: 'withdrawn' as const }, 'withdrawn'],
    [{ ...free, suppressed: true }, 'withdrawn'],
    [{ ...free, phoneState: 'suspended' as const }, 'suspended'],
    [{ ...free, phoneState: 'gone' as const }, 'gone'],
    [{ ...free, carrierBlocked: true }, 'carrier blocked'],
    [{ consent: 'none' as const, phoneState: 'gone' as const, carrierBlocked: true }, 'no consent'],
    [{ ...free, phoneState: 'gone' as const, carrierBlocked: true }, 'gone'],
    [{ ...free, phoneState: 'suspended' as const, carrierBlocked: true }, 'suspended'],
  ])('may not go to %o', (phone, reason) => {
    expect(mayText(phone)).toEqual({ ok: false, reason })
  })
})

describe('the day by which an opt-out is honoured', () => {
  it('is ten business days on', () => {
    expect(optOutBusinessDays).toBe(10)
    expect(optOutDeadline({ withdrawnOn: '2025-12-01' })).toBe('2025-12-15')
    expect(optOutDeadline({ withdrawnOn: '2025-12-06' })).toBe('2025-12-19')
    expect(optOutDeadline({ withdrawnOn: '2025-12-07' })).toBe('2025-12-19')
  })

  it('passes over holidays, and over leap days without a stumble', () => {
    expect(
      optOutDeadline({ withdrawnOn: '2025-12-15', holidays: ['2025-12-25', '2025-12-26'] }),
    ).toBe('2025-12-31')
    expect(optOutDeadline({ withdrawnOn: '2024-02-19' })).toBe('2024-03-04')
    expect(optOutDeadline({ withdrawnOn: '2024-02-28', businessDays: 1 })).toBe('2024-02-29')
  })

  it('is never at a weekend nor on a holiday, and ten business days lie within', () => {
    const day = fc.integer({ min: 0, max: 3000 }).map((n) => isoOf(n))
    fc.assert(
      fc.property(day, fc.array(day, { maxLength: 30 }), (withdrawnOn, holidays) => {
        const deadline = optOutDeadline({ withdrawnOn, holidays })
        const open = daysAfter(withdrawnOn, deadline).filter(
          (on) =>
            !holidays.includes(on) && ![0, 6].includes(new Date(`${on}T12:00:00Z`).getUTCDay()),
        )
        expect(open).toHaveLength(10)
        expect(open.at(-1)).toBe(deadline)
      }),
    )
  })
})

function isoOf(dayNumber: number): string {
  return new Date(Date.UTC(2024, 0, 1) + dayNumber * 86_400_000).toISOString().slice(0, 10)
}

function daysAfter(from: string, to: string): string[] {
  const days: string[] = []
  for (let at = Date.parse(from) + 86_400_000; at <= Date.parse(to); at += 86_400_000) {
    days.push(new Date(at).toISOString().slice(0, 10))
  }
  return days
}
