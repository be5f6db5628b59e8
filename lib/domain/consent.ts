import { TZDate } from '@date-fns/tz'
import { parseISO } from 'date-fns'

/**
 * Who may be texted, and the single words by which a carrier itself opts a phone in or out.
 * Plain-language opt-outs ("please stop texting me") are read by `readReply`.
 */

/** 47 CFR 64.1200(a)(10) plus the carrier's own list (STOPALL, OPTOUT). */
const stopKeywords: ReadonlySet<string> = new Set([
  'stop',
  'stopall',
  'unsubscribe',
  'end',
  'quit',
  'revoke',
  'optout',
  'cancel',
])

/** YES is on the carrier's list too but never re-subscribes anyone here. */
const startKeywords: ReadonlySet<string> = new Set(['start', 'unstop'])

const helpKeywords: ReadonlySet<string> = new Set(['help', 'info'])

/** A question mark is not trimmed: "end?" asks, it does not order. */
function bareKeyword(text: string): string {
  const folded = text
    .normalize('NFKC')
    .toLowerCase()
    .replace(/[\u200b-\u200f\u2060\ufeff]/g, '')
  const trimmed = folded.replace(/^[\s.,!;:"'“”‘’*#()[\]_-]+|[\s.,!;:"'“”‘’*#()[\]_-]+$/gu, '')
  return trimmed.replace(/^opt[\s-]+out$/, 'optout').replace(/^stop[\s-]+all$/, 'stopall')
}

/** True for the carrier's single opt-out words, whatever their case or trailing full stops. */
export function isStopKeyword(text: string): boolean {
  return stopKeywords.has(bareKeyword(text))
}

/** True for START and UNSTOP only: YES is an answer, never a new consent. */
export function isStartKeyword(text: string): boolean {
  return startKeywords.has(bareKeyword(text))
}

/** True for the carrier's single help words. */
export function isHelpKeyword(text: string): boolean {
  return helpKeywords.has(bareKeyword(text))
}

export type Consent = 'none' | 'given' | 'withdrawn'
export type PhoneState = 'active' | 'suspended' | 'gone'
export type MayText =
  | { ok: true }
  | { ok: false; reason: 'no consent' | 'withdrawn' | 'suspended' | 'carrier blocked' | 'gone' }

/**
 * Whether a text may leave for this phone. Our own consent and the carrier's block are two
 * columns; both must allow. A withdrawal is named before anything else, since it is the
 * household's own word.
 */
export function mayText(phone: {
  consent: Consent
  /** The number is kept as one that wants no texts, whatever its present row says. */
  suppressed?: boolean
  phoneState: PhoneState
  carrierBlocked: boolean
}): MayText {
  if (phone.consent === 'withdrawn' || phone.suppressed) return { ok: false, reason: 'withdrawn' }
  if (phone.consent === 'none') return { ok: false, reason: 'no consent' }
  if (phone.phoneState === 'gone') return { ok: false, reason: 'gone' }
  if (phone.phoneState === 'suspended') return { ok: false, reason: 'suspended' }
  if (phone.carrierBlocked) return { ok: false, reason: 'carrier blocked' }
  return { ok: true }
}

/** Days a programme has to honour a withdrawal: 47 CFR 64.1200(a)(10). */
export const optOutBusinessDays = 10

const dayMilliseconds = 86_400_000

/**
 * The last day by which a withdrawal made on `withdrawnOn` must be honoured: the tenth business
 * day after it. Saturdays, Sundays and the given holidays do not count.
 */
export function optOutDeadline({
  withdrawnOn,
  holidays = [],
  businessDays = optOutBusinessDays,
}: {
  withdrawnOn: string
  holidays?: readonly string[]
  businessDays?: number
}): string {
  const closed = new Set(holidays)
  let at = parseISO(`${withdrawnOn}T00:00:00Z`).getTime()
  let left = businessDays
  while (left > 0) {
    at += dayMilliseconds
    if (!isWeekend(at) && !closed.has(isoDay(at))) left -= 1
  }
  return isoDay(at)
}

/** Day 0 of the epoch was a Thursday. */
function isWeekend(at: number): boolean {
  const weekday = (Math.floor(at / dayMilliseconds) + 4) % 7
  return weekday === 0 || weekday === 6
}

function isoDay(at: number): string {
  return new TZDate(at, 'UTC').toISOString().slice(0, 10)
}
