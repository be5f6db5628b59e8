import { describe, expect, it } from 'vitest'
import { bn } from '@/lib/domain/first-wordings/bn'
import { en } from '@/lib/domain/first-wordings/en'
import { es } from '@/lib/domain/first-wordings/es'
import { fr } from '@/lib/domain/first-wordings/fr'
import { languages, type Language } from '@/lib/domain/language'
import { momentInfo, moments, type Moment } from '@/lib/domain/moments'
import { renderWording, segmentsOf, valuesIn } from '@/lib/domain/wording'
import { checkDraft } from '@/lib/domain/wording-checks'
import { exampleValues, partsOf } from '@/lib/domain/wording-examples'

const editions = { en, es, fr, bn }

const every = languages.flatMap((language) =>
  editions[language].map((wording) => ({ language, ...wording })),
)

function bodyOf(moment: Moment, language: Language): string {
  return editions[language].find((wording) => wording.moment === moment)?.body ?? ''
}

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

  it.each(every)('$moment in $language never asks for a word of the carrier', ({ body }) => {
    const carriers = /\b(YES|NO(?! WATER| SALE)|CANCEL|END|QUIT|INFO|HELP|UNSUBSCRIBE|REVOKE)\b/
    expect(body).not.toMatch(carriers)
  })

  it('names the ways out and back only where they belong', () => {
    const naming = (word: RegExp) =>
      new Set(every.filter(({ body }) => word.test(body)).map(({ moment }) => moment))
    expect(naming(/\bSTART\b/)).toEqual(new Set(['stopped']))
    expect(naming(/\bSTOP\b/)).toEqual(new Set(['welcome', 'started', 'help', 'stop-or-stopped']))
  })

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

  it.each([
    ['en', 'health worker'],
    ['es', 'centro de salud'],
    ['fr', 'agent de santé'],
    ['bn', 'স্বাস্থ্যকর্মী'],
  ] as const)('sends who is unwell to the health worker in %s', (language, words) => {
    expect(bodyOf('unwell', language)).toContain(words)
    expect(bodyOf('unwell-now', language)).toContain(words)
  })

  it.each([
    ['en', /lid.+children.+fuel or chemicals/],
    ['es', /tapa.+niños.+gasolina ni veneno/],
    ['fr', /couvercle.+enfants.+essence ni produit chimique/],
    ['bn', /ঢেকে.+শিশু.+তেল বা রাসায়নিক/],
  ] as const)('gives the cautions of boiling in %s', (language, cautions) => {
    expect(bodyOf('drink-advice', language)).toMatch(cautions)
    expect(valuesIn(bodyOf('drink-advice', language), language)).toContain('minutes')
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
