/**
 * What a carrier's error code means for a text. `later`: the same text may be tried again; `never`: this
 * phone cannot be reached by it; `opted out`: the carrier blocks this phone; `gone`: the number is dead;
 * `our fault`: the text or the account is wrong and a person must look. An unknown code is `our fault`:
 * failed, never retried by itself, shown to staff.
 */
export type RefusalClass = 'later' | 'never' | 'opted out' | 'gone' | 'our fault'

// The carrier's published error dictionary.
const classes: Record<string, RefusalClass> = {
  '429': 'later',
  '20429': 'later',
  '21211': 'gone',
  '21610': 'opted out',
  '21611': 'later',
  '21612': 'never',
  '21614': 'never',
  '21635': 'never',
  '30001': 'later',
  '30003': 'later',
  '30004': 'opted out',
  '30005': 'gone',
  '30006': 'never',
  '30008': 'later',
  '30022': 'later',
  '30023': 'later',
  '30036': 'never',
  '30500': 'later',
  '63038': 'later',
}

export function classOf(code: string): RefusalClass {
  return classes[code] ?? 'our fault'
}

/**
 * How far a status has come. Receipts arrive in any order and more than once, so one is applied only if
 * it comes further than what is known. Source: the carrier's documentation, status callbacks.
 */
export function statusRank(status: string): number {
  const ranks: Record<string, number> = {
    accepted: 0,
    scheduled: 0,
    queued: 1,
    sending: 2,
    sent: 3,
    delivered: 4,
    undelivered: 4,
    failed: 4,
    canceled: 4,
    read: 5,
  }
  return ranks[status] ?? -1
}
