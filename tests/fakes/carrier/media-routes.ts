import type { Carrier } from './carrier'
import { refusal } from './error-catalogue'
import { empty, json, type Answer } from './exchange'
import type { Media, Message } from './message'
import { accountPath, mediaResource, refusalAnswer } from './resources'

/** `…/Messages/{sid}/Media[/{sid}][.json]`: with .json what it is, without it a redirect to where the bytes are. */
export function answerMedia(
  carrier: Carrier,
  message: Message,
  asked: { method: string; sid: string; json: boolean },
): Answer {
  if (asked.sid === '') return listMedia(carrier, message)
  const media = message.media.find((one) => one.sid === asked.sid)
  if (!media) return refusalAnswer(refusal(20404))
  if (asked.method === 'DELETE') {
    message.media.splice(message.media.indexOf(media), 1)
    carrier.changed()
    return empty(204)
  }
  if (asked.json) return json(200, mediaResource(carrier, message, media))
  return empty(307, { Location: `${carrier.mediaOrigin}/stored/${media.sid}` })
}

function listMedia(carrier: Carrier, message: Message): Answer {
  const uri = `${accountPath(carrier)}/Messages/${message.sid}/Media.json?PageSize=50&Page=0`
  return json(200, {
    end: Math.max(0, message.media.length - 1),
    first_page_uri: uri,
    next_page_uri: null,
    page: 0,
    page_size: 50,
    previous_page_uri: null,
    start: 0,
    media_list: message.media.map((media) => mediaResource(carrier, message, media)),
    uri,
  })
}

/**
 * The second host, where bytes are stored. Like the storage behind the carrier it refuses a request that brings
 * credentials along: a client must not forward them across hosts.
 */
export function answerStored(
  carrier: Carrier,
  asked: { path: string; authorization: boolean },
): Answer {
  if (asked.authorization) return { status: 400, body: 'Only one way of authorisation is allowed' }
  const sid = /^\/stored\/(ME[0-9a-f]{32})$/.exec(asked.path)?.[1]
  const media = findMedia(carrier, sid ?? '')
  if (!media) return { status: 404, body: 'No such object' }
  return {
    status: 200,
    headers: { 'Content-Type': media.contentType },
    body: Buffer.from(media.base64, 'base64'),
  }
}

function findMedia(carrier: Carrier, sid: string): Media | null {
  for (const message of carrier.state.messages) {
    const found = message.media.find((media) => media.sid === sid)
    if (found) return found
  }
  return null
}
