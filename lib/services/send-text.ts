import { randomBytes } from 'node:crypto'
import type { Transaction } from '@/db/client'
import { findAttempt, insertAttempt, updateAttempt, type AttemptRow } from '@/db/queries/attempt'
import { findKitFacts } from '@/db/queries/kit-facts'
import { findPhone } from '@/db/queries/phone'
import { findTextForUpdate, listDueTexts, updateText, type TextRow } from '@/db/queries/text'
import type { Deps } from '@/lib/deps'
import { decideSend, type SendDecision } from '@/lib/domain/send'
import { windowOf } from './area-window'
import { rewordText } from './reword-text'
import { acceptAttempt, refuseAttempt } from './settle-attempt'
import { dropText } from './drop-text'
import { isSuppressed } from './suppress-number'

type Claim = { text: TextRow; attempt: AttemptRow }

async function decisionFor(tx: Transaction, deps: Deps, text: TextRow): Promise<SendDecision> {
  const now = deps.clock.now()
  const phone = text.phoneId ? await findPhone(tx, text.phoneId) : null
  if (!phone) return { kind: 'drop', why: 'no phone' }
  const facts = text.kitId ? await findKitFacts(tx, text.kitId) : null
  return decideSend({
    now,
    sendAfter: text.sendAfter ?? now,
    notAfter: text.notAfter,
    anyHour: text.anyHour,
    moment: text.moment,
    window: facts && windowOf(facts.area),
    phone: {
      consent: phone.consent,
      suppressed: await isSuppressed(tx, deps, phone.e164),
      phoneState: phone.state,
      carrierBlocked: phone.carrierBlocked,
    },
  })
}

/** Takes the text for one attempt and writes that down, or decides that it must wait or be dropped. */
async function claim(tx: Transaction, deps: Deps, textId: string): Promise<Claim | null> {
  const now = deps.clock.now()
  const text = await findTextForUpdate(tx, textId)
  if (!text?.phoneId || text.state !== 'queued') return null
  const decision = await decisionFor(tx, deps, text)
  if (decision.kind === 'drop') {
    await dropText(tx, deps, { text, why: decision.why })
    return null
  }
  if (decision.kind === 'wait') {
    await updateText(tx, text.id, { sendAfter: decision.until })
    return null
  }
  const attempt = await insertAttempt(tx, {
    id: randomBytes(16).toString('hex'),
    textId: text.id,
    phoneId: text.phoneId,
    state: 'posting',
    postingAt: now,
  })
  if (!attempt) return null
  const worded = await rewordText(tx, text)
  await updateText(tx, text.id, { state: 'sending' })
  return { text: worded, attempt }
}

/**
 * Hands one text to the carrier: an attempt is committed, then posted once, then settled. A process that
 * dies in between leaves an attempt `posting`, which the reconciler looks up and never posts again blindly.
 */
export async function sendText(deps: Deps, { textId }: { textId: string }): Promise<void> {
  const claimed = await deps.store.transaction((tx) => claim(tx, deps, textId))
  if (!claimed) return
  const { text, attempt } = claimed
  const outcome = await deps.carrier.send({
    to: text.e164,
    body: text.body,
    receiptUrl: `${deps.publicBaseUrl}/api/sms/receipt?a=${attempt.id}#rc=5&rp=all`,
  })
  await deps.store.transaction(async (tx) => {
    const now = await findAttempt(tx, attempt.id)
    // A receipt may have come before the carrier's answer and settled it already.
    if (now?.state !== 'posting') return
    switch (outcome.kind) {
      case 'accepted':
        return acceptAttempt(tx, deps, { attempt: now, sid: outcome.sid })
      case 'refused':
        return refuseAttempt(tx, deps, { attempt: now, ...outcome })
      case 'in doubt':
        await updateAttempt(tx, now.id, { state: 'in doubt', code: outcome.why })
        return updateText(tx, text.id, { state: 'in doubt', stateWhy: outcome.why })
    }
  })
}

const SWEEP_LIMIT = 500

/** Sends, one behind the other, every text whose hour has come. */
export async function sendDueTexts(deps: Deps): Promise<{ sent: number }> {
  const due = await listDueTexts(deps.store.db, deps.clock.now(), SWEEP_LIMIT)
  for (const { id } of due) await sendText(deps, { textId: id })
  return { sent: due.length }
}
