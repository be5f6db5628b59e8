import { describe, expect, it } from 'vitest'
import { harmOf, type HarmInput } from '@/lib/domain/harm'
import { languages, type Language } from '@/lib/domain/language'

/** Tuesday, 3 March 2026, 12:10 in Lima (UTC−5). */
const now = Date.UTC(2026, 2, 3, 17, 10)
const hour = 3_600_000

const slow: HarmInput = {
  trouble: 'slow',
  house: { people: 6, infant: true, pregnant: false, elderly: false, ill: false },
  outOfService: false,
  noSafeWaterSince: null,
  need: 'slow',
  litresPerHour: 4.6,
  errorLitresPerHour: 0.5,
  litresPerDay: 37.1,
  hours: 8 + 5 / 60,
  openedAt: now - 5.5 * hour,
  now,
  timeZone: 'America/Lima',
}
const stopped = { outOfService: true, noSafeWaterSince: Date.UTC(2026, 2, 2, 23, 20) }
const everyone = { people: 6, infant: true, pregnant: true, elderly: true, ill: true }

const one: Record<string, Partial<HarmInput>> = {
  sign: { trouble: 'danger sign' },
  'sign, told': { trouble: 'danger sign', toldToGo: true },
  unwell: { trouble: 'unwell' },
  'nothing safe': stopped,
  'nothing safe, everyone': { ...stopped, house: everyone },
  unsafe: { trouble: 'unsafe' },
  'no water': { trouble: 'no flow' },
  slow: {},
  'slow, not timed': { litresPerHour: null },
  'slow, not in a day': { need: 'short', hours: 25 },
  'slow but enough': { need: 'enough' },
  unread: { trouble: 'unread' },
  silent: { trouble: 'silent', openedAt: now - 3 * 24 * hour },
}

const sentenceIn = (language: Language, change: Partial<HarmInput>) =>
  harmOf({ ...slow, ...change, language }).sentence

describe('the sentence of the shift in the language of who reads it', () => {
  it.each<[Language, keyof typeof one, string]>([
    ['en', 'nothing safe', '6 people, an infant; nothing safe since yesterday 18:20.'],
    ['es', 'nothing safe', '6 personas, un bebé; nada seguro que beber desde ayer 18:20.'],
    ['fr', 'nothing safe', '6 personnes, un nourrisson ; rien de sûr à boire depuis hier 18:20.'],
    ['bn', 'nothing safe', '৬ জন, একটি শিশু; নিরাপদ পানি নেই, গতকাল ১৮:২০ থেকে।'],
    ['es', 'slow', '6 personas; 4.6 ± 0.5 L por hora a 20 °C, necesitan 37 L al día: 8 h 05.'],
    [
      'fr',
      'slow',
      '6 personnes ; 4.6 ± 0.5 L par heure à 20 °C, il leur faut 37 L par jour : 8 h 05.',
    ],
    ['bn', 'slow', '৬ জন; ২০ °সে-তে ঘণ্টায় ৪.৬ ± ০.৫ লি, দিনে ৩৭ লি লাগে: ৮ ঘণ্টা ০৫।'],
    ['es', 'silent', '6 personas; sin respuesta desde sábado 12:10.'],
    ['fr', 'silent', '6 personnes ; pas de réponse depuis samedi 12:10.'],
  ])('%s, %s', (language, which, sentence) => {
    expect(sentenceIn(language, one[which] ?? {})).toBe(sentence)
  })

  it.each(languages.filter((language) => language !== 'en'))(
    'in %s says each thing differently, and none of them in English',
    (language) => {
      const said = Object.values(one).map((change) => sentenceIn(language, change))
      expect(new Set(said).size).toBe(said.length)
      for (const [at, change] of Object.values(one).entries()) {
        expect(said[at]).not.toBe(sentenceIn('en', change))
        expect(said[at]).not.toMatch(/people|since|yesterday|water|health worker|needs/)
      }
    },
  )

  it('stands in the same class and band whoever reads it', () => {
    for (const change of Object.values(one)) {
      const { sentence: _, ...place } = harmOf({ ...slow, ...change })
      for (const language of languages) {
        expect(harmOf({ ...slow, ...change, language })).toMatchObject(place)
      }
    }
  })

  it('writes Bengali figures throughout', () => {
    for (const change of Object.values(one)) expect(sentenceIn('bn', change)).not.toMatch(/\d/)
  })
})
