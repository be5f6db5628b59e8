import { describe, expect, it } from 'vitest'
import {
  clockWords,
  dayWords,
  distanceWords,
  dueWords,
  minuteWords,
  momentWords,
  shortDayWords,
} from '@/lib/domain/stamp'

describe('days and hours for staff', () => {
  it('names a day without moving it into the machine’s own zone', () => {
    expect(dayWords('2026-01-01')).toBe('1 Jan 2026')
    expect(dayWords('2026-12-31')).toBe('31 Dec 2026')
    expect(shortDayWords('2026-03-01')).toBe('1 Mar')
  })

  it('tells the hour on the wall of the area', () => {
    const at = Date.UTC(2026, 0, 1, 3, 5)
    expect(clockWords(at, 'America/La_Paz')).toBe('23:05')
    expect(momentWords(at, 'America/La_Paz')).toBe('31 Dec 2025, 23:05')
    expect(clockWords(Date.UTC(2026, 0, 1), 'UTC')).toBe('00:00')
  })

  it.each([
    ['2026-03-01', '2026-03-01', 'today'],
    ['2026-03-02', '2026-03-01', 'in 1 day'],
    ['2026-02-26', '2026-03-01', '3 days ago'],
  ])('says how far %s is from %s', (day, today, words) => {
    expect(distanceWords(day, today)).toBe(words)
  })

  it('calls what is due in the past late', () => {
    expect(dueWords('2026-02-26', '2026-03-01')).toBe('3 days late')
    expect(dueWords('2026-03-03', '2026-03-01')).toBe('in 2 days')
  })

  it('writes minutes of the day as a clock', () => {
    expect([0, 485, 1440].map(minuteWords)).toEqual(['00:00', '08:05', '24:00'])
  })
})
