import type { Carrier } from './carrier'
import type { Message } from './message'
import type { HandsetText } from './state'

export function landOnHandset(carrier: Carrier, message: Message, at: number): void {
  carrier.state.handsetTexts.push({
    way: 'received',
    phone: message.to,
    other: message.from ?? '',
    sid: message.sid,
    body: message.body,
    segments: message.segments,
    at,
    byCarrier: false,
    media: message.mediaUrls.length,
  })
  carrier.changed()
}

export function writeOnHandset(carrier: Carrier, message: Message): void {
  carrier.state.handsetTexts.push({
    way: 'written',
    phone: message.from ?? '',
    other: message.to,
    sid: message.sid,
    body: message.body,
    segments: message.segments,
    at: message.createdAt,
    byCarrier: false,
    media: message.media.length,
  })
  carrier.changed()
}

export type PhoneLedger = {
  number: string
  /** On the handset, oldest first, with the state that the carrier reports of each. */
  texts: (HandsetText & { state: string; errorCode: number | null })[]
  /** Accepted for this phone but never (or not yet) seen on it. */
  notArrived: {
    sid: string
    body: string
    segments: number
    createdAt: number
    state: string
    errorCode: number | null
  }[]
}

/** Everything one phone received and wrote, and what was meant for it and did not come. */
export function phoneLedger(carrier: Carrier, number: string): PhoneLedger {
  const own = carrier.state.handsetTexts.filter((text) => text.phone === number)
  const arrived = new Set(own.map((text) => text.sid))
  return {
    number,
    texts: own.map((text) => ({ ...text, ...stateOf(carrier, text) })),
    notArrived: carrier.state.messages
      .filter((m) => m.to === number && m.direction !== 'inbound' && !arrived.has(m.sid))
      .map((m) => ({
        sid: m.sid,
        body: m.body,
        segments: m.segments,
        createdAt: m.createdAt,
        state: m.status,
        errorCode: m.errorCode,
      })),
  }
}

function stateOf(carrier: Carrier, text: HandsetText): { state: string; errorCode: number | null } {
  const message = carrier.bySid.get(text.sid)
  if (message) return { state: message.status, errorCode: message.errorCode }
  return { state: text.byCarrier ? 'delivered' : 'deleted', errorCode: null }
}

export type PhoneSummary = { number: string; received: number; written: number; lastAt: number }

/** One line per phone that has received or written anything, the latest first. */
export function phoneSummaries(carrier: Carrier): PhoneSummary[] {
  const phones = new Map<string, PhoneSummary>()
  for (const text of carrier.state.handsetTexts) {
    const line = phones.get(text.phone) ?? {
      number: text.phone,
      received: 0,
      written: 0,
      lastAt: text.at,
    }
    line[text.way] += 1
    line.lastAt = Math.max(line.lastAt, text.at)
    phones.set(text.phone, line)
  }
  return [...phones.values()].sort((a, b) => b.lastAt - a.lastAt)
}
