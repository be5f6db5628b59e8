import { describe, expect, it } from 'vitest'
import { defaultPriors, nextStep, startWalk, steps, stepOf, suspectIds } from '@/lib/domain/walk'
import type { Odds, Step } from '@/lib/domain/walk'
import { afterAnswer, afterOutcome, normalise } from '@/lib/domain/walk-odds'
import { bestByCost, safetyRule, settledRule } from '@/lib/domain/walk-rules'
import { coldEvidence, shareEvidence, type Evidence } from '@/lib/domain/walk-suspects'
import { figure, walked, type Entry } from '@/tests/factories/walk'

function oddsOf(weights: Evidence): Odds {
  const zero = Object.fromEntries(suspectIds.map((id) => [id, 0])) as Odds
  return { ...zero, ...weights }
}

const next = (entries: Entry[], from: readonly Step[] = steps) => nextStep(walked(entries), from)

describe('the odds of a walk', () => {
  const start = startWalk({ trouble: 'slow' }).odds

  it('start from what stops water only where water has stopped', () => {
    expect(startWalk({ trouble: 'no flow' }).start).toEqual(normalise(defaultPriors['no flow']))
    expect(startWalk({ trouble: 'unread' }).start).toEqual(normalise(defaultPriors.slow))
  })

  it('are moved by the answer that was given, and by no other', () => {
    const bubbles = stepOf('look-hose')?.answers.find(({ answer }) => answer === 'choice-2')
    expect(walked([['look-hose', 'choice-2']]).odds).toEqual(afterAnswer(start, bubbles ?? {}))
    expect(walked([['look-hose', 'not done']]).odds).toEqual(start)
  })

  it('are moved by a cure only once somebody knows what it did', () => {
    const wash = stepOf('wash-fibre') as Step
    expect(walked([['wash-fibre', 'done']]).odds).toEqual(start)
    expect(walked([['wash-fibre', 'not cured']]).odds).toEqual(
      afterOutcome(start, wash, 'not cured'),
    )
  })

  it.each([
    [18, { 'cold-water': 0.02 }],
    [17.9, {}],
    [10.1, {}],
    [10, { 'cold-water': 4 }],
  ])('at %d °C hold this against the cold: %o', (celsius, evidence) => {
    expect(coldEvidence(celsius)).toEqual(evidence)
  })

  it('look to air and hose where under 15 % of the water comes', () => {
    expect(Object.keys(shareEvidence(0.149))).toContain('air-lock')
    expect(shareEvidence(0.15)).toEqual({ 'cold-water': 0.1 })
  })
})

describe('what is settled', () => {
  it('is an end, told against the model where there was no first reading', () => {
    const nominal = { ...figure(1.5), against: 'nominal' as const }
    const tried = [{ stepId: 'ask-flow', answer: 'done' as const, at: 0, recovery: nominal }]
    const why = "150 % of the model's nominal flow is too fast: water may pass a breach."
    expect(settledRule({ odds: defaultPriors.slow, tried, from: steps })).toEqual({
      kind: 'end',
      end: 'stop using',
      why,
    })
  })
})

describe('the safety question', () => {
  const position = (chance: number) => ({
    odds: oddsOf({ 'cracked-fibre': chance }),
    tried: [],
    from: steps,
  })

  it('is put from one in ten on, and says so', () => {
    expect(safetyRule(position(0.1))).toMatchObject({
      step: { id: 'check-cracks' },
      why: 'Safety first: a crack is unlikely, 1 in 10.',
    })
    expect(safetyRule(position(0.099))).toBeNull()
  })
})

