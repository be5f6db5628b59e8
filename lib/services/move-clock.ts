import { countHappened, findNextHour } from '@/db/queries/practice'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
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

async function sweep(deps: Deps): Promise<void> {
  await planPrompts(deps)
  await sendDueTexts(deps)
  await followSilence(deps)
  await reconcileAttempts(deps)
}

async function move(deps: Deps, target: number, until: (from: number) => Promise<boolean>) {
  const from = deps.clock.now()
  while (deps.clock.now() < target) {
    const now = deps.clock.now()
    const next = await findNextHour(deps.store.db)
    deps.practice?.advance(stepTo({ now, target, next }))
    await sweep(deps)
    if (await until(from)) return
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
    await move(deps, from + hours * hour, async (start) => {
      if ('hours' in input) return false
      return (await happened(deps, start)).texts > 0
    })
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
