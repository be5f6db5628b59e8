import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import { renderWording, valuesIn } from '@/lib/domain/wording'
import { exampleValues } from '@/lib/domain/wording-examples'
import type { Refusal } from '@/lib/schemas/endpoint'
import type { TriedWording, TryWording } from '@/lib/schemas/wording'
import { placeOf, type PlaceName } from './wording-place'
import { wordingValues } from './wording-values'

/** What a household would read if this draft went to it today. Sends nothing and keeps nothing. */
export async function tryWording(
  deps: Deps,
  actor: Actor,
  input: PlaceName & TryWording,
): Promise<TriedWording | Refusal> {
  allow(actor, 'see wording')
  const place = placeOf(input)
  if (!place) return { ok: false, reason: 'not found' }
  const known = await wordingValues(deps.store.db, place.info, input.householdId)
  if (!known) return { ok: false, reason: 'not found' }
  const rendered = renderWording(input.body, exampleValues(known), place.language)
  const have: Record<string, unknown> = known
  const examples = valuesIn(input.body, place.language).filter((name) => have[name] === undefined)
  return rendered.ok
    ? { text: rendered.text, problem: null, examples }
    : { text: null, problem: `${rendered.reason}: ${rendered.detail}`, examples: [] }
}
