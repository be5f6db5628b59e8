import { asc } from 'drizzle-orm'
import { texts } from '@/db/schema/text'
import type { Deps } from '@/lib/deps'

/** A text as a phone remembers it: the practice carrier puts these on its phones (`/practice/history`). */
type PastText = {
  phone: string
  way: 'received' | 'written'
  body: string
  at: number
  sid?: string
}

/** All that has reached the families' phones and gone out from them, oldest first. */
export async function phoneHistory(deps: Deps): Promise<{ texts: PastText[] }> {
  const rows = await deps.store.db.select().from(texts).orderBy(asc(texts.n))
  const past = rows
    .filter(({ state }) => ['sent', 'delivered', 'received', 'read'].includes(state))
    .map(({ direction, e164, body, sentAt, createdAt, sid }): PastText => ({
      phone: e164,
      way: direction === 'out' ? 'received' : 'written',
      body,
      at: sentAt ?? createdAt,
      ...(sid ? { sid } : {}),
    }))
  return { texts: past }
}
