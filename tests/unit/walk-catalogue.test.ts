import { describe, expect, it } from 'vitest'
import { en } from '@/lib/domain/first-wordings/en'
import { defaultPriors, steps, type Step } from '@/lib/domain/walk'
import { catalogueProblems, checkedCatalogue, unwordedSteps } from '@/lib/domain/walk-check'

const priors = defaultPriors

function changed(id: string, change: Partial<Step>): Step[] {
  return steps.map((step) => (step.id === id ? { ...step, ...change } : step))
}

describe('the catalogue of steps', () => {
  it('is sound', () => {
    expect(catalogueProblems({ steps, priors })).toEqual([])
    expect(checkedCatalogue({ steps, priors })).toBe(steps)
  })

  it('is worded in the first language', () => {
    expect(unwordedSteps(new Set(en.map(({ moment }) => moment)))).toEqual([])
    expect(unwordedSteps(new Set(['ask-flow', 'ask-again']))).toContain('wash-fibre')
  })

  it.each<{ what: string; steps: readonly Step[]; problem: string }>([
    {
      what: 'a step that costs too much ever to be next',
      steps: changed('refit-cap', { minutes: 900 }),
      problem: 'refit-cap: can never be the next step',
    },
    {
      what: 'a question that tells nothing',
      steps: changed('look-hose', {
        answers: [
          { answer: 'choice-1', label: 'a', chance: {}, otherwise: 0.5 },
          { answer: 'choice-2', label: 'b', chance: {}, otherwise: 0.5 },
        ],
      }),
      problem: 'look-hose: can never be the next step',
    },
    {
      what: 'a loop',
      steps: changed('bleed-air', { tries: Infinity }),
      problem: 'bleed-air: could be asked without end',
    },
    {
      what: 'a step without tries',
      steps: changed('bleed-air', { tries: 0 }),
      problem: 'bleed-air: could be asked without end',
    },
    {
      what: 'a step that takes no time',
      steps: changed('bleed-air', { minutes: 0 }),
      problem: 'bleed-air: costs no time',
    },
    {
      what: 'a suspect that nothing cures',
      steps: steps.filter(({ id }) => id !== 'straighten-hose'),
      problem: 'kinked-hose: no step cures it',
    },
    {
      what: 'no safety question',
      steps: steps.filter(({ kind }) => kind !== 'safety'),
      problem: 'no safety question',
    },
    {
      what: 'a step that the rules name',
      steps: steps.filter(({ id }) => id !== 'ask-again'),
      problem: 'ask-again: missing, and the rules of the walk name it',
    },
    {
      what: 'two steps of one name',
      steps: [...steps, ...steps.slice(0, 1)],
      problem: 'ask-flow: name is not its own',
    },
    {
      what: 'a name in another style',
      steps: changed('bleed-air', { id: 'BleedAir' }),
      problem: 'BleedAir: name is not kebab-case',
    },
    {
      what: 'a moment that is none',
      steps: changed('bleed-air', { moment: 'step-shake' as Step['moment'] }),
      problem: 'bleed-air: no such moment: step-shake',
    },
    {
      what: 'a step that nobody can answer',
      steps: changed('bleed-air', { answers: [] }),
      problem: 'bleed-air: has no answers',
    },
    {
      what: 'two answers of one kind',
      steps: changed('bleed-air', {
        answers: [
          { answer: 'done', label: 'a' },
          { answer: 'done', label: 'b' },
        ],
      }),
      problem: 'bleed-air: has two answers of one kind',
    },
    {
      what: 'a cure that is surer than sure',
      steps: changed('bleed-air', { cures: { 'air-lock': 1.2 } }),
      problem: 'bleed-air: cures with a chance that is none',
    },
    {
      what: 'answers whose chances do not sum to 1',
      steps: changed('look-hose', {
        answers: [
          { answer: 'choice-1', label: 'a', chance: { 'kinked-hose': 0.9 }, otherwise: 0.1 },
          { answer: 'choice-2', label: 'b', chance: { 'air-lock': 0.9 }, otherwise: 0.1 },
        ],
      }),
      problem: 'look-hose: chances of its answers do not sum to 1',
    },
  ])('is refused with $what', ({ steps: broken, problem }) => {
    expect(catalogueProblems({ steps: broken, priors })).toContain(problem)
    expect(() => checkedCatalogue({ steps: broken, priors })).toThrow(problem)
  })

  it.each([
    ['bleed-the-air', true],
    ['bleed-Air', false],
    ['bleed-air-', false],
    ['bleed-air2', false],
  ])('takes the name %s: %s', (id, isTaken) => {
    const problem = `${id}: name is not kebab-case`
    const problems = catalogueProblems({ steps: changed('bleed-air', { id }), priors })
    expect(problems.includes(problem)).toBe(!isTaken)
  })

  it.each([
    [0, false],
    [1, true],
  ])('takes a cure of chance %d: %s', (chance, isTaken) => {
    const broken = changed('bleed-air', { cures: { 'air-lock': 0.8, 'cold-water': chance } })
    expect(catalogueProblems({ steps: broken, priors })).toEqual(
      isTaken ? [] : ['bleed-air: cures with a chance that is none'],
    )
  })

  it('asks chances of a question to sum to 1, though an answer has none', () => {
    const answers = [
      { answer: 'choice-1' as const, label: 'a', chance: { 'kinked-hose': 0.9 }, otherwise: 0.1 },
      { answer: 'not done' as const, label: 'b' },
    ]
    const broken = changed('look-hose', { answers })
    expect(catalogueProblems({ steps: broken, priors })).toContain(
      'look-hose: chances of its answers do not sum to 1',
    )
  })

  it('does not let the desk start when it is not sound, and says all that is wrong', () => {
    const broken = changed('bleed-air', { minutes: 0, tries: 0 })
    expect(() => checkedCatalogue({ steps: broken, priors })).toThrow(
      'The catalogue of steps is not sound: bleed-air: costs no time; bleed-air: could be asked without end',
    )
  })

  it('is refused with odds that are none', () => {
    const odds = { ...priors.slow, 'air-lock': 0 }
    expect(catalogueProblems({ steps, priors: { slow: odds } })).toEqual([
      'slow: a suspect has no odds',
      'slow: odds do not sum to 1',
    ])
  })
})
