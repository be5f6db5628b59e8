import { emptyAnswer, signedForm } from '@/lib/carrier-webhook'
import { getDeps } from '@/lib/deps'
import { receiptSchema } from '@/lib/schemas/carrier'
import { storeReceipt } from '@/lib/services/receive-receipt'

/** What became of a text of ours. The attempt's id is inside the signed address: nobody can forge it. */
export async function POST(request: Request): Promise<Response> {
  const form = await signedForm(request)
  if (!form) return new Response(null, { status: 403 })
  const receipt = receiptSchema.safeParse(form)
  if (!receipt.success) return new Response(null, { status: 400 })
  const attemptId = new URL(request.url).searchParams.get('a')
  await storeReceipt(await getDeps(), { receipt: receipt.data, attemptId })
  return emptyAnswer()
}
