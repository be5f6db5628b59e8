import type { Carrier } from './carrier'
import { newSid } from './identifiers'
import type { Message } from './message'
import { countSegments } from './segments'

export type NewMessage = Pick<Message, 'direction' | 'from' | 'to' | 'body' | 'status'> &
  Partial<
    Pick<
      Message,
      'messagingServiceSid' | 'statusCallback' | 'validitySeconds' | 'media' | 'mediaUrls'
    >
  >

/** The carrier's own ceiling for waiting in the queue: ten hours. */
export const longestQueueSeconds = 36_000

export function addMessage(carrier: Carrier, made: NewMessage): Message {
  const now = carrier.clock.now()
  const media = made.media ?? []
  const mediaUrls = made.mediaUrls ?? []
  const message: Message = {
    messagingServiceSid: null,
    statusCallback: null,
    validitySeconds: longestQueueSeconds,
    ...made,
    media,
    mediaUrls,
    sid: newSid(media.length + mediaUrls.length > 0 ? 'MM' : 'SM'),
    sequence: carrier.state.nextSequence++,
    segments: countSegments(made.body),
    errorCode: null,
    createdAt: now,
    updatedAt: now,
    sentAt: made.direction === 'inbound' ? now : null,
    plan: [],
  }
  carrier.state.messages.push(message)
  carrier.bySid.set(message.sid, message)
  carrier.changed()
  return message
}

/** Forgets a message for good; what a handset shows stays on the handset. */
export function removeMessage(carrier: Carrier, message: Message): void {
  const index = carrier.state.messages.indexOf(message)
  if (index >= 0) carrier.state.messages.splice(index, 1)
  carrier.bySid.delete(message.sid)
  carrier.pending.delete(message)
  carrier.changed()
}
