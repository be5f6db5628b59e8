import type { Transaction } from '@/db/client'
import { findArea } from '@/db/queries/area'
import { insertHousehold } from '@/db/queries/household'
import { findKitModel } from '@/db/queries/reference'
import { insertAudit } from '@/db/queries/staff'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import { localDay } from '@/lib/domain/round'
import type { EnteredHousehold, HouseholdInput } from '@/lib/schemas/household-entry'
import { handOverKit } from './hand-over-kit'
import { linkPhone } from './link-phone'

type Refused = { ok: false; reason: string }
type Entry = { deps: Deps; actor: Actor; input: HouseholdInput; at: number }

async function keepWho(tx: Transaction, { input, at }: Entry) {
  const { phones: _phones, consent: _consent, kit: _kit, reading: _reading, ...who } = input
  return insertHousehold(tx, { ...who, createdAt: at })
}

async function linkPhones(tx: Transaction, entry: Entry, householdId: string) {
  const { deps, actor, input, at } = entry
  const notes: string[] = []
  let firstId: string | null = null
  for (const { number, answeredBy } of input.phones) {
    const linked = await linkPhone(tx, deps, {
      householdId,
      number,
      answeredBy,
      first: firstId === null,
      consent: input.consent,
      staffId: actor.staffId,
      at,
    })
    firstId ??= linked.phoneId
    notes.push(...linked.notes)
  }
  if (firstId === null) throw new Error('A household is entered with a phone.')
  return { phoneId: firstId, notes }
}

async function keep(tx: Transaction, entry: Entry): Promise<EnteredHousehold | Refused> {
  const { actor, input, at } = entry
  const area = await findArea(tx, input.areaId)
  if (!area) return { ok: false, reason: 'There is no such area.' }
  const model = await findKitModel(tx, input.kit.modelId)
  if (!model) return { ok: false, reason: 'There is no such kit.' }
  const { handedOverOn } = input.kit
  if (handedOverOn > localDay(at, area.timeZone)) {
    return { ok: false, reason: 'The day of the hand-over lies ahead.' }
  }
  const household = await keepWho(tx, entry)
  const { phoneId, notes } = await linkPhones(tx, entry, household.id)
  const { reading } = input
  const kit = await handOverKit(tx, { household, area, model, handedOverOn, reading, now: at })
  if (!reading) {
    notes.push('No first flow reading: later ones are held against what the kit model should give.')
  }
  await insertAudit(tx, {
    staffId: actor.staffId,
    act: 'enter household',
    subject: 'household',
    subjectId: household.id,
    detail: {
      areaId: area.id,
      kitId: kit.id,
      phones: input.phones.length,
      consent: !!input.consent,
    },
    at,
  })
  return {
    ok: true,
    householdId: household.id,
    kitId: kit.id,
    kitNumber: kit.number,
    phoneId,
    notes,
  }
}

/** Keeps a household with its people, phones, consent, kit and first flow reading: all of it, or nothing. */
export async function enterHousehold(
  deps: Deps,
  actor: Actor,
  input: HouseholdInput,
): Promise<EnteredHousehold | Refused> {
  allow(actor, 'enter households')
  const at = deps.clock.now()
  return deps.store.transaction((tx) => keep(tx, { deps, actor, input, at }))
}
