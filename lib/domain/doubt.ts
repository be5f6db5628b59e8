/** A text as the carrier lists it, as far as it helps to recognise one of ours. */
export type ListedOutbound = { sid: string; body: string; createdAt: number }

export type DoubtDecision =
  | { kind: 'found'; sid: string; surplus: number }
  | { kind: 'wait' }
  | { kind: 'look again' }
  | { kind: 'not created' }

const BEFORE_MILLISECONDS = 5_000
const AFTER_MILLISECONDS = 120_000
const BETWEEN_LOOKS_MILLISECONDS = 120_000

/**
 * What became of an attempt that ended in doubt, from the carrier's own list of texts to that phone that
 * belong to no attempt. The same body made within 5 s before to 120 s after the POST is ours; the oldest
 * is taken and others are surplus. Only after two looks two minutes apart is it held not to exist.
 */
export function decideDoubt(attempt: {
  now: number
  postingAt: number
  looks: number
  lookedAt: number | null
  body: string
  listed: readonly ListedOutbound[]
}): DoubtDecision {
  const ours = attempt.listed
    .filter((text) => text.body === attempt.body)
    .filter((text) => text.createdAt >= attempt.postingAt - BEFORE_MILLISECONDS)
    .filter((text) => text.createdAt <= attempt.postingAt + AFTER_MILLISECONDS)
    .sort((one, other) => one.createdAt - other.createdAt)
  const first = ours[0]
  if (first) return { kind: 'found', sid: first.sid, surplus: ours.length - 1 }
  if (attempt.looks === 0 || attempt.lookedAt === null) return { kind: 'look again' }
  return attempt.now - attempt.lookedAt < BETWEEN_LOOKS_MILLISECONDS
    ? { kind: 'wait' }
    : { kind: 'not created' }
}
