import 'server-only'
import { validateRequest } from 'twilio/lib/webhooks/webhooks'
import { env } from './env'
import { readForm } from './schemas/carrier'

const BODY_LIMIT_CHARACTERS = 64_000

/** What the carrier is answered: nothing to send. Replies go out as texts of ours. */
export function emptyAnswer(): Response {
  return new Response('<?xml version="1.0" encoding="UTF-8"?><Response/>', {
    headers: { 'content-type': 'text/xml' },
  })
}

/**
 * The form of a webhook if the carrier signed it, else null. The signature covers the address under which
 * we are known outside, never what this server thinks its address is, and the body before any trimming.
 */
export async function signedForm(
  request: Request,
): Promise<Record<string, string | string[]> | null> {
  const signature = request.headers.get('x-twilio-signature')
  const body = await request.text()
  if (!signature || body.length > BODY_LIMIT_CHARACTERS) return null
  const { pathname, search } = new URL(request.url)
  const address = `${env().publicBaseUrl}${pathname}${search}`
  const form = readForm(body)
  const { authToken, previousAuthToken } = env().carrier
  const tokens = previousAuthToken ? [authToken, previousAuthToken] : [authToken]
  return tokens.some((token) => validateRequest(token, signature, address, form)) ? form : null
}
