import { setImmediate } from 'node:timers/promises'
import { holdHousehold } from '@/db/queries/household'
import { findKitFacts, type KitFacts } from '@/db/queries/kit-facts'
import { findFirstPhone } from '@/db/queries/phone'
import { findPrompt, listDue, upsertPrompt, type DueRow } from '@/db/queries/prompt'
import { countWaitingTexts, listPromptHours } from '@/db/queries/text'
import type { Transaction } from '@/db/client'
import type { Deps } from '@/lib/deps'
import { addDays } from '@/lib/domain/day'
import { expiresAt, hasRoom, localDay, sendAfter, type Due } from '@/lib/domain/round'
import { stageKey, textFor, type RoundText } from '@/lib/domain/round-text'
import { windowOf } from './area-window'
import { asDue } from './as-due'
import { queueText } from './queue-text'
import { settingsNow } from './settings-now'

const WEEK = 7 * 24 * 60 * 60_000
const KITS_A_RUN = 2000

function byKit(rows: readonly DueRow[]): Map<string, DueRow[]> {
  const kits = new Map<string, DueRow[]>()
  for (const row of rows) kits.set(row.kitId, [...(kits.get(row.kitId) ?? []), row])
  return kits
}

type Prompt = { kind: DueRow['kind']; dueOn: string; positions: number[] }

/** Prompts to make of what is due: several stages due on one day are one prompt. */
function promptsOf(due: readonly Due[]): Prompt[] {
  const prompts: Prompt[] = []
  for (const { kind, dueOn, stagePosition } of due) {
    const same = prompts.find((prompt) => prompt.kind === kind && prompt.dueOn === dueOn)
    const positions = stagePosition === undefined ? [] : [stagePosition]
    if (same) same.positions.push(...positions)
    else prompts.push({ kind, dueOn, positions })
  }
  return prompts
}

type Plan = { facts: KitFacts; text: RoundText; sendAt: number; limit: number }

/** Under the weekly limit and not twice a day; the household is held, so that it stays so until the end. */
async function findRoom(tx: Transaction, { facts, limit }: Plan, now: number) {
  const { household, area } = facts
  await holdHousehold(tx, household.id)
  const hours = await listPromptHours(tx, [household.id], now - WEEK)
  return hasRoom({ sentAt: hours.map(({ at }) => at), now, timeZone: area.timeZone, limit })
}

async function writePlan(tx: Transaction, deps: Deps, plan: Plan): Promise<boolean> {
  const { facts, text, sendAt } = plan
  const now = deps.clock.now()
  const prompts = promptsOf(text.due)
  const [first] = prompts
  const phone = await findFirstPhone(tx, facts.household.id)
  if (!first || !phone || !(await findRoom(tx, plan, now))) return false
  const before = await findPrompt(tx, { kitId: facts.kit.id, ...first })
  // Another planning came first.
  if (before && before.state !== 'dropped') return false
  const changed = prompts.flatMap(({ positions }) => positions)
  const queued = await queueText(tx, deps, {
    purpose: `prompt:${facts.kit.id}:${first.kind}:${first.dueOn}:${(before?.tries ?? 0) + 1}`,
    moment: text.moment,
    phone,
    household: facts.household,
    kitId: facts.kit.id,
    values: { stage: stageKey(changed), dueOn: first.dueOn, litres: facts.model.bottleLitres },
    sendAfter: sendAt,
    notAfter: expiresAt(sendAt),
    anyHour: false,
  })
  if (!queued.ok) return false
  for (const prompt of prompts) {
    const row = { kitId: facts.kit.id, ...prompt, textId: queued.textId, createdAt: now }
    await upsertPrompt(tx, row)
  }
  return true
}

/**
 * Plans what is due: per kit one text, in one transaction with its prompts, so that a process which dies
 * half-way has planned a kit whole or not at all. Nobody gets more than the weekly limit, and a prompt
 * that exists for its kit, kind and date is never made twice.
 */
export async function planPrompts(deps: Deps): Promise<{ planned: number }> {
  const { db } = deps.store
  const now = deps.clock.now()
  const latestDay = localDay(now, 'Pacific/Kiritimati')
  const { programme, sending } = await settingsNow(db)
  const horizon = addDays(latestDay, sending.bundleDays)
  const kits = byKit(await listDue(db, horizon, KITS_A_RUN))
  if (kits.size === 0) return { planned: 0 }
  let spreadIndex = await countWaitingTexts(db, now)
  const limit = sending.promptsAWeek
  let planned = 0
  for (const [kitId, rows] of kits) {
    // Nothing is due in any zone yet: most kits of the horizon need no further look.
    if (!rows.some(({ dueOn }) => dueOn <= latestDay)) continue
    const facts = await findKitFacts(db, kitId)
    if (!facts) continue
    const window = windowOf(facts.area)
    const text = textFor(rows.map(asDue), localDay(now, window.timeZone), sending)
    if (!text) continue
    const perMinute = programme.textsPerMinute
    const sendAt = sendAfter({ now, window, spreadIndex, perMinute })
    // The embedded database answers without giving way: whoever waits for the desk goes first.
    await setImmediate()
    const done = await deps.store.transaction((tx) =>
      writePlan(tx, deps, { facts, text, sendAt, limit }),
    )
    if (done) {
      planned += 1
      spreadIndex += 1
    }
  }
  return { planned }
}
