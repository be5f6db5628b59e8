import {
  findAttempt,
  listBoundSids,
  listDoubtfulAttempts,
  updateAttempt,
} from '@/db/queries/attempt'
import { listUnreadTexts, updateText, type TextRow } from '@/db/queries/text'
import type { AttemptRow } from '@/db/queries/attempt'
import type { Deps } from '@/lib/deps'
import { decideDoubt } from '@/lib/domain/doubt'
import { dropText } from './drop-text'
import { acceptAttempt } from './settle-attempt'

/** The client's time limit plus the carrier's own margin, in milliseconds. */
const SETTLE_AFTER = 90_000
const BATCH = 50

/** Finds out what became of one attempt whose end nobody knows. It is never posted again blindly. */
async function reconcile(deps: Deps, { attempt, text }: { attempt: AttemptRow; text: TextRow }) {
  const listed = await deps.carrier.list({ to: text.e164, limit: 50 })
  await deps.store.transaction(async (tx) => {
    const now = await findAttempt(tx, attempt.id)
    if (now?.state !== 'posting' && now?.state !== 'in doubt') return
    const bound = new Set(
      await listBoundSids(
        tx,
        listed.map((one) => one.sid),
      ),
    )
    const decision = decideDoubt({
      now: deps.clock.now(),
      postingAt: now.postingAt,
      looks: now.looks,
      lookedAt: now.lookedAt,
      body: text.body,
      listed: listed.filter((one) => one.direction === 'out' && !bound.has(one.sid)),
    })
    switch (decision.kind) {
      case 'found':
        if (decision.surplus > 0) {
          deps.log.error(
            { textId: text.id, surplus: decision.surplus },
            'a text may have gone more than once',
          )
        }
        return acceptAttempt(tx, deps, { attempt: now, sid: decision.sid })
      case 'look again':
        await updateAttempt(tx, now.id, {
          state: 'in doubt',
          looks: now.looks + 1,
          lookedAt: deps.clock.now(),
        })
        return updateText(tx, text.id, { state: 'in doubt' })
      case 'wait':
        return undefined
      case 'not created':
        await updateAttempt(tx, now.id, { state: 'not created', endedAt: deps.clock.now() })
        if (text.staffId)
          return updateText(tx, text.id, {
            state: 'not confirmed',
            stateWhy: 'the carrier has no such text',
          })
        if (text.notAfter !== null && text.notAfter < deps.clock.now())
          return dropText(tx, deps, { text, why: 'too late' })
        return updateText(tx, text.id, { state: 'queued', sendAfter: deps.clock.now() })
    }
  })
}

/** Settles every attempt in doubt, and wakes inbound texts that were stored but never read. */
export async function reconcileAttempts(deps: Deps): Promise<{ looked: number }> {
  const before = deps.clock.now() - SETTLE_AFTER
  const doubtful = await listDoubtfulAttempts(deps.store.db, before, BATCH)
  for (const row of doubtful) await reconcile(deps, row)
  for (const { id } of await listUnreadTexts(deps.store.db, before, BATCH)) {
    await deps.store.transaction((tx) => deps.queue.add(tx, 'receive-text', { textId: id }))
  }
  return { looked: doubtful.length }
}
