import type { Carrier } from './carrier'
import type { Message, MessageStatus } from './message'
import { deliverWebhook } from './webhooks'

/** `sending` is a state one can fetch but is never called back; the first state is only in the answer to the POST. */
const calledBack: readonly MessageStatus[] = [
  'queued',
  'sent',
  'delivered',
  'undelivered',
  'failed',
  'canceled',
]

/** Tells the desk of a state just reached, when it asked to be told. */
export function reportStatus(carrier: Carrier, message: Message, at: number): void {
  if (!message.statusCallback || !calledBack.includes(message.status)) return
  void deliverWebhook(carrier, {
    on: 'receipt',
    address: message.statusCallback,
    parameters: receiptParameters(carrier, message, at),
    phone: message.to,
    sid: message.sid,
  })
}

function receiptParameters(carrier: Carrier, message: Message, at: number): [string, string][] {
  const parameters: [string, string][] = [
    ['MessageSid', message.sid],
    ['SmsSid', message.sid],
    ['MessageStatus', message.status],
    ['SmsStatus', message.status],
    ['AccountSid', carrier.settings.accountSid],
    ['From', message.from ?? ''],
    ['To', message.to],
    ['ApiVersion', '2010-04-01'],
  ]
  if (message.messagingServiceSid) {
    parameters.push(['MessagingServiceSid', message.messagingServiceSid])
  }
  if (message.errorCode !== null) parameters.push(['ErrorCode', String(message.errorCode)])
  if (message.status === 'delivered' || message.status === 'undelivered') {
    parameters.push(['RawDlrDoneDate', rawDate(at)])
  }
  return parameters
}

/** YYMMDDhhmm in UTC, as the network's own receipts write it. */
function rawDate(at: number): string {
  return new Date(at).toISOString().replace(/\D/g, '').slice(2, 12)
}
