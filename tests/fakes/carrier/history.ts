import type { Carrier } from './carrier'
import { newSid } from './identifiers'
import type { Message } from './message'
import { longestQueueSeconds } from './message-book'
import { countSegments } from './segments'

/** A text of the past: what a demo's history has already brought to a phone or from it. */
export type PastText = {
  phone: string
  /** `received` by the phone, or `written` on it. */
  way: 'received' | 'written'
  body: string
  at: number
  sid?: string
}

/** Takes texts of the past as done: they stand on the phones and in the list, and nobody is called about them. */
export function addHistory(carrier: Carrier, texts: readonly PastText[]): number {
  const known = texts.filter((text) => !text.sid || !carrier.bySid.has(text.sid))
  for (const text of [...known].sort((a, b) => a.at - b.at)) addPast(carrier, text)
  carrier.state.handsetTexts.sort((a, b) => a.at - b.at)
  carrier.changed()
  return known.length
}

function addPast(carrier: Carrier, text: PastText): void {
  const sender = carrier.settings.senders[0] ?? ''
  const written = text.way === 'written'
  const message: Message = {
    sid: text.sid ?? newSid('SM'),
    sequence: carrier.state.nextSequence++,
    direction: written ? 'inbound' : 'outbound-api',
    from: written ? text.phone : sender,
    to: written ? sender : text.phone,
    body: text.body,
    segments: countSegments(text.body),
    status: written ? 'received' : 'delivered',
    errorCode: null,
    messagingServiceSid: null,
    statusCallback: null,
    validitySeconds: longestQueueSeconds,
    createdAt: text.at,
    updatedAt: text.at,
    sentAt: text.at,
    media: [],
    mediaUrls: [],
    plan: [],
  }
  carrier.state.messages.push(message)
  carrier.bySid.set(message.sid, message)
  carrier.state.handsetTexts.push({
    way: text.way,
    phone: text.phone,
    other: sender,
    sid: message.sid,
    body: text.body,
    segments: message.segments,
    at: text.at,
    byCarrier: false,
    media: 0,
  })
}

/** Reads the texts of `POST /practice/history`; null when one of them cannot be one. */
export function readHistory(given: unknown): PastText[] | null {
  const texts = (given as { texts?: unknown } | null)?.texts
  if (!Array.isArray(texts)) return null
  const good = texts.every(
    (text: Partial<PastText> | null) =>
      typeof text?.phone === 'string' &&
      typeof text.body === 'string' &&
      typeof text.at === 'number' &&
      (text.way === 'received' || text.way === 'written'),
  )
  return good ? (texts as PastText[]) : null
}
