import { daysBetween } from './day'

export { insideWindow, localDay, localMinute, nextInsideWindow, type Window } from './round-window'
export { planAhead, type KitAhead } from './round-ahead'
export { sendAfter } from './round-spread'

export type DueKind = 'wash' | 'change' | 'flow check' | 'welcome'

/** Something due for a kit. `stagePosition` says which stage, for a change. */
export type Due = { kind: DueKind; dueOn: string; stagePosition?: number }

const bundleDays = 4

/**
 * What goes into one text today: all that is due, and what falls within 4 days, in order of its
 * day, so that a household hears once. Empty if nothing is due yet.
 */
export function bundle(due: readonly Due[], today: string): Due[] {
  if (!due.some(({ dueOn }) => dueOn <= today)) return []
  return due
    .filter(({ dueOn }) => daysBetween(today, dueOn) <= bundleDays)
    .sort((one, other) => daysBetween(other.dueOn, one.dueOn))
}

const hour = 3_600_000
const day = 24 * hour

/** Whether a household has had its prompts of the week: `limit` in the 7 days before now. */
export function overWeeklyLimit({
  sentAt,
  now,
  limit = 2,
}: {
  sentAt: readonly number[]
  now: number
  limit?: number
}): boolean {
  return sentAt.filter((at) => at > now - 7 * day && at <= now).length >= limit
}

/** A prompt that has not gone 36 hours after its hour is dropped and planned anew. */
export function expiresAt(sendAfterAt: number): number {
  return sendAfterAt + 36 * hour
}

/**
 * When to nudge a silent household. `sentAt` is the last text of this prompt, the prompt itself or
 * its first nudge; `nudges` how many nudges it has had. Three days after the prompt, seven after
 * the first nudge; after the second there is no more nudging and silence is a trouble: null.
 */
export function nudgeAfter(sentAt: number, nudges: number): number | null {
  if (nudges === 0) return sentAt + 3 * day
  return nudges === 1 ? sentAt + 7 * day : null
}
