import { describe, expect, it } from 'vitest'
import { languages, type Language } from '@/lib/domain/language'
import { checkDraft, type DraftNote } from '@/lib/domain/wording-checks'

type Pair = { failing: string; passing: string }
type Case = { kind: DraftNote['kind']; moment: string; drafts: Partial<Record<Language, Pair>> }

const long = (words: number, word: string) => Array.from({ length: words }, () => word).join(' ')

const cases: Case[] = [
  {
    kind: 'two actions',
    moment: 'wash-due',
    drafts: {
      en: {
        failing: 'Wash the long stage. Then change the cloth.',
        passing: 'Wash the long stage. Then time 1 litre. Text us the minutes.',
      },
      es: {
        failing: 'Lave la etapa larga. Luego cambie la tela.',
        passing: 'Lave la etapa larga. Luego mida 1 litro. Escriba los minutos.',
      },
      fr: {
        failing: 'Lavez la partie longue. Puis changez le tissu.',
        passing: 'Lavez la partie longue. Puis chronométrez 1 litre. Envoyez les minutes.',
      },
      bn: {
        failing: 'লম্বা ধাপ ধুয়ে নিন। তারপর কাপড় বদলান।',
        passing: 'লম্বা ধাপ ধুয়ে নিন। তারপর কত মিনিট লাগে লিখুন।',
      },
    },
  },
  {
    kind: 'long sentence',
    moment: 'got-it',
    drafts: {
      en: { failing: `${long(11, 'drop')}.`, passing: `${long(10, 'drop')}. ${long(10, 'rill')}.` },
      es: { failing: `${long(11, 'gota')}.`, passing: `${long(10, 'gota')}? ${long(10, 'gota')}.` },
      fr: {
        failing: `${long(11, 'goutte')} !`,
        passing: `${long(10, 'goutte')} ! ${long(9, 'eau')}`,
      },
      bn: { failing: `${long(11, 'জল')}।`, passing: `${long(10, 'জল')}। ${long(10, 'জল')}।` },
    },
  },
  {
    kind: 'claim of safety',
    moment: 'flowing',
    drafts: {
      en: {
        failing: 'Your water is safe now.',
        passing: 'The filter runs. Water is not safe to drink yet.',
      },
      es: { failing: 'El agua ya es segura.', passing: 'El agua no es segura sin filtro.' },
      fr: { failing: "L'eau est potable.", passing: "L'eau n'est pas potable sans filtre." },
      bn: { failing: 'পানি এখন নিরাপদ।', passing: 'পানি এখন নিরাপদ নয়।' },
    },
  },
  {
    kind: 'no way out',
    moment: 'welcome',
    drafts: {
      en: { failing: 'This is {programme}.', passing: 'This is {programme}. To end, send STOP.' },
      es: { failing: 'Somos {programme}.', passing: 'Somos {programme}. Para salir, mande STOP.' },
      fr: { failing: 'Ici {programme}.', passing: 'Ici {programme}. Pour finir, envoyez STOP.' },
      bn: { failing: '{programme} থেকে।', passing: '{programme} থেকে। না চাইলে STOP লিখুন।' },
    },
  },
  {
    kind: 'no programme name',
    moment: 'welcome',
    drafts: {
      en: { failing: 'To end, send STOP.', passing: '{programme}: to end, send STOP.' },
      es: { failing: 'Para salir, STOP.', passing: '{programme}: para salir, STOP.' },
      fr: { failing: 'Pour finir, STOP.', passing: '{programme} : pour finir, STOP.' },
      bn: { failing: 'না চাইলে STOP লিখুন।', passing: '{programme}: না চাইলে STOP লিখুন।' },
    },
  },
  {
    kind: 'word of the carrier',
    moment: 'wash-nudge',
    drafts: {
      en: { failing: 'Washed? Text YES.', passing: 'Washed? Text DONE. It will end well: yes.' },
      es: { failing: 'Para otra fecha, CANCEL.', passing: 'Para otra fecha, LUEGO.' },
      fr: { failing: 'Fini ? Envoyez END.', passing: 'Fini ? Envoyez FAIT.' },
      bn: { failing: 'হলে লিখুন QUIT।', passing: 'হলে লিখুন শেষ।' },
    },
  },
  {
    kind: 'letter halves the room',
    moment: 'got-it',
    drafts: {
      en: { failing: 'We’ll write soon.', passing: "We'll write soon." },
      es: {
        failing: 'Le escribirá alguien más tarde.',
        passing: 'Alguien le escribe mañana. ¿Puede? ¡Qué bien!',
      },
      fr: { failing: 'Nous avons reçu votre message.', passing: 'Nous avons noté à quelle heure.' },
    },
  },
  {
    kind: 'unknown value',
    moment: 'got-it',
    drafts: {
      en: { failing: 'Thank you, {name}.', passing: 'Thank you, {house}.' },
      es: { failing: 'Gracias, {nombre}.', passing: 'Gracias, {house}.' },
      fr: { failing: 'Merci, {nom}.', passing: 'Merci, {house}.' },
      bn: { failing: 'ধন্যবাদ, {name}।', passing: 'ধন্যবাদ, {house}।' },
    },
  },
  {
    kind: 'missing value',
    moment: 'visit-booked',
    drafts: {
      en: { failing: 'We visit soon.', passing: 'We visit on {visitOn}.' },
      es: { failing: 'Le visitamos pronto.', passing: 'Le visitamos el {visitOn}.' },
      fr: { failing: 'Nous passons voir.', passing: 'Nous passons le {visitOn}.' },
      bn: { failing: 'আমরা আসব।', passing: 'আমরা {visitOn} আসব।' },
    },
  },
  {
    kind: 'too many parts',
    moment: 'got-it',
    drafts: {
      en: { failing: 'a'.repeat(307), passing: 'a'.repeat(306) },
      es: { failing: 'ñ'.repeat(307), passing: 'ñ'.repeat(306) },
      fr: { failing: 'é'.repeat(307), passing: 'é'.repeat(306) },
      bn: { failing: 'ক'.repeat(135), passing: 'ক'.repeat(134) },
    },
  },
  {
    kind: 'empty',
    moment: 'got-it',
    drafts: Object.fromEntries(
      languages.map((language) => [language, { failing: ' \n', passing: '{programme}' }]),
    ),
  },
  {
    kind: 'bad message',
    moment: 'got-it',
    drafts: {
      en: { failing: 'Thank you, {house', passing: 'Thank you, {house}' },
      es: { failing: 'Gracias {house, plural}', passing: 'Gracias {house}' },
      fr: { failing: "Merci l'{house}", passing: "Merci l''{house}" },
      bn: { failing: 'ধন্যবাদ {}', passing: 'ধন্যবাদ {house}' },
    },
  },
]

