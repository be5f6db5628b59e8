import twilio from 'twilio'
import type RequestClient from 'twilio/lib/base/RequestClient'
import { classOf, type RefusalClass } from '@/lib/domain/carrier-code'
import type { CarrierSettings } from '@/lib/schemas/environment'

/** What came of one POST. `in doubt` is never posted again blindly: the text may be on its way. */
export type SendOutcome =
  | { kind: 'accepted'; sid: string; status: string }
  | { kind: 'refused'; code: string; refusal: RefusalClass; retryAfterSeconds: number | null }
  | { kind: 'in doubt'; why: string }

/** One text as the carrier lists it; instants in epoch milliseconds. */
export type ListedText = {
  sid: string
  direction: 'in' | 'out'
  from: string
  to: string
  body: string
  status: string
  code: string
  createdAt: number
}

export type Carrier = {
  send(text: { to: string; body: string; receiptUrl: string }): Promise<SendOutcome>
  /** Newest first, at most `limit`; `to` narrows to one phone. */
  list(filter: { to?: string; from?: string; limit: number }): Promise<ListedText[]>
}

const TIMEOUT_MILLISECONDS = 30_000

/** Nothing was sent when the connection was never made. */
const neverConnected = ['ECONNREFUSED', 'ENOTFOUND', 'EAI_AGAIN']

/** Sends to another origin than the carrier's own: the practice carrier. */
class OtherOrigin extends twilio.RequestClient {
  readonly #origin: URL

  constructor(origin: string) {
    super({ timeout: TIMEOUT_MILLISECONDS })
    this.#origin = new URL(origin)
  }

  override request<T>(options: RequestClient.RequestOptions<T>) {
    const uri = new URL(options.uri)
    uri.protocol = this.#origin.protocol
    uri.host = this.#origin.host
    return super.request<T>({ ...options, uri: uri.href })
  }
}

type Failure = { status?: unknown; code?: unknown; name?: unknown }

/**
 * What a thrown error means for the text. Only the code is kept: the SDK's network errors carry the
 * credentials in their headers, so neither the error nor its message may reach a log.
 */
export function outcomeOf(error: unknown): SendOutcome {
  const { status, code } = error as Failure
  if (typeof status === 'number' && status >= 400 && status < 500) {
    const known = typeof code === 'number' ? String(code) : String(status)
    return { kind: 'refused', code: known, refusal: classOf(known), retryAfterSeconds: null }
  }
  if (typeof code === 'string' && neverConnected.includes(code)) {
    return { kind: 'refused', code, refusal: 'later', retryAfterSeconds: 60 }
  }
  const what =
    typeof status === 'number' ? `answer ${status}` : typeof code === 'string' ? code : 'no answer'
  return { kind: 'in doubt', why: what }
}

/** The hosted carrier through its own SDK. Everything is passed explicitly: no stray variable redirects it. */
export function hostedCarrier(settings: CarrierSettings): Carrier {
  const httpClient = settings.apiBaseUrl
    ? new OtherOrigin(settings.apiBaseUrl)
    : new twilio.RequestClient({ timeout: TIMEOUT_MILLISECONDS })
  const client = twilio(settings.accountSid, settings.authToken, { httpClient, autoRetry: false })
  const sender = settings.messagingServiceSid
    ? { messagingServiceSid: settings.messagingServiceSid }
    : { from: settings.from ?? '' }
  return {
    async send({ to, body, receiptUrl }) {
      try {
        const made = await client.messages.create({
          to,
          body,
          statusCallback: receiptUrl,
          ...sender,
        })
        return { kind: 'accepted', sid: made.sid, status: made.status }
      } catch (error) {
        return outcomeOf(error)
      }
    },
    async list({ to, from, limit }) {
      try {
        const found = await client.messages.list({
          ...(to ? { to } : {}),
          ...(from ? { from } : {}),
          limit,
          pageSize: Math.min(limit, 200),
        })
        return found.map((text) => ({
          sid: text.sid,
          direction: text.direction === 'inbound' ? 'in' : 'out',
          from: text.from,
          to: text.to,
          body: text.body,
          status: text.status,
          code: text.errorCode ? String(text.errorCode) : '',
          createdAt: text.dateCreated.getTime(),
        }))
      } catch (error) {
        const outcome = outcomeOf(error)
        throw new Error(`The carrier did not list its texts: ${outcome.kind}.`)
      }
    },
  }
}
