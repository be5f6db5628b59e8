import { daysBetween } from './day'

export { insideWindow, localDay, localMinute, nextInsideWindow, type Window } from './round-window'
export { planAhead, type KitAhead } from './round-ahead'
export { sendAfter } from './round-spread'

export type DueKind = 'wash' | 'change' | 'flow check' | 'welcome'

/** Something due for a kit. `stagePosition` says which stage, for a change. */
export type Due = { kind: DueKind; dueOn: string; stagePosition?: number }

/** What a coordinator may set about the sending of prompts. */
export type SendingSettings = {
  /** Prompts to a household in 7 days at most. */
  promptsAWeek: number
  /** What falls due within so many days goes into one text. */
  bundleDays: number
  /** From a prompt that nobody answers to its first nudge. */
  firstNudgeDays: number
  /** From the first nudge to the second. */
  secondNudgeDays: number
}

/** Common practice, no source. */
export const sendingDefaults: SendingSettings = {
  promptsAWeek: 2,
  bundleDays: 4,
  firstNudgeDays: 3,
  secondNudgeDays: 7,
}

/**
 * What goes into one text today: all that is due, and what falls within `bundleDays`, in order of
 * its day, so that a household hears once. Empty if nothing is due yet.
 */
export function bundle(
  due: readonly Due[],
  today: string,
  { bundleDays }: Pick<SendingSettings, 'bundleDays'> = sendingDefaults,
): Due[] {
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
  limit = sendingDefaults.promptsAWeek,
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
 * its first nudge; `nudges` how many nudges it has had. After the second there is no more nudging
 * and silence is a trouble: null.
 */
export function nudgeAfter(
  sentAt: number,
  nudges: number,
  settings: Pick<SendingSettings, 'firstNudgeDays' | 'secondNudgeDays'> = sendingDefaults,
): number | null {
  if (nudges === 0) return sentAt + settings.firstNudgeDays * day
  return nudges === 1 ? sentAt + settings.secondNudgeDays * day : null
}
