import { describe, expect, it } from 'vitest'
import type { Recovery, RecoveryKind } from '@/lib/domain/flow'
import {
  answerStep,
  defaultPriors,
  likelihoodWord,
  nextStep,
  startWalk,
  suspectIds,
  type StepAnswer,
  type Walk,
} from '@/lib/domain/walk'

/** A flow figure of this share of the first reading, its error 15 % of it. */
function figure(share: number, kind?: RecoveryKind): Recovery {
  const verdict =
    share > 1.3 ? 'too-fast' : share >= 0.7 ? 'restored' : share >= 0.4 ? 'partly' : 'not'
  return {
    kind: kind ?? verdict,
    share,
    lowShare: share * 0.85,
    highShare: share * 1.15,
    against: 'first reading',
  }
}

type Entry = [stepId: string, answer: StepAnswer, share?: number]

function walked(entries: readonly Entry[], from: Walk = startWalk({ trouble: 'slow' })): Walk {
  return entries.reduce(
    (walk, [stepId, answer, share], at) =>
      answerStep(walk, {
        stepId,
        answer,
        at,
        ...(share === undefined ? {} : { recovery: figure(share) }),
      }),
    from,
  )
}

function nextAfter(...entries: Entry[]) {
  const next = nextStep(walked(entries))
  return next.kind === 'step' ? next.step.id : { end: next.end, stage: next.stage }
}

describe('a slow filter', () => {
  it.each<{ what: string; entries: Entry[]; next: unknown }>([
    { what: 'asks for a figure first', entries: [], next: 'ask-flow' },
    {
      what: 'is washed after a slow figure',
      entries: [['ask-flow', 'done', 0.33]],
      next: 'wash-fibre',
    },
    {
      what: 'is washed again after one wash that failed',
      entries: [
        ['ask-flow', 'done', 0.33],
        ['wash-fibre', 'done', 0.33],
      ],
      next: 'wash-fibre',
    },
    {
      what: 'is owed a fibre stage after two',
      entries: [
        ['ask-flow', 'done', 0.33],
        ['wash-fibre', 'done', 0.33],
        ['wash-fibre', 'done', 0.34],
      ],
      next: { end: 'part', stage: 3 },
    },
    {
      what: 'is asked again where the error straddles the line',
      entries: [
        ['ask-flow', 'done', 0.33],
        ['wash-fibre', 'done', 0.33],
        ['wash-fibre', 'done', 0.38],
      ],
      next: 'ask-again',
    },
    {
      what: 'is spent if the figure asked again is wholly below',
      entries: [
        ['wash-fibre', 'done', 0.33],
        ['wash-fibre', 'done', 0.38],
        ['ask-again', 'done', 0.33],
      ],
      next: { end: 'part', stage: 3 },
    },
    {
      what: 'is washed a third time if it still straddles',
      entries: [
        ['wash-fibre', 'done', 0.33],
        ['wash-fibre', 'done', 0.38],
        ['ask-again', 'done', 0.38],
      ],
      next: 'wash-fibre',
    },
    {
      what: 'flows again after a wash',
      entries: [
        ['ask-flow', 'done', 0.33],
        ['wash-fibre', 'done', 0.9],
      ],
      next: { end: 'restored', stage: undefined },
    },
    {
      what: 'was not slow at all',
      entries: [['ask-flow', 'done', 0.8]],
      next: { end: 'restored', stage: undefined },
    },
    {
      what: 'is stopped when it runs too fast',
      entries: [['ask-flow', 'done', 1.4]],
      next: { end: 'stop using', stage: undefined },
    },
    {
      what: 'is asked for the figure of a wash that was only said to be done',
      entries: [
        ['ask-flow', 'done', 0.33],
        ['wash-fibre', 'done'],
      ],
      next: 'ask-flow',
    },
    {
      what: 'is asked for the figure of a wash that was said to have failed',
      entries: [
        ['ask-flow', 'done', 0.33],
        ['wash-fibre', 'not cured'],
      ],
      next: 'ask-flow',
    },
    {
      what: 'is not asked for a figure when they say it runs well',
      entries: [
        ['ask-flow', 'done', 0.33],
        ['wash-fibre', 'cured'],
      ],
      next: { end: 'restored', stage: undefined },
    },
    {
      what: 'goes on without a figure when they cannot measure',
      entries: [['ask-flow', 'not done']],
      next: 'wash-fibre',
    },
    {
      what: 'needs a visit when two steps in a row go unanswered',
      entries: [
        ['ask-flow', 'done', 0.33],
        ['wash-fibre', 'no answer'],
        ['wash-fibre', 'no answer'],
      ],
      next: { end: 'visit', stage: undefined },
    },
    {
      what: 'needs a new cloth when it is torn',
      entries: [
        ['ask-flow', 'done', 0.33],
        ['rinse-cloth', 'choice-1'],
      ],
      next: { end: 'part', stage: 1 },
    },
    {
      what: 'is stopped when a crack is seen, whatever else is known',
      entries: [
        ['ask-flow', 'done', 0.33],
        ['wash-fibre', 'done', 0.9],
        ['check-cracks', 'choice-1'],
      ],
      next: { end: 'stop using', stage: undefined },
    },
    {
      what: 'is not washed by who cannot wash',
      entries: [
        ['ask-flow', 'done', 0.33],
        ['wash-fibre', 'not done'],
      ],
      next: 'look-hose',
    },
  ])('$what', ({ entries, next }) => {
    expect(nextAfter(...entries)).toEqual(next)
  })

  it('takes "nothing comes" for a figure of nothing', () => {
    const walk = walked([['ask-flow', 'no']])
    expect(walk.readings.map(({ share }) => share)).toEqual([0])
    expect(nextStep(walk)).toMatchObject({ kind: 'step' })
    expect(walk.odds['air-lock']).toBeGreaterThan(defaultPriors.slow['air-lock'])
  })

  it('keeps its place when a step is not in the catalogue', () => {
    const walk = walked([['ask-flow', 'done', 0.33]])
    expect(answerStep(walk, { stepId: 'shake-it', answer: 'done', at: 9 })).toBe(walk)
  })
})

