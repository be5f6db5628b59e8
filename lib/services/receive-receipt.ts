import {
  findAttempt,
  findAttemptBySid,
  findReceipt,
  insertReceipt,
  updateAttempt,
} from '@/db/queries/attempt'
import { findText, updateText } from '@/db/queries/text'
import type { Deps } from '@/lib/deps'
import { classOf, statusRank } from '@/lib/domain/carrier-code'
import type { Receipt } from '@/lib/schemas/carrier'
import { acceptAttempt, markPhone } from './settle-attempt'

/** Keeps a receipt once and enqueues its reading; null when this very one came before. */
export async function storeReceipt(
  deps: Deps,
  { receipt, attemptId }: { receipt: Receipt; attemptId: string | null },
): Promise<{ n: number } | null> {
  return deps.store.transaction(async (tx) => {
    const attempt = attemptId === null ? null : await findAttempt(tx, attemptId)
    const kept = await insertReceipt(tx, {
      attemptId: attempt?.id,
      sid: receipt.sid,
      status: receipt.status,
      code: receipt.code,
      raw: receipt.raw,
      at: deps.clock.now(),
    })
    if (!kept) return null
    await deps.queue.add(tx, 'receive-receipt', { receiptN: kept.n })
    return { n: kept.n }
  })
}

/**
 * Applies one receipt. It binds the carrier's id to an attempt whose answer never came, and it is applied
 * only if its status comes further than what is known: they arrive late, twice and out of order.
 */
export async function receiveReceipt(
  deps: Deps,
  { receiptN }: { receiptN: number },
): Promise<void> {
  await deps.store.transaction(async (tx) => {
    const receipt = await findReceipt(tx, receiptN)
    if (!receipt) return
    const attempt = receipt.attemptId
      ? await findAttempt(tx, receipt.attemptId)
      : await findAttemptBySid(tx, receipt.sid)
    if (!attempt) return
    if (attempt.state === 'posting' || attempt.state === 'in doubt') {
      await acceptAttempt(tx, deps, { attempt, sid: receipt.sid })
    }
    const rank = statusRank(receipt.status)
    if (rank <= attempt.rank) return
    await updateAttempt(tx, attempt.id, { rank, code: receipt.code })
    if (receipt.status === 'delivered')
      return updateText(tx, attempt.textId, { state: 'delivered' })
    if (receipt.status !== 'undelivered' && receipt.status !== 'failed') return
    const text = await findText(tx, attempt.textId)
    await markPhone(tx, attempt.phoneId, classOf(receipt.code))
    if (!text) return
    await updateText(tx, text.id, { state: 'failed', stateWhy: receipt.code })
    // An undelivered prompt stays asked: its nudges go on, and silence leads to a person.
    deps.log.info({ textId: text.id, code: receipt.code }, 'a text did not arrive')
  })
}
