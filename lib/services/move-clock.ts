import { countHappened, findWaiting } from '@/db/queries/practice'
import { listDue } from '@/db/queries/prompt'
import { listTimeZones } from '@/db/queries/time-zone'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import { localDay } from '@/lib/domain/round'
import type { Refusal } from '@/lib/schemas/endpoint'
import type { Moved, MoveClock } from '@/lib/schemas/practice'
import { followSilence } from './follow-silence'
import { planPrompts } from './plan-prompts'
import { practiceDesk } from './practice'
import { reconcileAttempts } from './reconcile-attempts'
import { sendDueTexts } from './send-text'

const minute = 60_000
const hour = 60 * minute
/** Prompts leave seconds apart: one look takes those of the next minutes together. */
const SHORTEST_STEP = 5 * minute
/** Planning turns on the local day; in between it is only asked for what a weekly limit held back. */
const PLANNING_STEP = 6 * hour
/** How far "to the next thing due" looks: longer than any sending window stays shut. */
const NEXT_LIMIT_HOURS = 21 * 24

const moving = new WeakSet<object>()

/** How far to go before looking again: to the next known hour, never over an hour. */
export function stepTo({
  now,
  target,
  next,
}: {
  now: number
  target: number
  next: number | null
}): number {
  const toNext = next === null || next <= now ? hour : Math.max(next - now, SHORTEST_STEP)
  return Math.min(hour, toNext, target - now)
}

/** When planning last ran: at which instant, on which local days. */
type Planned = { at: number; days: string }

async function planIfDue(deps: Deps, zones: readonly string[], last: Planned): Promise<Planned> {
  const now = deps.clock.now()
  const days = zones.map((zone) => localDay(now, zone)).join()
  if (days === last.days && now - last.at < PLANNING_STEP) return last
  const latestDay = localDay(now, 'Pacific/Kiritimati')
  if ((await listDue(deps.store.db, latestDay, 1)).length > 0) await planPrompts(deps)
  return { at: now, days }
}

/** Does what has fallen due, and says what falls due next. */
async function sweep(deps: Deps): Promise<number | null> {
  const isDue = (at: number | null) => at !== null && at <= deps.clock.now()
  const before = await findWaiting(deps.store.db)
  const textIsDue = isDue(before.textAt)
  const nudgeIsDue = isDue(before.nudgeAt)
  if (before.inDoubt) await reconcileAttempts(deps)
  if (nudgeIsDue) await followSilence(deps)
  if (textIsDue || nudgeIsDue) await sendDueTexts(deps)
  const nothingDone = !before.inDoubt && !nudgeIsDue && !textIsDue
  const { textAt, nudgeAt } = nothingDone ? before : await findWaiting(deps.store.db)
  const ahead = [textAt, nudgeAt].filter((at) => at !== null)
  return ahead.length > 0 ? Math.min(...ahead) : null
}

type Move = { target: number; isEnough: () => Promise<boolean> }

async function move(deps: Deps, { target, isEnough }: Move): Promise<void> {
  const zones = await listTimeZones(deps.store.db)
  let planned: Planned = { at: 0, days: '' }
  let next: number | null = null
  while (deps.clock.now() < target) {
    deps.practice?.advance(stepTo({ now: deps.clock.now(), target, next }))
    planned = await planIfDue(deps, zones, planned)
    next = await sweep(deps)
    if (await isEnough()) return
  }
}

/**
 * Moves the practice clock forward and, on the way, does what the desk would have done by itself at each
 * hour: plan, send, nudge, look after texts in doubt. Households do not answer meanwhile.
 */
export async function moveClock(
  deps: Deps,
  actor: Actor,
  input: MoveClock,
): Promise<Moved | Refusal> {
  allow(actor, 'move the practice clock')
  const { practice } = deps
  if (!practice) return { ok: false, reason: 'not found' }
  if (moving.has(practice)) return { ok: false, reason: 'The clock is being moved already.' }
  moving.add(practice)
  const from = deps.clock.now()
  try {
    const hours = 'hours' in input ? input.hours : NEXT_LIMIT_HOURS
    const isEnough = async () => 'toNext' in input && (await happened(deps, from)).texts > 0
    await move(deps, { target: from + hours * hour, isEnough })
  } finally {
    moving.delete(practice)
  }
  const desk = await practiceDesk(deps, actor)
  if ('ok' in desk) return desk
  const moved = Math.round((deps.clock.now() - from) / hour)
  return { practice: desk, moved: spanWords(moved), ...(await happened(deps, from)) }
}

function happened(deps: Deps, from: number) {
  return countHappened(deps.store.db, { from, to: deps.clock.now() })
}

/** Hours as `1 hour`, `2 days`, `1 day 4 hours`. */
function spanWords(hours: number): string {
  const count = (n: number, word: string) => `${n} ${word}${n === 1 ? '' : 's'}`
  const days = Math.floor(hours / 24)
  const rest = hours % 24
  if (days === 0) return count(rest, 'hour')
  return rest === 0 ? count(days, 'day') : `${count(days, 'day')} ${count(rest, 'hour')}`
}
