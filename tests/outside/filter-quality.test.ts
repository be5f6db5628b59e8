/*
 * CHECKS section 4: how good a filter is.
 * [C] read in a copy of the source · [M] from memory of a published source · [D] by arithmetic.
 */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  effectiveLogReduction,
  logReduction,
  logReductionOfCounts,
  performanceStars,
} from '@/lib/domain/filter-grade'
import { checkDraft } from '@/lib/domain/wording-checks'

describe('the log reduction', () => {
  // Definition, -log10(1 - P/100) [C]
  it.each([
    [99.999, 5],
    [99.9, 3],
  ])('of %d per cent is %d', (percent, logs) => {
    expect(logReduction(percent)).toBeCloseTo(logs, 9)
  })

  // Worked example of counts [C]: reported rounded down
  it('from 580 to 0.725 is 2.903, reported as 2', () => {
    const { exact, removedPercent, reported } = logReductionOfCounts({ before: 580, after: 0.725 })
    expect(exact).toBeCloseTo(2.903, 3)
    expect(removedPercent).toBeCloseTo(99.875, 9)
    expect(reported).toBe(2)
  })
})

// WHO, Evaluating household water treatment options (2011) [M]
describe('the stars', () => {
  it.each([
    [{ bacteria: 6, viruses: 0, protozoa: 6 }, 1],
    [{ bacteria: 4, viruses: 5, protozoa: 4 }, 3],
    [{ bacteria: 4, viruses: 4.99, protozoa: 4 }, 2],
    [{ bacteria: 2, viruses: 3, protozoa: 1.9 }, 1],
    [{ bacteria: 6, viruses: 2, protozoa: 1 }, 0],
  ])('of %o are %d', (reductions, stars) => {
    expect(performanceStars(reductions)).toBe(stars)
  })

  it('are never an average: more of one class does not lift the stars past a class that fails', () => {
    const failing = { bacteria: 2, viruses: 2.9, protozoa: 1.9 }
    expect(performanceStars({ ...failing, bacteria: 9 })).toBe(performanceStars(failing))
  })
})

// After Brown and Clasen 2012 (adherence) [D]
describe('the log reduction of all the water drunk', () => {
  it.each([
    [4, 0.9, 0.99961],
    [6, 0.5, 0.30103],
  ])('of %d logs over %d of it is %d', (logs, treatedShare, effective) => {
    expect(effectiveLogReduction({ logReduction: logs, treatedShare })).toBeCloseTo(effective, 5)
  })

  it('never exceeds what the untreated share allows', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 12, noNaN: true }),
        fc.double({ min: 0.01, max: 0.99, noNaN: true }),
        (logs, treatedShare) => {
          const effective = effectiveLogReduction({ logReduction: logs, treatedShare })
          expect(effective).toBeLessThanOrEqual(-Math.log10(1 - treatedShare) + 1e-12)
          expect(effective).toBeLessThanOrEqual(logs + 1e-12)
        },
      ),
      { seed: 41 },
    )
  })
})

// CDC, guide to household water treatment [C]: 0.1 µm does not reliably stop viruses, nor chemicals
describe('a wording', () => {
  it.each([
    'The filter makes your water safe from everything.',
    'Your water is 100 % clean now.',
    'This is pure water.',
  ])('may not say: %s', (body) => {
    const notes = checkDraft({ moment: 'got-it', language: 'en', body })
    expect(notes).toContainEqual(expect.objectContaining({ kind: 'claim of safety', blocks: true }))
  })

  it('may say what is known of the filter', () => {
    const notes = checkDraft({
      moment: 'got-it',
      language: 'en',
      body: 'Your filter is running well.',
    })
    expect(notes.filter(({ kind }) => kind === 'claim of safety')).toEqual([])
  })
})
