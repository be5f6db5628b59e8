import { describe, expect, test } from 'vitest'
import { causesFor, causeWords, isCauseOf } from '@/lib/domain/end-causes'
import { oddsInWords } from '@/lib/domain/odds-words'
import { bandNote, dayStart, eitherOf, shiftTitle, waitedInWords } from '@/lib/domain/shift-words'
import type { TicketEvent } from '@/lib/domain/ticket-types'
import { endInWords, eventWords, houseName } from '@/lib/domain/ticket-words'
import { bottleWords, verdictWords, type Verdict } from '@/lib/domain/verdict-words'

const HOUR = 3_600_000
const at = (iso: string) => Date.parse(iso)

describe('the shift in words', () => {
  test.each([
    ['2026-03-03T01:30:00Z', 'Tuesday, night'],
    ['2026-03-03T07:00:00Z', 'Tuesday, before noon'],
    ['2026-03-03T09:00:00Z', 'Tuesday, after noon'],
    ['2026-03-03T15:00:00Z', 'Tuesday, evening'],
    ['2026-03-03T21:00:00Z', 'Wednesday, night'],
  ])('%s in Nairobi is %s', (iso, title) => {
    expect(shiftTitle(at(iso), 'Africa/Nairobi')).toBe(title)
  })

  test('a day begins at midnight of the area, also when clocks change', () => {
    expect(dayStart(at('2026-03-29T20:00:00Z'), 'Europe/Paris')).toBe(at('2026-03-28T23:00:00Z'))
  })

  test.each([
    [0, '0 h 00'],
    [5.5 * HOUR, '5 h 30'],
    [95 * HOUR, '95 h 00'],
    [100 * HOUR, '4 days'],
    [-HOUR, '0 h 00'],
  ])('%d ms of waiting are %s', (milliseconds, words) => {
    expect(
      waitedInWords(at('2026-03-03T00:00:00Z') - milliseconds, at('2026-03-03T00:00:00Z')),
    ).toBe(words)
  })

  test('counts say house and houses, and leave out what is none', () => {
    expect(bandNote({ houses: 1, people: 1, enough: 0 })).toBe('1 house, 1 person')
    expect(bandNote({ houses: 4, people: 18, enough: 3 })).toBe(
      '4 houses, 18 people, enough to drink in 3',
    )
    expect(eitherOf(['Spanish', 'English'])).toBe('Spanish or English')
    expect(eitherOf([])).toBe('no language')
  })
})

