import { describe, expect, it } from 'vitest'
import { bn } from '@/lib/domain/first-wordings/bn'
import { en } from '@/lib/domain/first-wordings/en'
import { es } from '@/lib/domain/first-wordings/es'
import { fr } from '@/lib/domain/first-wordings/fr'
import { languages } from '@/lib/domain/language'
import { momentInfo, type Moment } from '@/lib/domain/moments'
import { readReply, type ReplyKind } from '@/lib/domain/reply'

const editions = { en, es, fr, bn }

/** The words that the first editions ask a household to answer with. */
const askedFor: { kind: ReplyKind; moments: Moment[]; words: Record<string, string> }[] = [
  {
    kind: 'done',
    moments: ['wash-due', 'wash-nudge', 'change-due', 'change-nudge'],
    words: { en: 'DONE', es: 'LISTO', fr: 'FAIT', bn: 'শেষ' },
  },
  {
    kind: 'slow',
    moments: ['wash-due', 'wash-nudge'],
    words: { en: 'SLOW', es: 'LENTO', fr: 'LENT', bn: 'ধীর' },
  },
  {
    kind: 'not-yet',
    moments: ['wash-nudge'],
    words: { en: 'LATER', es: 'LUEGO', fr: 'PLUS TARD', bn: 'পরে' },
  },
  {
    kind: 'need-part',
    moments: ['change-due', 'change-nudge'],
    words: { en: 'NEED PART', es: 'NECESITO PIEZA', fr: 'BESOIN PIECE', bn: 'পার্টস লাগবে' },
  },
  {
    kind: 'no-flow',
    moments: ['ask-flow', 'stop-or-stopped'],
    words: { en: 'NO WATER', es: 'NO SALE AGUA', fr: "PAS D'EAU", bn: 'পানি নাই' },
  },
]

const cases = askedFor.flatMap(({ kind, moments, words }) =>
  moments.flatMap((moment) =>
    languages.map((language) => ({ kind, moment, language, word: words[language] ?? '' })),
  ),
)

describe('what a text asks to be answered with is read as meant', () => {
  it.each(cases)('$word to $moment in $language is $kind', ({ kind, moment, language, word }) => {
    const body = editions[language].find((wording) => wording.moment === moment)?.body
    expect(body).toContain(word)
    const asked = momentInfo(moment)?.asked ?? 'none'
    expect(readReply({ text: word, language, asked })).toMatchObject({ kind })
  })

  it.each(languages)('a bare number answers every question for the flow in %s', (language) => {
    for (const moment of [
      'first-flush',
      'flow-check',
      'ask-flow',
      'ask-again',
      'step-wash-fibre',
    ]) {
      const asked = momentInfo(moment)?.asked ?? 'none'
      expect(readReply({ text: '12', language, asked })).toMatchObject({
        kind: 'flow-figure',
        minutes: 12,
      })
    }
  })
})
