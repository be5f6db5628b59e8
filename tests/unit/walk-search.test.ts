import { describe, expect, it } from 'vitest'
import { answerStep, defaultPriors, nextStep, startWalk, type SuspectId } from '@/lib/domain/walk'
import { timingMinutes, type Answer, type Step } from '@/lib/domain/walk-catalogue'
import { normalise } from '@/lib/domain/walk-odds'
import { bestChoice, expectedMinutes } from '@/lib/domain/walk-search'

function cureOf(suspect: SuspectId, totalMinutes: number, chance = 1): Step {
  return {
    id: suspect,
    name: suspect,
    kind: 'cure',
    minutes: totalMinutes - timingMinutes,
    moment: 'ask-flow',
    asks: 'step',
    tries: 1,
    cures: { [suspect]: chance },
    answers: [],
  }
}

const zero = Object.fromEntries(Object.keys(defaultPriors.slow).map((id) => [id, 0]))
const even = normalise({ ...defaultPriors.slow, ...zero, 'air-lock': 1, 'full-cloth': 1 })
const cures = [cureOf('air-lock', 100), cureOf('full-cloth', 100)]

/** Tells the two suspects apart for four minutes. */
const telling: Step = {
  ...cureOf('air-lock', 0),
  id: 'look',
  kind: 'question',
  minutes: 2,
  cures: undefined,
  answers: [
    { answer: 'choice-1', label: 'bubbles', chance: { 'air-lock': 1 }, otherwise: 0 },
    { answer: 'choice-2', label: 'none', chance: { 'air-lock': 0 }, otherwise: 1 },
  ],
}

describe('the search for the next step', () => {
  it('gives up where no cure is worth its minutes, by hand', () => {
    // Half a chance to save a visit of 150 minutes is worth 75, and the cure costs 100.
    expect(bestChoice(even, cures, 150)).toEqual({ kind: 'give up' })
    expect(expectedMinutes(even, cures, 150)).toBe(150)
  })

  it('asks where the answer makes a cure worth it, by hand', () => {
    // Asking is 4, then one cure that is sure: 104, against a visit of 150.
    const choice = bestChoice(even, [...cures, telling], 150)
    expect(choice).toMatchObject({ kind: 'question', step: { id: 'look' } })
    expect(choice).toHaveProperty('savedMinutes', 46)
  })

  it('asks first where it spares half a cure, by hand', () => {
    // Without asking: 100, then half a chance of 100 more. With: 4 and 100.
    expect(expectedMinutes(even, cures, 1_000)).toBe(150)
    expect(bestChoice(even, [...cures, telling], 1_000)).toMatchObject({
      kind: 'question',
      savedMinutes: 46,
    })
  })

  it('counts a visit for an answer that ends the walk, by hand', () => {
    // Bubbles, half of the time: a visit of 150. Else the sure cure of 100. Asking is 4.
    const [bubbles, none] = telling.answers as [Answer, Answer]
    const ends = { end: 'visit' } as const
    const ending = { ...telling, answers: [{ ...bubbles, ends }, none] }
    expect(bestChoice(even, [...cures, ending], 150)).toMatchObject({
      kind: 'question',
      savedMinutes: 150 - (4 + 150 / 2 + 100 / 2),
    })
  })

  it('does not ask what costs more than it spares', () => {
    const long = { ...telling, minutes: 60 }
    expect(bestChoice(even, [...cures, long], 1_000)).toMatchObject({ kind: 'cure', chance: 0.5 })
  })

  it('counts the visit after cures that may fail, by hand', () => {
    // One cure of half a chance on a sure suspect: 100, then half of 1,000.
    const sure = normalise({ ...defaultPriors.slow, ...zero, 'air-lock': 1 })
    expect(expectedMinutes(sure, [cureOf('air-lock', 100, 0.5)], 1_000)).toBe(600)
  })
})

describe('a walk that runs out of steps worth their trouble', () => {
  it.each([
    { suspect: 'full-cloth', stepId: 'rinse-cloth', stage: 1 },
    { suspect: 'packed-carbon', stepId: 'flush-carbon', stage: 2 },
  ] as const)(
    'changes the stage of $suspect when its own cure failed',
    ({ suspect, stepId, stage }) => {
      const priors = normalise({ ...defaultPriors.slow, [suspect]: 60 })
      const walk = [
        { stepId: 'ask-flow', answer: 'not done' as const },
        { stepId, answer: 'not cured' as const },
      ].reduce(
        (before, entry, at) => answerStep(before, { ...entry, at }),
        startWalk({ trouble: 'slow', priors }),
      )
      const next = nextStep(walk)
      expect(next).toMatchObject({ kind: 'end', end: 'part', stage })
      expect(next.why).toContain('its cure did not help, so the stage is changed.')
    },
  )
})