describe('a ticket in words', () => {
  const nameOf = () => 'R. Sen'

  test('its events say what happened', () => {
    expect(eventWords({ kind: 'opened', trouble: 'slow' }, nameOf)).toBe('Opened: slow water')
    expect(eventWords({ kind: 'handed on', staffId: 'x' }, nameOf)).toBe('Handed on to R. Sen')
    expect(
      eventWords({ kind: 'answered', stepId: 'ask-flow', answer: 'done', minutes: 12 }, nameOf),
    ).toBe('Ask how long a litre takes: 12 minutes a bottle')
    expect(
      eventWords({ kind: 'answered', stepId: 'wash-fibre', answer: 'not cured' }, nameOf),
    ).toBe('Wash the fibre stage: done, still slow')
  })

  test.each<[TicketEvent, string]>([
    [{ kind: 'taken', staffId: 'x' }, 'Taken'],
    [{ kind: 'handed on', staffId: null }, 'Back in the shift'],
    [{ kind: 'worsened', trouble: 'danger sign' }, 'Now: unwell, with a danger sign'],
    [{ kind: 'step sent', stepId: 'bleed-air', by: 'x' }, 'Sent: let the air out of the line'],
    [{ kind: 'step sent', stepId: 'long-ago', by: 'x' }, 'Sent: long-ago'],
    [{ kind: 'answered', stepId: 'bleed-air', answer: 'yes' }, 'Let the air out of the line: yes'],
    [{ kind: 'answered', stepId: 'long-ago', answer: 'no answer' }, 'long-ago: no answer'],
    [{ kind: 'part promised', promiseId: 'p', stage: 2 }, 'Promised: a part for the carbon stage'],
    [{ kind: 'part handed over', promiseId: 'p' }, 'Part handed over and fitted'],
    [{ kind: 'visit booked', visitId: 'v' }, 'Visit booked'],
    [{ kind: 'visit done', flowing: true }, 'Visited: it flows'],
    [{ kind: 'visit done', flowing: false }, 'Visited: it does not flow yet'],
    [{ kind: 'stopped using' }, 'Told to stop using it'],
    [{ kind: 'no answer' }, 'No answer'],
    [{ kind: 'ended', end: 'retired', cause: 'beyond repair' }, 'Kit withdrawn: beyond repair'],
  ])('%o: %s', (event, words) => {
    expect(eventWords(event, nameOf)).toBe(words)
  })

  test('its end says of what', () => {
    expect(endInWords({ stage: 'withdrawn', cause: null })).toBe('Withdrawn')
    expect(causeWords('mended at a visit')).toBe('mended at a visit')
    expect(endInWords({ stage: 'flowing', cause: 'fouled-fibre' })).toBe('Flowing: fibre fouled')
    expect(endInWords({ stage: 'waiting', cause: 'spent-fibre' })).toBe('')
    expect(houseName('Whitlock')).toBe('Whitlock house')
    expect(houseName('The long House')).toBe('The long House')
    expect(houseName('House of Ana')).toBe('House of Ana house')
  })

  test('a cause belongs to its end', () => {
    expect(isCauseOf('flowing', 'fouled-fibre')).toBe(true)
    expect(isCauseOf('flowing', 'moved away')).toBe(false)
    expect(causesFor('retired').map(({ words }) => words)).toContain('Beyond repair')
  })

  test('odds never say none in ten', () => {
    expect([0.99, 0.54, 0.08, 0.05, 0.01].map(oddsInWords)).toEqual([
      'almost sure',
      '5 in 10',
      '1 in 10',
      '1 in 20',
      '1 in 50',
    ])
  })
})

describe('a reading in words', () => {
  const reading: Verdict = {
    litres: 1,
    seconds: 720,
    normalised: 5,
    errorShare: 0.112,
    celsius: 9,
    celsiusFrom: 'area month',
    month: 3,
    reference: 20,
    recovery: { kind: 'not', share: 0.25, lowShare: 0.21, highShare: 0.29, against: 'nominal' },
    need: { kind: 'short', hours: 30 },
  }

  test('says its flow with the error, what it is held against, and the water', () => {
    expect(verdictWords(reading)).toEqual([
      "5.0 L/h at 20 °C ± 0.6; model's nominal flow 20.0",
      "25 % of the model's nominal flow (21 to 29 %): not restored.",
      'Water taken at 9 °C, usual here in March.',
      'Less than the family needs in a day.',
    ])
  })

  test('says whose temperature it is, and against which reading', () => {
    const told = verdictWords({
      ...reading,
      celsiusFrom: 'told',
      recovery: { ...reading.recovery, kind: 'partly', against: 'first reading' },
      need: { kind: 'slow', hours: 10.5 },
    })
    expect(told).toEqual([
      '5.0 L/h at 20 °C ± 0.6; first reading 20.0',
      '25 % of the first reading (21 to 29 %): partly back.',
      'Water at 9 °C, as told.',
      "The day's water takes 10 h 30.",
    ])
    const enough = verdictWords({ ...reading, need: { kind: 'enough', hours: 6 } })
    expect(enough.at(-1)).toBe('Enough to drink in 6 h 00.')
  })

  test('names a bottle that is no litre', () => {
    expect(bottleWords({ litres: 1, seconds: 750 })).toBe('12.5 min a litre')
    expect(bottleWords({ litres: 1.5, seconds: 720 })).toBe('12 min for 1.5 L')
  })
})
