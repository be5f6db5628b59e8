import { mayText } from './consent'
import { insideWindow, nextInsideWindow, type Window } from './round-window'

/** What to do with a text whose hour has come. */
export type SendDecision =
  { kind: 'send' } | { kind: 'wait'; until: number } | { kind: 'drop'; why: string }

/** The one last word to a phone that wants no more: a confirmation, an apology. */
const lastWords: readonly string[] = ['stopped', 'wrong-number']

/**
 * Looks once more, at the moment of sending, at all that may have changed since a text was planned: a
 * consent withdrawn, a phone suspended, the sending window, the hour after which it is of no use.
 * `window` is null for a phone that belongs to no area.
 */
export function decideSend(text: {
  now: number
  sendAfter: number
  notAfter: number | null
  anyHour: boolean
  moment: string | null
  window: Window | null
  phone: Parameters<typeof mayText>[0]
}): SendDecision {
  const allowed = mayText(text.phone)
  const isLastWord = lastWords.includes(text.moment ?? '')
  const blocked = text.phone.carrierBlocked || text.phone.phoneState === 'gone'
  if (!allowed.ok && !(isLastWord && !blocked)) return { kind: 'drop', why: allowed.reason }
  if (text.notAfter !== null && text.now > text.notAfter) return { kind: 'drop', why: 'too late' }
  if (text.sendAfter > text.now) return { kind: 'wait', until: text.sendAfter }
  if (text.anyHour || text.window === null || insideWindow(text.now, text.window))
    return { kind: 'send' }
  return { kind: 'wait', until: nextInsideWindow(text.now, text.window) }
}
