import { emptyAnswer, signedForm } from '@/lib/carrier-webhook'
import { getDeps } from '@/lib/deps'
import { inboundSchema } from '@/lib/schemas/carrier'
import { storeInbound } from '@/lib/services/receive-text'

/** A text that came in: stored, enqueued and answered at once. Unsigned: 403 and nothing changes. */
export async function POST(request: Request): Promise<Response> {
  const form = await signedForm(request)
  if (!form) return new Response(null, { status: 403 })
  const inbound = inboundSchema.safeParse(form)
  if (!inbound.success) return new Response(null, { status: 400 })
  await storeInbound(await getDeps(), inbound.data)
  return emptyAnswer()
}
