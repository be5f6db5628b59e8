import type { Language } from './language'

/*
 * What a text may ask a household to do with its hands, as families of words: one text, one family.
 * Timing a litre and answering are how a household tells what came of it, so they do not count. The
 * words are stems; a match is a hint to the writer, not proof.
 */

export type Action =
  | 'wash'
  | 'change'
  | 'flush'
  | 'let air out'
  | 'straighten'
  | 'fill the container'
  | 'refit'
  | 'look'
  | 'stop using'
  | 'boil'
  | 'go'

type ActionWords = Record<Action, RegExp>

const stems = (words: string) => new RegExp(`(?<!\\p{L})(?:${words})`, 'u')

const actionWords: Record<Language, ActionWords> = {
  en: {
    wash: stems('wash(?!ed)|rinse(?!d)|push clean|backwash'),
    change: stems('change(?!d)|replace(?!d)|swap'),
    flush: stems('flush(?!ed)|run (?:a|1|one) litre'),
    'let air out': stems('let (?:the )?air|lift the hose|lower the hose'),
    straighten: stems('straighten|unbend|lay the hose'),
    'fill the container': stems('fill the (?:top )?container|top up'),
    refit: stems('refit|tighten|take the caps|fit (?:the|both|them)|screw'),
    look: stems('look (?:at|for|along)|inspect'),
    'stop using': stems('stop using|do not (?:use|drink)'),
    boil: stems('boil(?!ed|ing)'),
    go: stems('go to|take (?:them|the child|him|her) to|collect|come to'),
  },
  es: {
    wash: stems('lave|lava(?!do)|enjuag|empuje'),
    change: stems('cambi[ea]|reemplac|reemplaza'),
    flush: stems('deje correr|pase (?:un|1) litro'),
    'let air out': stems('saque el aire|suba la manguera|baje la manguera|levante la manguera'),
    straighten: stems('enderec|estire la manguera'),
    'fill the container': stems('llene el (?:recipiente|balde|tanque|dep)'),
    refit: stems('ajuste|apriete|vuelva a poner las tapas|quite las tapas|cierre'),
    look: stems('mire|revise'),
    'stop using': stems('no (?:use|beba|tome)|deje de usar'),
    boil: stems('hierva'),
    go: stems('vaya|lleve|recoja|pase por|venga'),
  },
  fr: {
    wash: stems('lavez|rincez|poussez'),
    change: stems('changez|remplacez'),
    flush: stems('faites (?:couler|passer)'),
    'let air out': stems('chassez l.air|levez le tuyau|baissez le tuyau'),
    straighten: stems('redressez|tendez le tuyau'),
    'fill the container': stems('remplissez le (?:seau|bac|r[eé]servoir|r[eé]cipient)'),
    refit: stems('resserrez|vissez|remettez les bouchons|[oô]tez les bouchons'),
    look: stems('regardez|cherchez|v[eé]rifiez'),
    'stop using': stems(
      'n.utilisez (?:pas|plus)|ne (?:buvez|l.utilisez) (?:pas|plus)|arr[eê]tez d.utiliser',
    ),
    boil: stems('faites (?:bien )?bouillir|bouillez'),
    go: stems('allez|emmenez|venez|passez (?:au|chez)'),
  },
  bn: {
    wash: stems('ধুয়ে|ধুয়ে|ধোন|ধুন|ঠেলে|ঠেলুন'),
    change: stems('বদলান|বদলে|পাল্টান|পাল্টে'),
    flush: stems('বইয়ে|বইয়ে|চালিয়ে দিন|চালিয়ে দিন'),
    'let air out': stems('বাতাস বের|হাওয়া বের'),
    straighten: stems('সোজা কর'),
    'fill the container': stems('(?:পাত্র|বালতি)(?:টি)? (?:পুরো )?ভর'),
    refit: stems('আঁট|শক্ত কর|আবার লাগান|ঢাকনা খুলে'),
    look: stems('দেখুন'),
    'stop using': stems('ব্যবহার করবেন না|ব্যবহার বন্ধ|খাবেন না|পান করবেন না'),
    boil: stems('ফোটান|ফুটিয়ে|ফুটিয়ে'),
    go: stems('যান(?!\\p{L})|নিয়ে যান|নিয়ে যান|আসুন|নিয়ে আসুন'),
  },
}

/** The families of action a text asks for, in the order of the list above. */
export function actionsIn(text: string, language: Language): Action[] {
  const lower = text.toLowerCase().normalize('NFC')
  const words = Object.entries(actionWords[language]) as [Action, RegExp][]
  return words.filter(([, pattern]) => pattern.test(lower)).map(([action]) => action)
}