describe('the figure', () => {
  it.each<{ what: string; entries: Entry[]; asked: string }>([
    {
      what: 'is asked for again when the first answer had none',
      entries: [['ask-flow', 'done']],
      asked: 'ask-flow',
    },
    {
      what: 'is given up after two answers without one',
      entries: [
        ['ask-flow', 'done'],
        ['ask-flow', 'done'],
      ],
      asked: 'wash-fibre',
    },
    {
      what: 'of a wash is asked for again once',
      entries: [
        ['ask-flow', 'done', 0.33],
        ['wash-fibre', 'done'],
        ['ask-flow', 'done'],
      ],
      asked: 'ask-flow',
    },
    {
      what: 'of a wash is given up after two answers without one',
      entries: [
        ['ask-flow', 'done', 0.33],
        ['wash-fibre', 'done'],
        ['ask-flow', 'done'],
        ['ask-flow', 'done'],
      ],
      asked: 'wash-fibre',
    },
    {
      what: 'of a wash that failed by their word is not asked for twice',
      entries: [
        ['ask-flow', 'done', 0.33],
        ['wash-fibre', 'not cured'],
        ['ask-flow', 'done'],
      ],
      asked: 'wash-fibre',
    },
    {
      what: 'that is better leads to another wash',
      entries: [
        ['ask-flow', 'done', 0.33],
        ['wash-fibre', 'done', 0.5],
      ],
      asked: 'wash-fibre',
    },
    {
      what: 'after another cure is no wash that failed',
      entries: [
        ['bleed-air', 'done', 0.3],
        ['wash-fibre', 'done', 0.33],
      ],
      asked: 'wash-fibre',
    },
  ])('$what', ({ entries, asked }) => {
    expect(next(entries)).toMatchObject({ kind: 'step', step: { id: asked } })
  })

  it('of the last two washes is what the line tells of', () => {
    const three: Entry[] = [
      ['wash-fibre', 'done', 0.38],
      ['wash-fibre', 'done', 0.33],
      ['wash-fibre', 'done', 0.3],
    ]
    expect(next(three).why).toMatch(/^Two washes in a row left 33 %, then 30 % of the flow/)
  })
})

describe('a catalogue that lacks a step, or has it once', () => {
  it('is walked without it', () => {
    expect(next([], [])).toMatchObject({
      end: 'visit',
      why: 'No step by text is worth its trouble. Fibre fouled: likely, 5 in 10; it needs eyes and hands.',
    })
    const once = steps.map((step) => (step.id === 'ask-flow' ? { ...step, tries: 1 } : step))
    expect(next([['ask-flow', 'done']], once)).toMatchObject({ step: { id: 'wash-fibre' } })
  })
})

describe('the end that the odds point to', () => {
  const tried = walked([['rinse-cloth', 'not cured']]).tried

  it('is the stage from even odds on', () => {
    const odds = (cloth: number) => oddsOf({ 'full-cloth': cloth, 'air-lock': 0.3 })
    expect(bestByCost({ odds: odds(0.5), tried, from: [] })).toMatchObject({
      end: 'part',
      stage: 1,
    })
    expect(bestByCost({ odds: odds(0.49), tried, from: [] })).toMatchObject({ end: 'visit' })
  })

  it('is a visit for a crack, though the fibre was washed', () => {
    const washed = walked([['wash-fibre', 'partly']]).tried
    const odds = oddsOf({ 'cracked-fibre': 0.8, 'air-lock': 0.2 })
    expect(bestByCost({ odds, tried: washed, from: [] })).toEqual({
      kind: 'end',
      end: 'visit',
      why: 'No step by text is worth its trouble. Fibre cracked: likely, 8 in 10; it needs eyes and hands.',
    })
  })

  it('says what a question saves, at least a minute', () => {
    const { why } = next([
      ['ask-flow', 'done', 0.33],
      ['wash-fibre', 'not done'],
    ])
    expect(why).toBe('Asking saves about 1 minute of tries.')
    const odds = oddsOf({ 'kinked-hose': 0.4, 'air-lock': 0.4, 'full-cloth': 0.2 })
    const asking = bestByCost({ odds, tried: [], from: steps })
    const minutes = Number(/about (\d+) minutes/.exec(asking.why)?.[1])
    expect(asking).toMatchObject({ step: { id: 'look-hose' } })
    expect(minutes).toBeGreaterThan(1)
  })
})
