import { countReadingsBy, findTextForUpdate, insertReplyReading } from '@/db/queries/text'
import { insertAudit } from '@/db/queries/staff'
import type { Deps } from '@/lib/deps'
import type { ReplyKind } from '@/lib/domain/reply'
import { allow, type Actor } from '@/lib/domain/role'
import type { Refusal } from '@/lib/schemas/endpoint'
import { changeConsent } from './change-consent'

/**
 * Keeps a person's reading of a reply beside the desk's own; the last one counts and is shown. What
 * follows from it (an answer noted, a trouble named) is the person's to do on the ticket, but for an opt-out: that
 * is honoured at once, and only START from the phone takes it back.
 */
export async function readAs(
  deps: Deps,
  actor: Actor,
  { textId, kind, minutes }: { textId: string; kind: ReplyKind; minutes?: number },
): Promise<{ ok: true; textId: string } | Refusal> {
  allow(actor, 'work tickets')
  const at = deps.clock.now()
  return deps.store.transaction(async (tx) => {
    const text = await findTextForUpdate(tx, textId)
    if (text?.direction !== 'in') return { ok: false, reason: 'not found' }
    if (kind === 'flow-figure' && minutes === undefined) {
      return { ok: false, reason: 'A bottle-fill time wants its minutes.' }
    }
    const earlier = await countReadingsBy(tx, textId, `${actor.staffId}:`)
    await insertReplyReading(tx, {
      textId,
      readBy: `${actor.staffId}:${earlier + 1}`,
      asked: text.asked,
      kind,
      minutes: kind === 'flow-figure' ? minutes : undefined,
      sure: 1,
      at,
    })
    if (kind === 'stop') await changeConsent(tx, deps, { text, consent: 'withdrawn' })
    await insertAudit(tx, {
      staffId: actor.staffId,
      act: 'read a reply anew',
      subject: 'text',
      subjectId: textId,
      detail: { kind },
      at,
    })
    return { ok: true, textId }
  })
}
