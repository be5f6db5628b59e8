import type { Carrier } from './carrier'
import type { CreateRequest } from './create-request'
import { isTollFree, optedOut } from './keywords'
import { magicRecipients, magicSenders } from './magic-numbers'
import { longestQueueSeconds } from './message-book'
import { isFixedLine } from './number-fates'

type Check = (carrier: Carrier, request: CreateRequest) => number | null

const longestBodyCharacters = 1600
const mostMedia = 10
const longestCallbackCharacters = 4000
const soonestScheduleMilliseconds = 300_000
const latestScheduleMilliseconds = 3_024_000_000

/** E.164; under +1 also the shape of area code and exchange. Not a check of numbering plans. */
export function isPossibleNumber(number: string): boolean {
  if (number.startsWith('+1')) return /^\+1[2-9]\d{2}[2-9]\d{6}$/.test(number)
  return /^\+[2-9]\d{6,14}$/.test(number)
}

function checkTo(_carrier: Carrier, { to }: CreateRequest): number | null {
  if (!to) return 21604
  if (magicRecipients[to] === 21211) return 21211
  return isPossibleNumber(to) || to in magicRecipients ? null : 21211
}

function checkFrom(carrier: Carrier, request: CreateRequest): number | null {
  const { from, messagingServiceSid } = request
  if (!from && !messagingServiceSid) return 21603
  if (messagingServiceSid && messagingServiceSid !== carrier.settings.messagingServiceSid) {
    return 21701
  }
  if (!from) return null
  if (magicSenders[from]) return magicSenders[from] === 21611 ? null : magicSenders[from]
  if (!isPossibleNumber(from)) return 21212
  return carrier.settings.senders.includes(from) ? null : 21606
}

function checkContent(_carrier: Carrier, { body, mediaUrls }: CreateRequest): number | null {
  if (!body && mediaUrls.length === 0) return 21602
  if (body && body.length > longestBodyCharacters) return 21617
  if (mediaUrls.some((url) => !/^https?:\/\//.test(url) || !URL.canParse(url))) return 21620
  return mediaUrls.length > mostMedia ? 21623 : null
}

function checkCallback(_carrier: Carrier, { statusCallback }: CreateRequest): number | null {
  if (!statusCallback) return null
  if (statusCallback.length > longestCallbackCharacters) return 21609
  if (!URL.canParse(statusCallback)) return 21609
  const { protocol, hostname } = new URL(statusCallback)
  const known = protocol === 'http:' || protocol === 'https:'
  return known && hostname !== '' && !hostname.includes('_') ? null : 21609
}

function checkSchedule(carrier: Carrier, request: CreateRequest): number | null {
  const { scheduleType, sendAt, messagingServiceSid } = request
  if (!scheduleType && !sendAt) return null
  if (scheduleType !== 'fixed') return 35126
  if (!sendAt) return 35111
  const ahead = Date.parse(sendAt) - carrier.clock.now()
  if (!(ahead >= soonestScheduleMilliseconds && ahead <= latestScheduleMilliseconds)) return 35114
  return messagingServiceSid ? null : 35118
}

function checkValidity(_carrier: Carrier, { validityPeriod }: CreateRequest): number | null {
  if (validityPeriod === null) return null
  const inside = /^\d+$/.test(validityPeriod) && Number(validityPeriod) >= 1
  return inside && Number(validityPeriod) <= longestQueueSeconds ? null : 90007
}

/** On a toll-free sender the network blocks later and says 30004; elsewhere a stop is known at once. */
function checkOptOut(carrier: Carrier, { to, from }: CreateRequest): number | null {
  if (magicRecipients[to ?? ''] === 21610) return 21610
  const sender = from ?? carrier.settings.senders[0] ?? ''
  return !isTollFree(sender) && optedOut(carrier, sender, to ?? '') ? 21610 : null
}

function checkReach(carrier: Carrier, { to }: CreateRequest): number | null {
  const number = to ?? ''
  const magic = magicRecipients[number]
  if (magic === 21408 || magic === 21612 || magic === 21614) return magic
  if (!carrier.settings.regions.some((start) => number.startsWith(start))) return 21408
  return isFixedLine(number) ? 21614 : null
}

function checkQueue(carrier: Carrier, { from, messagingServiceSid }: CreateRequest): number | null {
  if (magicSenders[from ?? ''] === 21611) return 21611
  // With a service the overflow is told later, as 30001.
  if (messagingServiceSid) return null
  const busyUntil = carrier.state.busyUntil[from ?? ''] ?? 0
  return busyUntil - carrier.clock.now() > longestQueueSeconds * 1000 ? 21611 : null
}

const checksInOrder: readonly Check[] = [
  checkTo,
  checkFrom,
  checkContent,
  checkCallback,
  checkSchedule,
  checkValidity,
  checkOptOut,
  checkReach,
  checkQueue,
]

/** The first code that stands against a new message, in the carrier's documented order; null when there is none. */
export function refuseCreate(carrier: Carrier, request: CreateRequest): number | null {
  for (const check of checksInOrder) {
    const code = check(carrier, request)
    if (code !== null) return code
  }
  return null
}
