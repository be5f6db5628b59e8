import { findProposal, insertSettledProposal } from '@/db/queries/proposal'
import { insertAudit } from '@/db/queries/staff'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import type { Refusal } from '@/lib/schemas/endpoint'
import { overtaken } from './add-words'

/** Puts a proposal away without adding a word. A later reading of the same text is a new one. */
export async function setAsideProposal(
  deps: Deps,
  actor: Actor,
  { textId, readingN }: { textId: string; readingN: number },
): Promise<{ ok: true; textId: string } | Refusal> {
  allow(actor, 'set reply words')
  const at = deps.clock.now()
  return deps.store.transaction(async (tx) => {
    const proposal = await findProposal(tx, textId)
    const isFirst =
      proposal?.person.n === readingN &&
      (await insertSettledProposal(tx, {
        readingN,
        outcome: 'set aside',
        settledBy: actor.staffId,
        settledAt: at,
      }))
    if (!isFirst) return overtaken
    await insertAudit(tx, {
      staffId: actor.staffId,
      act: 'set a proposal aside',
      subject: 'text',
      subjectId: textId,
      detail: { readingN },
      at,
    })
    return { ok: true, textId }
  })
}
