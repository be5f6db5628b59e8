import { describe, expect, it } from 'vitest'
import { answerStep, defaultPriors, nextStep, startWalk } from '@/lib/domain/walk'
import { walked, type Entry } from '@/tests/factories/walk'

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
      what: 'needs a visit when nothing that was tried stands out',
      entries: [
        ['ask-flow', 'not done'],
        ['wash-fibre', 'not done'],
        ['rinse-cloth', 'not cured'],
        ['bleed-air', 'not cured'],
        ['straighten-hose', 'not cured'],
        ['fill-container', 'not cured'],
        ['refit-cap', 'not cured'],
        ['check-cracks', 'choice-3'],
        ['look-hose', 'choice-3'],
        ['flush-carbon', 'partly'],
      ],
      next: { end: 'visit', stage: undefined },
    },
    {
      what: 'is owed the stage that three washes only partly brought back',
      entries: [
        ['ask-flow', 'done', 0.5],
        ['wash-fibre', 'done', 0.5],
        ['wash-fibre', 'done', 0.5],
        ['wash-fibre', 'done', 0.5],
        ['bleed-air', 'done', 0.5],
      ],
      next: { end: 'part', stage: 3 },
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
