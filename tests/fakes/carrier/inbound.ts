import type { Carrier } from './carrier'
import { logProblem } from './debugger-log'
import { writeOnHandset } from './handset'
import { newSid } from './identifiers'
import { keywordOf, obeyKeyword, type Keyword } from './keywords'
import { startMessage } from './lifecycle'
import type { Message } from './message'
import { addMessage } from './message-book'
import { readTwiml } from './twiml'
import { deliverWebhook } from './webhooks'

export type InboundText = {
  from: string
  to?: string
  body: string
  media?: { contentType: string; base64: string }[]
  /** Overrides the keyword the carrier would report, for advanced opt-out in other languages. */
  optOutType?: Keyword
  /** More documented parameters, such as FromCity. */
  extra?: Record<string, string>
}

export type InboundResult = { message: Message; delivered: Promise<unknown> }

/** Longest text the carrier puts together from its parts. */
export const longestInboundCharacters = 1600

/** A phone sends a text: it is stored, keywords take effect at once, and the desk's webhook is called. */
export function receiveText(carrier: Carrier, text: InboundText): InboundResult {
  const to = text.to ?? carrier.settings.senders[0] ?? ''
  const message = addMessage(carrier, {
    direction: 'inbound',
    from: text.from,
    to,
    body: text.body.slice(0, longestInboundCharacters),
    status: 'received',
    messagingServiceSid: carrier.settings.messagingServiceSid || null,
    media: (text.media ?? []).map((one) => ({
      sid: newSid('ME'),
      contentType: one.contentType,
      base64: one.base64,
      createdAt: carrier.clock.now(),
    })),
  })
  writeOnHandset(carrier, message)
  const keyword = text.optOutType ?? keywordOf(message.body, to)
  if (keyword) obeyKeyword(carrier, { keyword, phone: text.from, sender: to })
  const parameters = inboundParameters(carrier, message, text.extra ?? {})
  if (keyword && (carrier.settings.advancedOptOut || text.optOutType)) {
    parameters.push(['OptOutType', keyword])
  }
  const delivered = callDesk(carrier, { message, parameters, address: carrier.settings.inboundUrl })
  return { message, delivered }
}

type DeskCall = {
  message: Message
  parameters: [string, string][]
  address: string
  method?: 'POST' | 'GET'
  redirects?: number
}

const redirectsAllowed = 5

async function callDesk(carrier: Carrier, call: DeskCall): Promise<void> {
  const { message } = call
  const outcome = await deliverWebhook(carrier, {
    on: 'inbound',
    address: call.address,
    method: call.method ?? 'POST',
    parameters: call.parameters,
    phone: message.from ?? '',
    sid: message.sid,
  })
  // A webhook that was dropped on its way is lost; only one that failed is taken to the fallback.
  if (outcome === null) return
  if (outcome.kind !== 'answered' || outcome.status < 200 || outcome.status >= 300) {
    await callFallback(carrier, call)
    return
  }
  const answer = readTwiml(outcome.contentType, outcome.body)
  if (!answer.ok) {
    logProblem(carrier, { code: answer.code, sid: message.sid, detail: answer.detail })
    return
  }
  for (const verb of answer.verbs) {
    if (verb.kind === 'message') reply(carrier, message, verb)
    else {
      const redirects = (call.redirects ?? 0) + 1
      if (redirects > redirectsAllowed) return
      const address = new URL(verb.url, call.address).href
      await callDesk(carrier, { ...call, address, method: verb.method, redirects })
      return
    }
  }
}

async function callFallback(carrier: Carrier, call: DeskCall): Promise<void> {
  const fallback = carrier.settings.inboundFallbackUrl
  if (fallback === '' || call.address === fallback) return
  const failed: [string, string][] = [
    ['ErrorCode', '11200'],
    ['ErrorUrl', call.address.split('#')[0] ?? ''],
  ]
  const parameters = [...call.parameters, ...failed]
  await callDesk(carrier, { ...call, address: fallback, method: 'POST', parameters })
}

function reply(
  carrier: Carrier,
  message: Message,
  verb: { body: string; to: string; from: string; media: string[]; statusCallback: string },
): void {
  const sent = addMessage(carrier, {
    direction: 'outbound-reply',
    from: verb.from || message.to,
    to: verb.to || (message.from ?? ''),
    body: verb.body,
    status: 'queued',
    statusCallback: verb.statusCallback || null,
    mediaUrls: verb.media,
  })
  startMessage(carrier, sent)
}

function inboundParameters(
  carrier: Carrier,
  message: Message,
  extra: Record<string, string>,
): [string, string][] {
  const parameters: [string, string][] = [
    ['ToCountry', ''],
    ['ToState', ''],
    ['SmsMessageSid', message.sid],
    ['NumMedia', String(message.media.length)],
    ['ToCity', ''],
    ['FromZip', ''],
    ['SmsSid', message.sid],
    ['FromState', ''],
    ['SmsStatus', 'received'],
    ['FromCity', ''],
    ['Body', message.body],
    ['FromCountry', message.from?.startsWith('+1') ? 'US' : ''],
    ['To', message.to],
    ['ToZip', ''],
    ['NumSegments', String(message.segments)],
    ['MessageSid', message.sid],
    ['AccountSid', carrier.settings.accountSid],
    ['From', message.from ?? ''],
    ['ApiVersion', '2010-04-01'],
  ]
  if (message.messagingServiceSid) {
    parameters.push(['MessagingServiceSid', message.messagingServiceSid])
  }
  message.media.forEach((one, index) => {
    const path = `/2010-04-01/Accounts/${carrier.settings.accountSid}/Messages/${message.sid}/Media/${one.sid}`
    parameters.push([`MediaUrl${index}`, `${carrier.origin}${path}`])
    parameters.push([`MediaContentType${index}`, one.contentType])
  })
  const known = new Map(parameters)
  for (const [name, value] of Object.entries(extra)) known.set(name, value)
  return [...known]
}
