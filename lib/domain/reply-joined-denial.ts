import type { Language } from './language'
import { exactKeys, isWholeWord, respelledKeys } from './reply-lexicon'
import type { Token } from './reply-tokens'

/** Bengali writes its denial onto the verb as often as after it: আসেনা, হয়নি, asena, korini. */
const joined = /^(\p{L}[\p{L}\p{M}]+?)(নাই|নেই|না|নি|nai|nei|na|ni)$/u

/** Parts the denial from its verb where the verb is known and the whole word is not. */
export function partJoinedDenials(tokens: readonly Token[], own: Language): Token[] {
  return tokens.flatMap((token): Token[] => {
    const [, verb, denial] = token.kind === 'word' ? (joined.exec(token.text) ?? []) : []
    if (verb === undefined || denial === undefined) return [token]
    const isLatin = /[a-z]/.test(verb)
    if (isLatin && (own !== 'bn' || verb.length < 3)) return [token]
    // "Dhakna" (the cap) only looks like a denial: some word of the list reaches into its end.
    const reachesEnd = exactKeys(token.text, 'bn').some(
      (key) => key.endsWith('*') && key.length - 1 > verb.length,
    )
    const isKnownWhole = reachesEnd || isWholeWord(token.text, 'bn')
    const isKnownVerb =
      exactKeys(verb, 'bn').length > 0 ||
      respelledKeys(verb, 'bn').some((key) => !key.endsWith('*'))
    if (isKnownWhole || !isKnownVerb) return [token]
    return [
      { kind: 'word', text: verb },
      { kind: 'word', text: denial },
    ]
  })
}
