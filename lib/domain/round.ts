import { daysBetween } from './day'
import { localDay } from './round-window'

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

/**
 * Whether a household may be prompted now: under the weekly limit, and only if nothing goes or has gone to
 * it on this local day or is planned for a later one. Hours that lie ahead count as sent.
 */
export function hasRoom({
  sentAt,
  now,
  timeZone,
  limit = sendingDefaults.promptsAWeek,
}: {
  sentAt: readonly number[]
  now: number
  timeZone: string
  limit?: number
}): boolean {
  if (overWeeklyLimit({ sentAt: sentAt.map((at) => Math.min(at, now)), now, limit })) return false
  const today = localDay(now, timeZone)
  return !sentAt.some((at) => localDay(at, timeZone) >= today)
}

/** A prompt that has not gone 36 hours after its hour is dropped and planned anew. */
export function expiresAt(sendAfterAt: number): number {
  return sendAfterAt + 36 * hour
}

/** How long the last nudge is given before silence goes to a person. Common practice, no source. */
const afterLastNudgeDays = 3

/**
 * Until when an answer is waited for. `sentAt` is the last text of a prompt, the prompt itself or a nudge;
 * `nudges` how many nudges it has had by then.
 */
export function waitUntil(
  sentAt: number,
  nudges: number,
  settings: Pick<SendingSettings, 'firstNudgeDays' | 'secondNudgeDays'> = sendingDefaults,
): number {
  const { firstNudgeDays, secondNudgeDays } = settings
  return sentAt + ([firstNudgeDays, secondNudgeDays][nudges] ?? afterLastNudgeDays) * day
}

/** Whether a prompt has had all its nudges: silence after that is a trouble, for a person to look into. */
export function hadLastNudge(nudges: number): boolean {
  return nudges >= 2
}
