import { insertAudit } from '@/db/queries/staff'
import { findOpenWordingForUpdate, updateWording } from '@/db/queries/wording'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import type { Refusal } from '@/lib/schemas/endpoint'
import type { WordingCell } from '@/lib/schemas/wording'
import { wordingCell } from './wording-cell'
import { placeOf, type PlaceName } from './wording-place'

const goneRefusal: Refusal = {
  ok: false,
  reason: 'This draft was changed or put away in the meantime.',
}

/** Puts the open draft away unused. Its edition number is not given out again. */
export async function retireDraft(
  deps: Deps,
  actor: Actor,
  input: PlaceName & { readAt: number },
): Promise<WordingCell | Refusal> {
  allow(actor, 'write wording')
  const place = placeOf(input)
  if (!place) return { ok: false, reason: 'not found' }
  const retired = await deps.store.transaction(async (tx) => {
    const open = await findOpenWordingForUpdate(tx, place)
    if (open?.writtenAt !== input.readAt) return false
    await updateWording(tx, open.id, { state: 'retired' })
    await insertAudit(tx, {
      staffId: actor.staffId,
      act: 'put wording draft away',
      subject: 'wording',
      subjectId: `${place.moment}/${place.language}`,
      detail: { edition: open.edition, body: open.body },
      at: deps.clock.now(),
    })
    return true
  })
  return retired ? wordingCell(deps, actor, input) : goneRefusal
}
