import type { Fault } from './faults'
import type { Settings } from './settings'
import { signWebhook } from './signature'

export type SignedRequest = { url: string; parameters: [string, string][] }

/** Headers of a webhook: its signature, its token, and what the faults ordered do to them. */
export function webhookHeaders(
  settings: Settings,
  made: { signed: SignedRequest; faults: Fault[]; token: string },
): Record<string, string> {
  const has = (kind: Fault['kind']) => made.faults.some((fault) => fault.kind === kind)
  const shared = has('shared-key')
  const secret = shared ? settings.sharedKey : settings.authToken
  const headers: Record<string, string> = {
    'Content-Type': 'application/x-www-form-urlencoded; charset=UTF-8',
    Accept: '*/*',
    'User-Agent': 'TwilioProxy/1.1',
    'I-Twilio-Idempotency-Token': made.token,
    'X-Twilio-Signature': signWebhook({
      secret: has('wrong-signature') ? `${secret} but another` : secret,
      ...made.signed,
      algorithm: shared ? 'sha256' : 'sha1',
    }),
  }
  if (shared) {
    headers['X-Twilio-Webhooks-Signature-Settings'] =
      `key=${settings.sharedKeyId},algorithm=HMAC_SHA256`
  }
  if (has('lower-case-headers')) return recased(headers, (name) => name.toLowerCase())
  if (has('upper-case-headers')) return recased(headers, (name) => name.toUpperCase())
  return headers
}

function recased(
  headers: Record<string, string>,
  change: (name: string) => string,
): Record<string, string> {
  return Object.fromEntries(Object.entries(headers).map(([name, value]) => [change(name), value]))
}
