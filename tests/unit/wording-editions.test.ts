import { describe, expect, it } from 'vitest'
import { bn } from '@/lib/domain/first-wordings/bn'
import { en } from '@/lib/domain/first-wordings/en'
import { es } from '@/lib/domain/first-wordings/es'
import { fr } from '@/lib/domain/first-wordings/fr'
import { languages } from '@/lib/domain/language'
import { momentInfo, moments } from '@/lib/domain/moments'
import { renderWording, segmentsOf, valuesIn } from '@/lib/domain/wording'
import { checkDraft } from '@/lib/domain/wording-checks'
import { exampleValues, partsOf } from '@/lib/domain/wording-examples'

const editions = { en, es, fr, bn }

const every = languages.flatMap((language) =>
  editions[language].map((wording) => ({ language, ...wording })),
)

describe('the first edition of the wordings', () => {
  it.each(languages)('has each moment once in %s', (language) => {
    const worded = editions[language].map(({ moment }) => moment).sort()
    expect(worded).toEqual(moments.map(({ moment }) => moment).sort())
  })

  it.each(every)('$moment in $language passes every check', (wording) => {
    expect(checkDraft(wording)).toEqual([])
  })

  it.each(every)('$moment in $language is at most two parts', ({ language, body }) => {
    const parts = partsOf(body, language)
    expect(parts).toBeGreaterThanOrEqual(1)
    expect(parts).toBeLessThanOrEqual(2)
  })

  it.each(every)(
    '$moment in $language never asks for a word of the carrier',
    ({ body, moment }) => {
      const carriers = /\b(YES|NO(?! WATER| SALE)|CANCEL|END|QUIT|INFO|HELP|UNSUBSCRIBE|REVOKE)\b/
      expect(body).not.toMatch(carriers)
      if (!['stopped'].includes(moment)) expect(body).not.toMatch(/\bSTART\b/)
    },
  )

  it('fits one part in every language with the basic alphabet, but for the advice on drinking', () => {
    const long = every.filter(
      ({ language, body }) => language !== 'bn' && partsOf(body, language) > 1,
    )
    expect(new Set(long.map(({ moment }) => moment))).toEqual(new Set(['drink-advice']))
  })

  it('stays in the basic alphabet in English, Spanish and French, whatever the month', () => {
    const months = Array.from({ length: 12 }, (_, index) => String(index + 1).padStart(2, '0'))
    const dated = every.filter(
      ({ language, body }) =>
        language !== 'bn' && valuesIn(body, language).some((name) => name.endsWith('On')),
    )
    expect(dated).toHaveLength(3)
    for (const { language, body } of dated) {
      for (const month of months) {
        const day = `2026-${month}-21`
        const rendered = renderWording(body, exampleValues({ dueOn: day, visitOn: day }), language)
        expect(rendered.ok && segmentsOf(rendered.text).encoding).toBe('GSM-7')
      }
    }
  })

  it('names the health worker wherever somebody is unwell', () => {
    const words = {
      en: 'health worker',
      es: 'centro de salud',
      fr: 'agent de santé',
      bn: 'স্বাস্থ্যকর্মী',
    }
    for (const { moment, language, body } of every) {
      if (moment === 'unwell' || moment === 'unwell-now') expect(body).toContain(words[language])
    }
  })

  it('gives the cautions of boiling: cool under a lid, children, fuel and chemicals', () => {
    const cautions = {
      en: [/lid/, /children/, /fuel or chemicals/],
      es: [/tapa/, /niños/, /gasolina ni veneno/],
      fr: [/couvercle/, /enfants/, /essence ni produit chimique/],
      bn: [/ঢেকে/, /শিশু/, /তেল বা রাসায়নিক/],
    }
    for (const { moment, language, body } of every) {
      if (moment !== 'drink-advice') continue
      for (const caution of cautions[language]) expect(body).toMatch(caution)
    }
  })

  it('speaks only of values that each moment offers, and of those it needs', () => {
    for (const { moment, language, body } of every) {
      const info = momentInfo(moment)
      const used = valuesIn(body, language)
      expect(info?.values).toEqual(expect.arrayContaining(used))
      expect(used).toEqual(expect.arrayContaining([...(info?.needs ?? [])]))
    }
  })
})
