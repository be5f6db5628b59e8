import type { Language } from './language'

/*
 * Words that promise what nobody here can know: that water is safe, pure or free of germs. Matched
 * in lower case. A denial ("not safe") is no claim; the words that deny stand before or, in Bengali,
 * after the claim. `\b` knows only ASCII letters, so that edges are spelled out with lookarounds.
 */

type ClaimWords = { claims: RegExp; denialBefore?: RegExp; denialAfter?: RegExp }

const edge = (words: string) => new RegExp(`(?<!\\p{L})(?:${words})(?![\\p{L}\\p{M}])`, 'gu')

const full = '100 ?%|100 percent'

const claimWords: Record<Language, ClaimWords> = {
  en: {
    claims: edge(
      `safe|safely|pure|purified|germ-?free|germ free|no germs|kills? (?:all|every)|guaranteed?|guarantees|risk-?free|drinkable|harmless|${full}`,
    ),
    denialBefore: /(?<!\p{L})(?:not|never|no|cannot|can't|isn't|nor|without)(?: \p{L}+){0,2} ?$/u,
  },
  es: {
    claims: edge(
      `segur[oa]s?|potables?|pur[oa]s?|purificad[oa]s?|sin (?:g[eé]rmenes|microbios|bacterias)|garantizad[oa]s?|garantizamos|inofensiv[oa]s?|apta para beber|sin riesgos?|100 por ciento|${full}`,
    ),
    denialBefore: /(?<!\p{L})(?:no|nunca|ni|jam[aá]s)(?: \p{L}+){0,2} ?$/u,
  },
  fr: {
    claims: edge(
      `sûre?s?|sures?|potables?|pure?s?|purifi[eé]e?s?|sans (?:germes?|microbes?|danger|risques?)|garantie?s?|garantissons|inoffensi(?:f|ve)s?|saine?s?|100 pour cent|${full}`,
    ),
    denialBefore: /(?<!\p{L})(?:pas|jamais|ni|non)(?: \p{L}+){0,2} ?$/u,
  },
  bn: {
    claims:
      /নিরাপদ|বিশুদ্ধ|খাঁটি|জীবাণুমুক্ত|জীবাণু মুক্ত|জীবাণু নেই|গ্যারান্টি|ঝুঁকিমুক্ত|ঝুঁকি নেই|পানযোগ্য|(?:১০০|100) ?(?:%|ভাগ)/gu,
    denialAfter: /^ ?(?:\S+ )?(?:নয়|নয়|না|নাও|নেই)(?!\p{L})/u,
  },
}

/** The claims of safety in a text, as written. */
export function claimsOfSafety(text: string, language: Language): string[] {
  const { claims, denialBefore, denialAfter } = claimWords[language]
  const lower = text.toLowerCase().normalize('NFC')
  return [...lower.matchAll(claims)]
    .filter((match) => {
      const before = lower.slice(0, match.index)
      const after = lower.slice(match.index + match[0].length)
      return !denialBefore?.test(before) && !denialAfter?.test(after)
    })
    .map(([claim]) => claim)
}
