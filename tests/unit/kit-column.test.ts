import { describe, expect, it } from 'vitest'
import { columnWords, stageLooks, vesselLevel } from '@/lib/domain/kit-column'

const fitted = [
  { position: 3, fittedOn: '2026-01-01', dueOn: '2027-01-01' },
  { position: 1, fittedOn: '2026-01-01', dueOn: '2026-02-01' },
  { position: 2, fittedOn: '2026-01-01', dueOn: '2026-04-01' },
] as const

function states(today: string, outPosition: 1 | 2 | 3 | null = null) {
  return stageLooks(fitted, { today, outPosition }).map(({ state }) => state)
}

describe('the look of a kit', () => {
  it('stands from the top down, whatever order the fittings come in', () => {
    const looks = stageLooks(fitted, { today: '2026-01-01', outPosition: null })
    expect(looks.map(({ position }) => position)).toEqual([1, 2, 3])
    expect(looks.map(({ left }) => left)).toEqual([1, 1, 1])
  })

  it.each([
    ['2026-01-27', ['good', 'good', 'good']],
    ['2026-01-28', ['due', 'good', 'good']],
    ['2026-02-01', ['due', 'good', 'good']],
    ['2026-02-02', ['overdue', 'good', 'good']],
    ['2027-02-01', ['overdue', 'overdue', 'overdue']],
  ])('on %s its stages are %j', (today, expected) => {
    expect(states(today)).toEqual(expected)
  })

  it('counts a change as due from the days that one text bundles', () => {
    const seen = { today: '2026-01-27', outPosition: null }
    expect(stageLooks(fitted, { ...seen, dueDays: 5 })[0]?.state).toBe('due')
  })

  it('bars the stage that keeps it out of service', () => {
    expect(states('2026-02-02', 3)).toEqual(['overdue', 'good', 'out'])
  })

  it('never shows less than nothing left of a cycle', () => {
    const [cloth] = stageLooks(fitted, { today: '2030-01-01', outPosition: null })
    expect(cloth?.left).toBe(0)
  })
})

describe('the level in the vessel', () => {
  it.each([
    [null, 40, null],
    [0, 40, 0],
    [2.5, 40, 0.5],
    [5, 40, 1],
    [50, 40, 1],
  ])('with %s L/h for %i L a day is %s', (litresPerHour, litresPerDay, level) => {
    expect(vesselLevel(litresPerHour, litresPerDay)).toBe(level)
  })

  it('is full at the hours that were set', () => {
    expect(vesselLevel(2.5, 40, 16)).toBe(1)
  })

  it('is said in words with the stages', () => {
    const looks = stageLooks(fitted, { today: '2026-02-02', outPosition: null })
    expect(columnWords(looks, 0.5)).toBe(
      'The kit: cloth overdue, carbon 64 % of its time left, fibre 91 % of its time left, flow 50 % of the need',
    )
    const spent = stageLooks(fitted, { today: '2026-01-30', outPosition: 3 })
    expect(columnWords(spent, null)).toBe(
      'The kit: cloth due, carbon 68 % of its time left, fibre out of service, no flow reading',
    )
    expect(columnWords([], 1)).toBe('The kit: flow enough')
  })
})
