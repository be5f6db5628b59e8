import type { Carrier } from './carrier'
import { refuseCreate } from './create-checks'
import { readCreateRequest } from './create-request'
import { refusal } from './error-catalogue'
import { empty, json, type Answer, type Asked } from './exchange'
import { cancelMessage, startMessage } from './lifecycle'
import { hasEnded, type Message, type MessageStatus } from './message'
import { addMessage, longestQueueSeconds, removeMessage } from './message-book'
import { messageResource, refusalAnswer } from './resources'

/** `POST …/Messages.json`. Not idempotent: every accepted POST is another text, as with the carrier itself. */
export function createMessage(carrier: Carrier, asked: Asked): Answer {
  const request = readCreateRequest(asked.form)
  const code = refuseCreate(carrier, request)
  if (code !== null) return refusalAnswer(refusal(code))
  const service = request.messagingServiceSid
  const scheduledAt = request.sendAt ? Date.parse(request.sendAt) : undefined
  const message = addMessage(carrier, {
    direction: 'outbound-api',
    // A service picks the sender later, so that the first answer has none.
    from: request.from,
    to: request.to ?? '',
    body: request.body ?? '',
    status: firstStatus(service !== null, scheduledAt !== undefined),
    messagingServiceSid: service,
    statusCallback: request.statusCallback,
    validitySeconds: Number(request.validityPeriod ?? longestQueueSeconds),
    mediaUrls: request.mediaUrls,
  })
  startMessage(carrier, message, scheduledAt)
  return json(201, messageResource(carrier, message))
}

function firstStatus(service: boolean, scheduled: boolean): MessageStatus {
  if (scheduled) return 'scheduled'
  return service ? 'accepted' : 'queued'
}

/** `POST …/Messages/{sid}.json`: an empty body redacts what has ended, `Status=canceled` calls back what waits. */
export function updateMessage(carrier: Carrier, message: Message, asked: Asked): Answer {
  if (asked.form.get('Status') === 'canceled') {
    if (message.status !== 'scheduled' && message.status !== 'accepted') {
      return refusalAnswer(refusal(30409))
    }
    cancelMessage(carrier, message)
  }
  if (asked.form.get('Body') === '') {
    if (!hasEnded(message.status) && message.status !== 'sent') return refusalAnswer(refusal(20009))
    message.body = ''
    message.updatedAt = carrier.clock.now()
    carrier.changed()
  }
  return json(200, messageResource(carrier, message))
}

export function deleteMessage(carrier: Carrier, message: Message): Answer {
  if (!hasEnded(message.status) && message.status !== 'sent') return refusalAnswer(refusal(20009))
  removeMessage(carrier, message)
  return empty(204)
}
