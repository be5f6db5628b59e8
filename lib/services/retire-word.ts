import { retireAddedWord } from '@/db/queries/added-word'
import { insertAudit } from '@/db/queries/staff'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import type { Refusal } from '@/lib/schemas/endpoint'

/** Takes one of the programme's own words out of force from the next text on. It stays on the list. */
export async function retireWord(
  deps: Deps,
  actor: Actor,
  wordId: string,
): Promise<{ ok: true; wordId: string } | Refusal> {
  allow(actor, 'set reply words')
  const at = deps.clock.now()
  return deps.store.transaction(async (tx) => {
    const row = await retireAddedWord(tx, wordId, { retiredBy: actor.staffId, retiredAt: at })
    if (!row) return { ok: false, reason: 'not found' }
    const { language, concept, phrase } = row
    await insertAudit(tx, {
      staffId: actor.staffId,
      act: 'retire a reply word',
      subject: 'reply word',
      subjectId: wordId,
      detail: { language, concept, phrase },
      at,
    })
    return { ok: true, wordId }
  })
}
