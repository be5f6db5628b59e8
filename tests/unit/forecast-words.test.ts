import { describe, expect, it } from 'vitest'
import { forecastWords } from '@/lib/domain/forecast-words'

const at = (day: string) => Date.parse(`${day}T12:00:00Z`)
const today = { now: at('2026-04-10'), timeZone: 'America/La_Paz' }

function fall(onAt: string, earliestAt: string, latestAt: string | null, perDay = 0.02) {
  const latest = latestAt === null ? null : at(latestAt)
  return {
    kind: 'falls' as const,
    onAt: at(onAt),
    earliestAt: at(earliestAt),
    latestAt: latest,
    perDay,
  }
}

describe('a forecast in words', () => {
  it.each([
    ['2026-04-20', '2026-04-15', '2026-05-02', 'about 20 Apr: between 15 Apr and 2 May.'],
    ['2026-04-20', '2026-04-10', '2026-05-02', 'about 20 Apr, perhaps already, and by 2 May at'],
    ['2026-04-20', '2026-04-15', null, 'hardly before 15 Apr; how much later the readings do'],
    ['2026-04-20', '2026-04-15', '2029-01-01', 'hardly before 15 Apr; how much later the'],
    [
      '2026-04-20',
      '2026-03-01',
      null,
      'It may fall under the need about 20 Apr; the readings are too few or too uneven',
    ],
    ['2027-01-20', '2026-12-15', '2027-03-02', 'about 20 Jan 2027: between 15 Dec and 2 Mar 2027.'],
    [
      '2026-04-02',
      '2026-03-01',
      '2026-04-20',
      'By its trend under the need already, since about 2 Apr.',
    ],
    ['2026-04-10', '2026-03-01', null, 'already, since about 10 Apr.'],
  ])('on %s, from %s to %s: %s', (onAt, earliestAt, latestAt, words) => {
    expect(forecastWords(fall(onAt, earliestAt, latestAt), today)).toContain(words)
  })

  it('names no bound that is past, and no year that is this one', () => {
    const words = forecastWords(fall('2026-04-20', '2026-02-01', '2026-05-01'), today)
    expect(words).not.toContain('Feb')
    expect(words).not.toContain('2026')
  })

  it('tells a low flow from a falling one', () => {
    const low = forecastWords(fall('2026-04-08', '2026-03-01', null, 0), today)
    expect(low).toBe('By its readings under the need already, without falling further.')
  })

  it('says when nothing can be foretold', () => {
    expect(forecastWords({ kind: 'too few' }, today)).toContain('Too few readings')
    expect(forecastWords({ kind: 'holds' }, today)).toContain('no fall')
  })
})
