import type { Transaction } from '@/db/client'
import {
  insertFitting,
  insertWash,
  listOpenFittings,
  removeFitting,
  updateKit,
  type KitFacts,
} from '@/db/queries/kit-facts'
import { listAskedPrompts, updatePrompts } from '@/db/queries/prompt'
import type { Deps } from '@/lib/deps'
import { nextChangeOn } from '@/lib/domain/cycle'
import { addDays } from '@/lib/domain/day'
import { localDay } from '@/lib/domain/round'
import { washFrom } from './plan-wash'
import { settingsNow } from './settings-now'

type Known = 'said' | 'measured' | 'seen'

/** Keeps a wash of today and starts the wash clock anew. */
export async function logWash(
  tx: Transaction,
  deps: Deps,
  { facts, ticketId, known }: { facts: KitFacts; ticketId?: string; known: Known },
): Promise<void> {
  const now = deps.clock.now()
  const washedOn = localDay(now, facts.area.timeZone)
  await insertWash(tx, { kitId: facts.kit.id, ticketId, washedOn, known, at: now })
  await updateKit(tx, facts.kit.id, {
    lastWashOn: washedOn,
    ...(await washFrom(tx, deps, { facts, countedFrom: washedOn })),
  })
}

/** Puts a new part into a stage today: what was there comes out, and the stage's cycle starts anew. */
export async function refitStage(
  tx: Transaction,
  deps: Deps,
  { facts, position, removedFor }: { facts: KitFacts; position: 1 | 2 | 3; removedFor: string },
): Promise<void> {
  const now = deps.clock.now()
  const day = localDay(now, facts.area.timeZone)
  const open = await listOpenFittings(tx, facts.kit.id)
  const stage = open.find((row) => row.stage.position === position)?.stage
  if (!stage) throw new Error(`Kit ${facts.kit.id} has no stage ${position}.`)
  await removeFitting(tx, { kitId: facts.kit.id, position, removedOn: day, removedFor })
  await insertFitting(tx, {
    kitId: facts.kit.id,
    position,
    partId: stage.partId,
    fittedOn: day,
    dueOn: nextChangeOn({ fittedOn: day, changeMonths: stage.changeMonths }),
    createdAt: now,
  })
  if (stage.kind !== 'fibre') return
  // A new fibre stage is a clean one: its wash clock starts with it.
  await updateKit(tx, facts.kit.id, {
    lastWashOn: day,
    ...(await washFrom(tx, deps, { facts, countedFrom: day })),
  })
}

/**
 * Closes what was asked of a kit, answered or given up. The next wash and flow check are then planned a
 * full interval on, so that a question left open does not stop the cycle for ever. A change that was done is
 * closed before, where it is logged.
 */
export async function closePrompts(
  tx: Transaction,
  deps: Deps,
  { facts, state }: { facts: KitFacts; state: 'answered' | 'silent' },
) {
  const now = deps.clock.now()
  const today = localDay(now, facts.area.timeZone)
  const asked = await listAskedPrompts(tx, facts.kit.id)
  const isAnswer = state === 'answered'
  // A change keeps its day until it is done: what spoke of something else leaves it to be asked anew.
  const undone = asked.filter(({ kind }) => isAnswer && kind === 'change').map(({ id }) => id)
  await updatePrompts(tx, undone, { state: 'dropped', nudgeAfter: null })
  await updatePrompts(
    tx,
    asked.map(({ id }) => id).filter((id) => !undone.includes(id)),
    { state, nudgeAfter: null, answeredAt: isAnswer ? now : null },
  )
  const has = (kind: string) => asked.some((prompt) => prompt.kind === kind)
  if (has('wash')) {
    await updateKit(tx, facts.kit.id, await washFrom(tx, deps, { facts, countedFrom: today }))
  }
  if (has('flow check')) {
    const { wash } = await settingsNow(tx)
    await updateKit(tx, facts.kit.id, { nextFlowCheckOn: addDays(today, wash.flowCheckDays) })
  }
  return asked
}
