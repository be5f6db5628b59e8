import { describe, expect, it } from 'vitest'
import { sendAfter, type Window } from '@/lib/domain/round'

const utc = (text: string) => Date.parse(text)
const iso = (at: number) => new Date(at).toISOString()

const kathmandu: Window = {
  timeZone: 'Asia/Kathmandu',
  opensMinute: 8 * 60,
  closesMinute: 20 * 60,
  sundaysOff: true,
  holidays: ['2025-10-02'],
}

describe('the spread of a round', () => {
  const now = utc('2025-07-01T00:00:00Z')
  const at = (spreadIndex: number, perMinute: number) =>
    iso(sendAfter({ now, window: kathmandu, spreadIndex, perMinute }))

  it('goes one behind the other at the rate of the sender', () => {
    expect(at(0, 30)).toBe('2025-07-01T02:15:00.000Z')
    expect(at(1, 30)).toBe('2025-07-01T02:15:02.000Z')
    expect(at(60, 30)).toBe('2025-07-01T02:17:00.000Z')
  })

  it('goes on in the next window when this one is full', () => {
    expect(at(719, 1)).toBe('2025-07-01T14:14:00.000Z')
    expect(at(720, 1)).toBe('2025-07-02T02:15:00.000Z')
    expect(at(720 * 5, 1)).toBe('2025-07-07T02:15:00.000Z') // Sunday the 6th is skipped
  })

  it('knows a window that is open all day', () => {
    const window = { ...kathmandu, opensMinute: 0, closesMinute: 1440 }
    const late = sendAfter({ now, window, spreadIndex: 1440 * 6, perMinute: 1 })
    // Six days of open window, and the Sunday between them.
    expect(iso(late)).toBe('2025-07-08T00:00:00.000Z')
  })

  it('needs a rate', () => {
    expect(() => at(1, 0)).toThrow(new RangeError('the sender must send at some rate'))
  })
})
