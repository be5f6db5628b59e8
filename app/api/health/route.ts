import { getDeps } from '@/lib/deps'
import { checkHealth } from '@/lib/services/check-health'

/** How the desk is. 503 when the database does not answer. */
export async function GET(): Promise<Response> {
  try {
    return Response.json(await checkHealth(await getDeps()), {
      headers: { 'cache-control': 'no-store' },
    })
  } catch {
    return Response.json({ ok: false }, { status: 503 })
  }
}
