import { timingSafeEqual } from 'node:crypto'
import type { Carrier } from './carrier'
import { refusal } from './error-catalogue'
import { json, type Answer, type Asked, type Outcome } from './exchange'
import { takeRestFault, type RestCall } from './faults'
import { answerMedia } from './media-routes'
import { listMessages } from './message-list'
import { createMessage, deleteMessage, updateMessage } from './message-routes'
import { accountPath, messageResource, refusalAnswer, rfc2822 } from './resources'
import { withRestFault } from './rest-faults'

/** The carrier's REST interface: who asks, whether the call is to go wrong, then the resource. */
export async function answerRest(carrier: Carrier, asked: Asked): Promise<Outcome> {
  if (!isAuthorised(carrier, asked)) return refusalAnswer(refusal(20003))
  const inside = insideAccount(carrier, asked.path)
  if (inside === null) return refusalAnswer(refusal(20404))
  const call = callOf(asked.method, inside)
  const sid = /^\/Messages\/(\w+)/.exec(inside)?.[1]
  const phone = asked.form.get('To') ?? asked.query.get('To') ?? carrier.bySid.get(sid ?? '')?.to
  const fault = call ? takeRestFault(carrier.faults, { on: call, phone: phone ?? null }) : null
  const answer = () => answerResource(carrier, asked, inside)
  return fault ? withRestFault(fault, answer) : answer()
}

function isAuthorised(carrier: Carrier, asked: Asked): boolean {
  const { accountSid, authToken, apiKeySid, apiKeySecret } = carrier.settings
  const header = asked.headers.authorization
  const given = /^Basic (.+)$/.exec(typeof header === 'string' ? header : '')?.[1] ?? ''
  const pairs = [`${accountSid}:${authToken}`]
  if (apiKeySid !== '') pairs.push(`${apiKeySid}:${apiKeySecret}`)
  return pairs.some((pair) => same(Buffer.from(given, 'base64'), Buffer.from(pair)))
}

function same(a: Buffer, b: Buffer): boolean {
  return a.length === b.length && timingSafeEqual(a, b)
}

/** The path below the account, without `.json`; null when it is not this account's. */
function insideAccount(carrier: Carrier, path: string): string | null {
  const base = accountPath(carrier)
  if (path !== base && path !== `${base}.json` && !path.startsWith(`${base}/`)) return null
  return path.slice(base.length).replace(/\.json$/, '')
}

function callOf(method: string, inside: string): RestCall | null {
  if (inside === '/Messages') return method === 'POST' ? 'create' : 'list'
  if (!/^\/Messages\/\w+$/.test(inside)) return null
  if (method === 'POST') return 'update'
  return method === 'DELETE' ? 'delete' : 'fetch'
}

function answerResource(carrier: Carrier, asked: Asked, inside: string): Answer {
  if (inside === '') return answerAccount(carrier)
  if (inside === '/Messages') {
    return asked.method === 'POST'
      ? createMessage(carrier, asked)
      : listMessages(carrier, asked.query)
  }
  const match = /^\/Messages\/(\w+)(\/Media(?:\/(\w+))?)?$/.exec(inside)
  const message = carrier.bySid.get(match?.[1] ?? '')
  if (!match || !message) return refusalAnswer(refusal(20404))
  if (match[2]) {
    const asJson = asked.path.endsWith('.json')
    return answerMedia(carrier, message, {
      method: asked.method,
      sid: match[3] ?? '',
      json: asJson,
    })
  }
  if (asked.method === 'POST') return updateMessage(carrier, message, asked)
  if (asked.method === 'DELETE') return deleteMessage(carrier, message)
  return json(200, messageResource(carrier, message))
}

function answerAccount(carrier: Carrier): Answer {
  const started = rfc2822(Date.UTC(2024, 0, 1))
  return json(200, {
    auth_token: carrier.settings.authToken,
    date_created: started,
    date_updated: started,
    friendly_name: 'Practice account',
    owner_account_sid: carrier.settings.accountSid,
    sid: carrier.settings.accountSid,
    status: 'active',
    subresource_uris: { messages: `${accountPath(carrier)}/Messages.json` },
    type: 'Full',
    uri: `${accountPath(carrier)}.json`,
  })
}
