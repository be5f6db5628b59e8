/*
 * CHECKS section 6: care of the filter. All of it is common practice of the trade, no source [P].
 */
import { describe, expect, it } from 'vitest'
import { firstModelStages } from '@/db/queries/reference'
import { nextChangeOn } from '@/lib/domain/cycle'
import { en } from '@/lib/domain/first-wordings/en'
import { es } from '@/lib/domain/first-wordings/es'
import { fr } from '@/lib/domain/first-wordings/fr'
import { bn } from '@/lib/domain/first-wordings/bn'
import { isSpent, recovery } from '@/lib/domain/flow'
import type { Moment } from '@/lib/domain/moments'
import { readReply } from '@/lib/domain/reply'
import { stepOf } from '@/lib/domain/walk'

const bodyOf = (wordings: typeof en, moment: Moment) =>
  wordings.find((wording) => wording.moment === moment)?.body ?? ''

describe('the first wordings', () => {
  it.each([
    ['English', en, /\b10\b/],
    ['Spanish', es, /\b10\b/],
    ['French', fr, /\b10\b/],
    ['Bengali', bn, /10|১০/],
  ] as const)('in %s ask for ten strokes of the syringe', (_, wordings, ten) => {
    expect(bodyOf(wordings, 'wash-due')).toMatch(ten)
    expect(bodyOf(wordings, 'step-wash-fibre')).toMatch(ten)
  })

  it('ask for both ends, and for clean water', () => {
    expect(bodyOf(en, 'step-wash-fibre')).toMatch(/each (end|side)/)
    expect(bodyOf(en, 'step-wash-fibre')).toContain('clean water')
  })

  it.each([
    ['English', en, /Flush it with 1 litre/],
    ['Spanish', es, /correr 1 litro por ella/],
    ['French', fr, /couler 1 litre à travers/],
    ['Bengali', bn, /খুলে 1 লিটার পানি চালিয়ে/],
  ] as const)('in %s run a litre through new carbon', (_, wordings, litre) => {
    expect(bodyOf(wordings, 'step-flush-carbon')).toMatch(litre)
  })

  it('run it off the other stages, and until it is clear where the carbon is new', () => {
    expect(bodyOf(en, 'step-flush-carbon')).toMatch(/take off the carbon stage.*Flush it/)
    expect(bodyOf(en, 'first-flush')).toMatch(/must run clear first\. Flush 1 litre/)
  })

  it('ask who still has slow water to say so, so that the washing goes on', () => {
    expect(bodyOf(en, 'wash-due')).toMatch(/Still slow\? Text SLOW/)
  })
})

describe('stages', () => {
  it.each([
    ['cloth', 1, '2025-02-28'],
    ['carbon', 3, '2025-04-30'],
    ['fibre', 12, '2026-01-31'],
  ] as const)(
    '%s fitted on 31 January is changed after %i months, on %s',
    (kind, months, dueOn) => {
      const changeMonths = firstModelStages.find((stage) => stage.kind === kind)?.changeMonths ?? 0
      expect(changeMonths).toBe(months)
      expect(nextChangeOn({ fittedOn: '2025-01-31', changeMonths })).toBe(dueOn)
    },
  )

  it('that are washed are the cloth and the fibre; carbon is flushed', () => {
    const washed = firstModelStages.filter((stage) => stage.washed).map(({ kind }) => kind)
    expect(washed).toEqual(['cloth', 'fibre'])
  })

  it('whose flow does not come back after washing are spent, however young', () => {
    // A month-old fibre of 15 L/h that gives 4 after each of two washes.
    const wash = recovery({ flow: 4, first: 15, nominal: 18 })
    expect(isSpent([wash, wash])).toBe('spent')
  })

  it.each(['the fibre froze last night', 'I dropped the filter', 'the cap is cracked'])(
    'that may be broken are never walked through: %s',
    (text) => {
      expect(readReply({ text, language: 'en', asked: 'none' }).kind).toBe('broken')
    },
  )

  it.each([
    ['choice-1', /crack/i],
    ['choice-2', /fell or froze/i],
  ] as const)('of which that is seen (%s) are used no more', (answer, label) => {
    const seen = stepOf('check-cracks')?.answers.find((one) => one.answer === answer)
    expect(seen?.label).toMatch(label)
    expect(seen?.ends).toEqual({ end: 'stop using' })
  })
})
