import type { Transaction } from '@/db/client'
import { listLooseReceipts, updateAttempt, type AttemptRow } from '@/db/queries/attempt'
import { updateKit } from '@/db/queries/kit-facts'
import { listPromptsOfText, updatePrompts } from '@/db/queries/prompt'
import { findText, updateText } from '@/db/queries/text'
import { updatePhone } from '@/db/queries/phone'
import type { Deps } from '@/lib/deps'
import type { RefusalClass } from '@/lib/domain/carrier-code'
import { waitUntil } from '@/lib/domain/round'
import { dropText } from './drop-text'
import { settingsNow } from './settings-now'

const RETRY_MILLISECONDS = 15 * 60_000
const RETRY_LIMIT = 3

/** The carrier has the text: from now on receipts tell its end. */
export async function acceptAttempt(
  tx: Transaction,
  deps: Deps,
  { attempt, sid }: { attempt: AttemptRow; sid: string },
): Promise<void> {
  const now = deps.clock.now()
  await updateAttempt(tx, attempt.id, { state: 'accepted', sid, endedAt: now })
  await updateText(tx, attempt.textId, { state: 'sent', sid, sentAt: now, stateWhy: '' })
  const prompts = await listPromptsOfText(tx, attempt.textId)
  const planned = prompts.filter((prompt) => prompt.state === 'planned')
  const welcome = planned.filter((prompt) => prompt.kind === 'welcome')
  await updatePrompts(
    tx,
    welcome.map((prompt) => prompt.id),
    { state: 'answered', answeredAt: now },
  )
  for (const { kitId } of welcome) await updateKit(tx, kitId, { welcomeDueOn: null })
  const { sending } = await settingsNow(tx)
  await updatePrompts(
    tx,
    planned.filter((prompt) => prompt.kind !== 'welcome').map((prompt) => prompt.id),
    { state: 'asked', nudgeAfter: waitUntil(now, 0, sending) },
  )
  for (const receipt of await listLooseReceipts(tx, sid)) {
    await deps.queue.add(tx, 'receive-receipt', { receiptN: receipt.n })
  }
}

/** What a definite no means for the phone. */
export async function markPhone(
  tx: Transaction,
  phoneId: string,
  refusal: RefusalClass,
): Promise<void> {
  switch (refusal) {
    case 'opted out':
      return updatePhone(tx, phoneId, { carrierBlocked: true })
    case 'gone':
      return updatePhone(tx, phoneId, {
        state: 'gone',
        stateWhy: 'The carrier says there is no such number.',
      })
    case 'never':
      return updatePhone(tx, phoneId, {
        state: 'suspended',
        stateWhy: 'The carrier cannot reach this number.',
      })
    case 'later':
    case 'our fault':
      return undefined
  }
}

/** A definite no: nothing was sent. Tried again if that can help and is still of use. */
export async function refuseAttempt(
  tx: Transaction,
  deps: Deps,
  refusal: {
    attempt: AttemptRow
    code: string
    refusal: RefusalClass
    retryAfterSeconds: number | null
  },
): Promise<void> {
  const now = deps.clock.now()
  const { attempt } = refusal
  await updateAttempt(tx, attempt.id, { state: 'refused', code: refusal.code, endedAt: now })
  await markPhone(tx, attempt.phoneId, refusal.refusal)
  const text = await findText(tx, attempt.textId)
  if (!text) return
  const wait =
    refusal.retryAfterSeconds === null ? RETRY_MILLISECONDS : refusal.retryAfterSeconds * 1000
  if (refusal.refusal === 'later' && attempt.n < RETRY_LIMIT) {
    await updateText(tx, text.id, { state: 'queued', sendAfter: now + wait })
  } else if (refusal.refusal === 'our fault') {
    deps.log.error({ textId: text.id, code: refusal.code }, 'the carrier refused a text')
    await updateText(tx, text.id, { state: 'failed', stateWhy: refusal.code })
  } else {
    await dropText(tx, deps, { text, why: refusal.code })
  }
}