describe('safety questions', () => {
  it.each(['dropped', 'leak', 'odd water'] as const)('come first after: %s', (cue) => {
    const walk = startWalk({ trouble: 'no flow', cues: [cue] })
    expect(nextStep(walk)).toMatchObject({ kind: 'step', step: { id: 'check-cracks' } })
  })

  it('are not put to a filter that is merely slow', () => {
    expect(nextStep(startWalk({ trouble: 'slow', cues: ['after rain'] }))).toMatchObject({
      step: { id: 'ask-flow' },
    })
  })

  it('are put once; none of these leads on', () => {
    const walk = walked(
      [['check-cracks', 'choice-3']],
      startWalk({ trouble: 'slow', cues: ['leak'] }),
    )
    expect(nextStep(walk)).toMatchObject({ step: { id: 'ask-flow' } })
  })

  it('come before the cheapest cure, as soon as a crack is possible at all', () => {
    const odds = { ...defaultPriors.slow, 'cracked-fibre': 0.12 }
    const walk = walked([['ask-flow', 'done', 0.33]], startWalk({ trouble: 'slow', priors: odds }))
    expect(walk.odds['cracked-fibre']).toBeGreaterThan(0.1)
    expect(nextStep(walk)).toMatchObject({ step: { id: 'check-cracks' } })
  })
})

describe('odds', () => {
  it('sum to 1 after anything', () => {
    const walk = walked([
      ['ask-flow', 'done', 0.1],
      ['look-hose', 'choice-2'],
      ['bleed-air', 'done', 0.5],
      ['wash-fibre', 'done', 0.2],
    ])
    expect(suspectIds.reduce((sum, id) => sum + walk.odds[id], 0)).toBeCloseTo(1, 12)
  })

  it('fall for dirt and rise for a spent stage with each wash that fails', () => {
    const before = walked([['ask-flow', 'done', 0.33]])
    const after = walked([['wash-fibre', 'done', 0.33]], before)
    expect(after.odds['fouled-fibre']).toBeLessThan(before.odds['fouled-fibre'])
    expect(after.odds['spent-fibre']).toBeGreaterThan(before.odds['spent-fibre'])
  })

  it('rule cold out in warm water, and lean to it in cold', () => {
    const at = (celsius: number | null) =>
      startWalk({ trouble: 'slow', celsius }).odds['cold-water']
    expect(at(24)).toBeLessThan(0.001)
    expect(at(6)).toBeGreaterThan(0.1)
    expect(at(14)).toBeCloseTo(at(null), 12)
  })

  it('read the last figure, when a later one says more of the same wash', () => {
    const asked = walked([
      ['wash-fibre', 'done', 0.2],
      ['ask-flow', 'done', 0.5],
    ])
    expect(asked.odds).toEqual(walked([['wash-fibre', 'done', 0.5]]).odds)
  })

  it.each([
    { chance: 0.4, word: 'likely' },
    { chance: 0.39, word: 'possible' },
    { chance: 0.15, word: 'possible' },
    { chance: 0.14, word: 'unlikely' },
  ])('$chance is $word', ({ chance, word }) => {
    expect(likelihoodWord(chance)).toBe(word)
  })
})

describe('the line that explains a choice', () => {
  it.each<{ entries: Entry[]; why: string }>([
    { entries: [], why: 'Nobody has timed a litre yet; without a figure nothing can be compared.' },
    {
      entries: [['ask-flow', 'done', 0.33]],
      why: 'Best chance for the least trouble: fibre fouled is likely, 6 in 10, about 22 minutes.',
    },
    {
      entries: [['wash-fibre', 'done', 0.33]],
      why: 'One wash that fails proves little; a second in a row tells dirt from a spent stage.',
    },
    {
      entries: [
        ['wash-fibre', 'done', 0.33],
        ['wash-fibre', 'done', 0.3],
      ],
      why: 'Two washes in a row left 33 %, then 30 % of the flow, both wholly under 40 %: spent, whatever its age.',
    },
    {
      entries: [
        ['wash-fibre', 'done', 0.33],
        ['wash-fibre', 'done', 0.38],
      ],
      why: 'The error of the figure straddles 40 %: ask again.',
    },
    {
      entries: [['wash-fibre', 'done']],
      why: 'A timed litre tells whether it helped: wash the fibre stage.',
    },
    { entries: [['wash-fibre', 'done', 0.82]], why: '82 % of the first reading: restored.' },
    { entries: [['wash-fibre', 'cured']], why: 'They say it runs well again.' },
    {
      entries: [['ask-flow', 'done', 1.5]],
      why: '150 % of the first reading is too fast: water may pass a breach.',
    },
    { entries: [['check-cracks', 'choice-2']], why: 'They answered: 2 · It fell or froze.' },
  ])('$why', ({ entries, why }) => {
    expect(nextStep(walked(entries)).why).toBe(why)
  })
})
