/** What the first word of an address, before any + or dot, does to a letter. */
export type RecipientFate = 'accept' | 'refuse' | 'later' | 'later once'

const fates: Record<string, RecipientFate> = {
  refuse: 'refuse',
  later: 'later',
  once: 'later once',
}

/**
 * `refuse@…` is refused for good (550), `later@…` always for now (451), `once@…` for now the first time only;
 * everybody else gets their mail. `refuse.ana@…` and `refuse+2@…` count as `refuse`.
 */
export function recipientFate(address: string): RecipientFate {
  const word = /^[a-z]+/.exec(address.toLowerCase())?.[0] ?? ''
  const rest = address.slice(word.length, word.length + 1)
  return ['@', '.', '+'].includes(rest) ? (fates[word] ?? 'accept') : 'accept'
}