const blocking: DraftNote['kind'][] = [
  'claim of safety',
  'no way out',
  'no programme name',
  'word of the carrier',
  'unknown value',
  'missing value',
  'too many parts',
  'empty',
  'bad message',
]

const drafts = cases.flatMap(({ kind, moment, drafts: byLanguage }) =>
  languages.flatMap((language) => {
    const pair = byLanguage[language]
    return pair ? [{ kind, moment, language, ...pair }] : []
  }),
)

describe('the checks on a draft', () => {
  it.each(drafts)('$kind in $language', ({ kind, moment, language, failing, passing }) => {
    const notes = checkDraft({ moment, language, body: failing })
    const note = notes.find((one) => one.kind === kind)
    expect(note?.detail).toBeTruthy()
    expect(note?.blocks).toBe(blocking.includes(kind))
    const kinds = checkDraft({ moment, language, body: passing }).map((one) => one.kind)
    expect(kinds).not.toContain(kind)
  })

  it('refuse a value that the moment does not know, though another does', () => {
    expect(checkDraft({ moment: 'got-it', language: 'en', body: 'Come to {depot}.' })).toEqual([
      { kind: 'unknown value', detail: '{depot} is not known at this moment.', blocks: true },
    ])
  })

  it('look at the words for every stage', () => {
    const body =
      'Change the {stage, select, 1 {cloth} 2 {carbon that is perfectly safe} other {long one}}.'
    const notes = checkDraft({ moment: 'change-due', language: 'en', body })
    expect(notes).toEqual([
      { kind: 'claim of safety', detail: '"safe" promises too much.', blocks: true },
    ])
  })

  it('name the letter and the sentence', () => {
    const notes = checkDraft({
      moment: 'got-it',
      language: 'es',
      body: 'Gracias. Mañana le escribirá una persona de la oficina para ver su filtro de agua.',
    })
    expect(notes.map(({ detail }) => detail)).toEqual([
      '14 words: Mañana le escribirá una persona de la oficina para ver su filtro de agua',
      'á: 70 units a part, not 160.',
    ])
  })

  it('do not mind Bengali letters in Bengali', () => {
    expect(checkDraft({ moment: 'got-it', language: 'bn', body: 'ধন্যবাদ।' })).toEqual([])
  })
})
