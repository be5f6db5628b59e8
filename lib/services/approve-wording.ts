import type { Transaction } from '@/db/client'
import { insertAudit } from '@/db/queries/staff'
import {
  findOpenWordingForUpdate,
  findOwnWordingInUse,
  updateWording,
  type WordingRow,
} from '@/db/queries/wording'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import { checkDraft } from '@/lib/domain/wording-checks'
import { approval } from '@/lib/domain/wording-life'
import type { Refusal } from '@/lib/schemas/endpoint'
import type { WordingCell } from '@/lib/schemas/wording'
import { wordingCell } from './wording-cell'
import { placeOf, type Place, type PlaceName } from './wording-place'

type Approving = { deps: Deps; actor: Actor; place: Place; readAt: number }

/** A person's yes to the draft they read: into use, or on to a second person where it is about safety. */
export async function approveWording(
  deps: Deps,
  actor: Actor,
  input: PlaceName & { readAt: number },
): Promise<WordingCell | Refusal> {
  allow(actor, 'write wording')
  const place = placeOf(input)
  if (!place) return { ok: false, reason: 'not found' }
  const { readAt } = input
  const refusal = await deps.store.transaction((tx) => approve(tx, { deps, actor, place, readAt }))
  return refusal ?? wordingCell(deps, actor, input)
}

async function approve(tx: Transaction, approving: Approving): Promise<Refusal | null> {
  const { actor, place, readAt } = approving
  const open = await findOpenWordingForUpdate(tx, place)
  const blocks = open ? blockersOf(open, place) : []
  const decided = approval({
    open,
    safety: place.info.safety,
    staffId: actor.staffId,
    readAt,
    blocked: blocks.length > 0,
  })
  if (!decided.ok) return { ok: false, reason: [decided.reason, ...blocks].join(' ') }
  if (!open) return null
  if (decided.next === 'in use') await putInUse(tx, approving, open)
  else await updateWording(tx, open.id, { state: 'approved', approvedBy: actor.staffId })
  await insertAudit(tx, {
    staffId: actor.staffId,
    act: decided.next === 'in use' ? 'put wording in use' : 'approve wording',
    subject: 'wording',
    subjectId: `${place.moment}/${place.language}`,
    detail: { edition: open.edition, body: open.body },
    at: approving.deps.clock.now(),
  })
  return null
}

function blockersOf(open: WordingRow, { moment, language }: Place): string[] {
  return checkDraft({ moment, language, body: open.body })
    .filter(({ blocks }) => blocks)
    .map(({ detail }) => detail)
}

async function putInUse(tx: Transaction, approving: Approving, open: WordingRow): Promise<void> {
  const { deps, actor, place } = approving
  const former = await findOwnWordingInUse(tx, place)
  if (former) await updateWording(tx, former.id, { state: 'retired' })
  const second = open.state === 'approved'
  await updateWording(tx, open.id, {
    state: 'in use',
    inUseFrom: deps.clock.now(),
    ...(second ? { secondApprovedBy: actor.staffId } : { approvedBy: actor.staffId }),
  })
}
