import { listDueTexts } from '@/db/queries/text'
import type { Deps } from '@/lib/deps'

const BATCH = 1000

/** Gives a job to every text whose hour has come. A text that has one already is sent only once. */
export async function wakeTexts(deps: Deps): Promise<{ woken: number }> {
  const due = await listDueTexts(deps.store.db, deps.clock.now(), BATCH)
  if (due.length === 0) return { woken: 0 }
  await deps.store.transaction(async (tx) => {
    for (const { id } of due) await deps.queue.add(tx, 'send-text', { textId: id })
  })
  return { woken: due.length }
}
