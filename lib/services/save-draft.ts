import type { Transaction } from '@/db/client'
import { insertAudit } from '@/db/queries/staff'
import {
  findLastEdition,
  findOpenWordingForUpdate,
  findOwnWordingInUse,
  insertWording,
  updateWording,
} from '@/db/queries/wording'
import type { Deps } from '@/lib/deps'
import { languages } from '@/lib/domain/language'
import { allow, type Actor } from '@/lib/domain/role'
import type { Refusal } from '@/lib/schemas/endpoint'
import type { SaveDraft, WordingCell } from '@/lib/schemas/wording'
import { wordingCell } from './wording-cell'
import { placeOf, type Place, type PlaceName } from './wording-place'

const firstLanguage = languages[0] ?? 'en'

const overtaken: Refusal = {
  ok: false,
  reason: 'Somebody else has changed this draft in the meantime. Read theirs, then write yours.',
}

/**
 * Writes the one open draft of a place, or opens it. A draft that had a first yes loses it: the yes was
 * for other words.
 */
export async function saveDraft(
  deps: Deps,
  actor: Actor,
  input: PlaceName & SaveDraft,
): Promise<WordingCell | Refusal> {
  allow(actor, 'write wording')
  const place = placeOf(input)
  if (!place) return { ok: false, reason: 'not found' }
  const refusal = await deps.store.transaction((tx) => write(tx, { deps, actor, place, input }))
  return refusal ?? wordingCell(deps, actor, input)
}

type Writing = { deps: Deps; actor: Actor; place: Place; input: SaveDraft }

/** The edition of the first language that the writer has beside the draft. */
async function editionFollowed(tx: Transaction, place: Place, own: number): Promise<number> {
  if (place.language === firstLanguage) return own
  const first = await findOwnWordingInUse(tx, { ...place, language: firstLanguage })
  return first?.edition ?? 0
}

async function write(tx: Transaction, writing: Writing): Promise<Refusal | null> {
  const { deps, actor, place, input } = writing
  const open = await findOpenWordingForUpdate(tx, place)
  if ((open?.writtenAt ?? null) !== input.readAt) return overtaken
  const edition = open?.edition ?? (await findLastEdition(tx, place)) + 1
  // A later instant names a later version, so two savings in one millisecond may not share it.
  const now = Math.max(deps.clock.now(), (open?.writtenAt ?? 0) + 1)
  const draft = {
    body: input.body.trim(),
    note: input.note.trim(),
    state: 'draft' as const,
    firstLanguageEdition: await editionFollowed(tx, place, edition),
    writtenBy: actor.staffId,
    writtenAt: now,
    approvedBy: null,
    secondApprovedBy: null,
  }
  if (open) await updateWording(tx, open.id, draft)
  else {
    const made = await insertWording(tx, {
      ...draft,
      moment: place.moment,
      language: place.language,
      edition,
    })
    if (!made) return overtaken
  }
  await insertAudit(tx, {
    staffId: actor.staffId,
    act: 'write wording',
    subject: 'wording',
    subjectId: `${place.moment}/${place.language}`,
    detail: { edition, body: draft.body },
    at: now,
  })
  return null
}
