import { describe, expect, it } from 'vitest'
import { likelihoodWord, nextStep, startWalk, suspectIds } from '@/lib/domain/walk'
import { walked, type Entry } from '@/tests/factories/walk'

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
