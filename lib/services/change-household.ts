import type { Transaction } from '@/db/client'
import {
  deleteHouseholdPhone,
  findHousehold,
  listPhonesOfHouseholds,
  updateHousehold,
  type HouseholdInArea,
} from '@/db/queries/household'
import { listKitsOfHousehold } from '@/db/queries/kit'
import { findPhone, insertConsent, updatePhone } from '@/db/queries/phone'
import { listWaitingPromptTexts } from '@/db/queries/slip'
import { insertAudit } from '@/db/queries/staff'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import type { ChangedHousehold, HouseholdChange } from '@/lib/schemas/household-entry'
import { dropText } from './drop-text'
import { linkPhone } from './link-phone'
import { replanWash } from './plan-wash'

type Refused = { ok: false; reason: string }
type Change = { actor: Actor; found: HouseholdInArea; input: HouseholdChange; at: number }

/** Other water or other people move the next wash. */
async function replanWashes(tx: Transaction, deps: Deps, { found, input }: Change) {
  const { id, sourceClass, people } = found.household
  if (sourceClass === input.sourceClass && people === input.people) return
  for (const { kit } of await listKitsOfHousehold(tx, id)) await replanWash(tx, deps, kit.id)
}

/**
 * A phone that no longer answers for this household. Prompts that wait for it are dropped and so planned anew, for the
 * phone that follows; advice already on its way is not taken back.
 */
async function unlinkPhone(
  tx: Transaction,
  deps: Deps,
  link: { householdId: string; phoneId: string },
) {
  for (const text of await listWaitingPromptTexts(tx, link)) {
    await dropText(tx, deps, { text, why: 'the household has another phone' })
  }
  await deleteHouseholdPhone(tx, link.householdId, link.phoneId)
}

/** Texts go to this phone from now on. */
async function setFirstPhone(tx: Transaction, deps: Deps, { actor, found, input, at }: Change) {
  const householdId = found.household.id
  const linked = await listPhonesOfHouseholds(tx, [householdId])
  const first = linked.find(({ link }) => link.first)
  const { number, answeredBy } = input.phone
  const isSame = first?.phone.e164 === number
  if (first && !isSame) await unlinkPhone(tx, deps, { householdId, phoneId: first.phone.id })
  return linkPhone(tx, deps, {
    householdId,
    number,
    answeredBy,
    first: true,
    // The same phone again is no new yes.
    consent: isSame && first.phone.consent === 'given' ? null : input.consent,
    staffId: actor.staffId,
    at,
  })
}

async function keep(tx: Transaction, deps: Deps, change: Change): Promise<ChangedHousehold> {
  const { actor, found, input, at } = change
  const { phone: _phone, consent: _consent, ...who } = input
  const householdId = found.household.id
  await updateHousehold(tx, householdId, who)
  await replanWashes(tx, deps, change)
  const { phoneId, notes } = await setFirstPhone(tx, deps, change)
  const changed = Object.entries(who)
    .filter(([key, value]) => found.household[key as keyof typeof who] !== value)
    .map(([key]) => key)
  await insertAudit(tx, {
    staffId: actor.staffId,
    act: 'change household',
    subject: 'household',
    subjectId: householdId,
    detail: { changed, phoneId },
    at,
  })
  return { ok: true, householdId, phoneId, notes }
}

/** Changes who lives in a household, their language, their water and the phone that texts go to. */
export async function changeHousehold(
  deps: Deps,
  actor: Actor,
  { householdId, ...input }: HouseholdChange & { householdId: string },
): Promise<ChangedHousehold | Refused> {
  allow(actor, 'enter households')
  const at = deps.clock.now()
  return deps.store.transaction(async (tx) => {
    const found = await findHousehold(tx, householdId)
    if (!found) return { ok: false, reason: 'not found' }
    return keep(tx, deps, { actor, found, input, at })
  })
}

/**
 * Texts a suspended phone again, once somebody has talked to the family. `how` says with whom, and is kept as
 * a new yes; a phone that opted out itself stays silent all the same.
 */
export async function reinstatePhone(
  deps: Deps,
  actor: Actor,
  { phoneId, how }: { phoneId: string; how: string },
): Promise<{ ok: true; phoneId: string } | Refused> {
  allow(actor, 'enter households')
  const at = deps.clock.now()
  const { staffId } = actor
  return deps.store.transaction(async (tx) => {
    const phone = await findPhone(tx, phoneId)
    if (!phone) return { ok: false, reason: 'not found' }
    if (phone.state === 'active') return { ok: false, reason: 'This phone is not suspended.' }
    await updatePhone(tx, phoneId, { state: 'active', stateWhy: '' })
    if (phone.consent !== 'withdrawn') {
      const words = `reinstated: ${how}`
      await insertConsent(tx, { phoneId, consent: 'given', how: words, staffId, at })
    }
    const subject = { subject: 'phone', subjectId: phoneId }
    const detail = { was: phone.state, why: phone.stateWhy, how }
    await insertAudit(tx, { staffId, act: 'reinstate phone', ...subject, detail, at })
    return { ok: true, phoneId }
  })
}
