import { describe, expect, it } from 'vitest'
import type { StepAnswer } from '@/lib/domain/walk'
import {
  failedWashesInARow,
  lastRecovery,
  outcomeOf,
  recoveryBeforeCures,
  settledEnd,
  trialsOf,
  type Tried,
} from '@/lib/domain/walk-trials'
import { figure, walked, type Entry } from '@/tests/factories/walk'

const tried = (...entries: Entry[]): readonly Tried[] => walked(entries).tried
const trials = (...entries: Entry[]) =>
  trialsOf(tried(...entries)).map(({ step, said, recovery, asks, wasAskedAgain }) => ({
    id: step.id,
    said,
    share: recovery?.share ?? null,
    asks,
    wasAskedAgain,
  }))

const wash = { id: 'wash-fibre', said: 'done', share: null, asks: 0, wasAskedAgain: false }

describe('a trial', () => {
  it.each<StepAnswer>(['not done', 'no', 'no answer'])(
    'is no cure that was not carried out: %s',
    (answer) => {
      expect(trials(['wash-fibre', answer])).toEqual([])
    },
  )

  it('is no cure whose answer ended the walk, such as a torn cloth', () => {
    expect(trials(['rinse-cloth', 'choice-1'])).toEqual([])
    expect(trials(['rinse-cloth', 'done'])).toHaveLength(1)
  })

  it('is no question, no figure by itself and no step that is in no catalogue', () => {
    const unknown: Tried = { stepId: 'shake-it', answer: 'done', at: 0 }
    expect(trials(['look-hose', 'choice-1'], ['ask-flow', 'done', 0.5])).toEqual([])
    expect(trialsOf([unknown, ...tried(['wash-fibre', 'done']), unknown])).toHaveLength(1)
    expect(recoveryBeforeCures([unknown])).toBeNull()
    expect(settledEnd([unknown])).toBeNull()
  })

  it('has the figure that came with it, or the later ones, each asking counted', () => {
    expect(trials(['wash-fibre', 'done', 0.3])).toEqual([{ ...wash, share: 0.3 }])
    expect(trials(['wash-fibre', 'done'], ['ask-flow', 'done', 0.5])).toEqual([
      { ...wash, share: 0.5, asks: 1 },
    ])
    expect(
      trials(['wash-fibre', 'done', 0.3], ['ask-flow', 'done'], ['ask-again', 'done', 0.4]),
    ).toEqual([{ ...wash, share: 0.4, asks: 2, wasAskedAgain: true }])
    expect(trials(['wash-fibre', 'done', 0.3], ['look-hose', 'choice-3'])).toEqual([
      { ...wash, share: 0.3 },
    ])
  })

  it('gives a figure to the last cure before it', () => {
    const both = trials(['wash-fibre', 'done'], ['bleed-air', 'done'], ['ask-flow', 'done', 0.9])
    expect(both.map(({ id, share }) => [id, share])).toEqual([
      ['wash-fibre', null],
      ['bleed-air', 0.9],
    ])
  })

  it.each<{ said: StepAnswer; answer: StepAnswer; counts: StepAnswer }>([
    { said: 'done', answer: 'not done', counts: 'not cured' },
    { said: 'cured', answer: 'not done', counts: 'cured' },
    { said: 'partly', answer: 'not done', counts: 'partly' },
    { said: 'done', answer: 'no answer', counts: 'done' },
    { said: 'done', answer: 'done', counts: 'done' },
  ])('said to be $said, with a figure that was $answer, counts as $counts', (one) => {
    expect(trials(['wash-fibre', one.said], ['ask-flow', one.answer])[0]?.said).toBe(one.counts)
  })
})

describe('what a cure did', () => {
  it.each([
    [figure(0.9), 'not cured', 'cured'],
    [figure(0.5), 'cured', 'partly'],
    [figure(0.3), 'cured', 'not cured'],
    [figure(1.5), 'cured', 'not cured'],
    [null, 'cured', 'cured'],
    [null, 'partly', 'partly'],
    [null, 'not cured', 'not cured'],
    [null, 'done', null],
  ] as const)('is told by the figure %o rather than by "%s": %s', (recovery, said, outcome) => {
    expect(outcomeOf({ recovery, said })).toBe(outcome)
  })
})

describe('the figures of a walk', () => {
  it('are the newest, and the one from before the first cure', () => {
    const entries: Entry[] = [
      ['ask-flow', 'done', 0.2],
      ['wash-fibre', 'done', 0.5],
      ['look-hose', 'choice-3'],
    ]
    expect(lastRecovery(tried(...entries))?.share).toBe(0.5)
    expect(recoveryBeforeCures(tried(...entries))?.share).toBe(0.2)
    expect(recoveryBeforeCures(tried(...entries.slice(1)))).toBeNull()
    expect(recoveryBeforeCures(tried(['ask-flow', 'done', 0.2], ['ask-flow', 'no']))?.share).toBe(0)
    expect(recoveryBeforeCures([])).toBeNull()
  })
})

describe('washes that failed in a row', () => {
  it.each<{ what: string; entries: Entry[]; count: number }>([
    { what: 'none', entries: [['ask-flow', 'done', 0.3]], count: 0 },
    {
      what: 'two',
      entries: [
        ['wash-fibre', 'done', 0.3],
        ['wash-fibre', 'not cured'],
      ],
      count: 2,
    },
    {
      what: 'one after a better one',
      entries: [
        ['wash-fibre', 'done', 0.3],
        ['wash-fibre', 'done', 0.5],
        ['wash-fibre', 'done', 0.3],
      ],
      count: 1,
    },
    {
      what: 'none while nobody knows of the last',
      entries: [
        ['wash-fibre', 'done', 0.3],
        ['wash-fibre', 'done'],
      ],
      count: 0,
    },
    {
      what: 'one, with another cure that failed before and after',
      entries: [
        ['bleed-air', 'done', 0.3],
        ['wash-fibre', 'done', 0.3],
        ['rinse-cloth', 'done', 0.3],
      ],
      count: 1,
    },
  ])('are $what', ({ entries, count }) => {
    expect(failedWashesInARow(tried(...entries))).toBe(count)
  })
})
