import type { Transaction } from '@/db/client'
import { findArea, findAreaByName, insertArea, updateArea } from '@/db/queries/area'
import { findDepot } from '@/db/queries/depot'
import { insertAudit } from '@/db/queries/staff'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import type { AreaInput } from '@/lib/schemas/area'

type Kept = { ok: true; areaId: string } | { ok: false; reason: string }

const NAME_TAKEN = 'Another area has this name.'
const NO_DEPOT = 'There is no such depot.'

function minutesOf(clock: string): number {
  const [hours = '0', minutes = '0'] = clock.split(':')
  return Number(hours) * 60 + Number(minutes)
}

function rowOf({ windowOpens, windowCloses, ...rest }: AreaInput) {
  return {
    ...rest,
    holidays: rest.holidays.toSorted((one, other) => (one.on < other.on ? -1 : 1)),
    wetMonths: [...new Set(rest.wetMonths)].toSorted((a, b) => a - b),
    windowOpensMinute: minutesOf(windowOpens),
    windowClosesMinute: minutesOf(windowCloses),
  }
}

async function note(
  tx: Transaction,
  { actor, act, areaId, at }: { actor: Actor; act: string; areaId: string; at: number },
  detail: Record<string, unknown>,
) {
  const who = { staffId: actor.staffId, subject: 'area', subjectId: areaId }
  await insertAudit(tx, { ...who, act, detail, at })
}

/** Keeps a new area: where households live, and when they may be texted. */
export async function enterArea(deps: Deps, actor: Actor, input: AreaInput): Promise<Kept> {
  allow(actor, 'set up areas')
  const at = deps.clock.now()
  return deps.store.transaction(async (tx) => {
    if (!(await findDepot(tx, input.depotId))) return { ok: false, reason: NO_DEPOT }
    const made = await insertArea(tx, { ...rowOf(input), createdAt: at })
    if (!made) return { ok: false, reason: NAME_TAKEN }
    await note(tx, { actor, act: 'enter area', areaId: made.id, at }, { ...input })
    return { ok: true, areaId: made.id }
  })
}

/** Changes an area. Texts that wait keep their hour; what is planned from now on follows the new window. */
export async function changeArea(
  deps: Deps,
  actor: Actor,
  { areaId, ...input }: AreaInput & { areaId: string },
): Promise<Kept> {
  allow(actor, 'set up areas')
  const at = deps.clock.now()
  return deps.store.transaction(async (tx) => {
    if (!(await findArea(tx, areaId))) return { ok: false, reason: 'not found' }
    if (!(await findDepot(tx, input.depotId))) return { ok: false, reason: NO_DEPOT }
    const namesake = await findAreaByName(tx, input.name)
    if (namesake && namesake.id !== areaId) return { ok: false, reason: NAME_TAKEN }
    await updateArea(tx, areaId, rowOf(input))
    await note(tx, { actor, act: 'change area', areaId, at }, { ...input })
    return { ok: true, areaId }
  })
}
