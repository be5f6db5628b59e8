import type { Carrier } from './carrier'
import { errorMessage, type Refusal } from './error-catalogue'
import { json, type Answer } from './exchange'
import type { Media, Message } from './message'

export const apiVersion = '2010-04-01'

/** RFC 2822 with a numeric zone, whole seconds, the only form of date this interface speaks. */
export function rfc2822(at: number | null): string | null {
  return at === null ? null : new Date(at).toUTCString().replace('GMT', '+0000')
}

export function accountPath(carrier: Carrier): string {
  return `/${apiVersion}/Accounts/${carrier.settings.accountSid}`
}

export function messageResource(carrier: Carrier, message: Message) {
  const path = `${accountPath(carrier)}/Messages/${message.sid}`
  const unplanned = message.status === 'accepted' || message.status === 'scheduled'
  return {
    account_sid: carrier.settings.accountSid,
    api_version: apiVersion,
    body: message.body,
    date_created: rfc2822(message.createdAt),
    date_sent: rfc2822(message.sentAt),
    date_updated: rfc2822(message.updatedAt),
    direction: message.direction,
    error_code: message.errorCode,
    error_message: errorMessage(message.errorCode),
    from: message.from,
    messaging_service_sid: message.messagingServiceSid,
    num_media: String(message.media.length + message.mediaUrls.length),
    // A service counts the parts only once it has picked a sender.
    num_segments: unplanned ? '0' : String(message.segments),
    price: null,
    price_unit: 'USD',
    sid: message.sid,
    status: message.status,
    subresource_uris: { media: `${path}/Media.json` },
    to: message.to,
    uri: `${path}.json`,
  }
}

export function mediaResource(carrier: Carrier, message: Message, media: Media) {
  return {
    account_sid: carrier.settings.accountSid,
    content_type: media.contentType,
    date_created: rfc2822(media.createdAt),
    date_updated: rfc2822(media.createdAt),
    parent_sid: message.sid,
    sid: media.sid,
    uri: `${accountPath(carrier)}/Messages/${message.sid}/Media/${media.sid}.json`,
  }
}

export function refusalAnswer(refused: Refusal, headers: Record<string, string> = {}): Answer {
  const { code, message, status } = refused
  const more_info = `https://www.twilio.com/docs/errors/${code}`
  return json(status, { code, message, more_info, status }, headers)
}
