import { knownKinds, shareOf, type Known, type Share } from './measure'
import { survival, survivalQuantile } from './measure-survival'
import { stockOuts, type StockMove } from './part-ledger'
import { studentQuantile, upperTail95 } from './quantile'

/** What became of one prompt. `done` is how it is known to be done, null if it is not known. */
export type PromptFate = {
  sent: boolean
  delivered: boolean
  answered: boolean
  done: Known | null
}

/**
 * Prompts down the stairs: sent of planned, delivered of sent, answered and done of delivered. The
 * silent are delivered and unanswered, a row of their own; done stands in its three columns.
 */
export function promptStairs(prompts: readonly PromptFate[], cutOffAt: number) {
  const sent = prompts.filter((prompt) => prompt.sent)
  const delivered = sent.filter((prompt) => prompt.delivered)
  const answered = delivered.filter((prompt) => prompt.answered)
  const doneAs = (known: Known) =>
    shareOf(delivered.filter(({ done }) => done === known).length, delivered.length)
  const [said, measured, seen] = knownKinds.map(doneAs) as [Share, Share, Share]
  return {
    planned: prompts.length,
    sent: shareOf(sent.length, prompts.length),
    delivered: shareOf(delivered.length, sent.length),
    answered: shareOf(answered.length, delivered.length),
    silent: shareOf(delivered.length - answered.length, delivered.length),
    done: { said, measured, seen },
    cutOffAt,
  }
}

const day = 86_400_000

/** A trouble as followed. `restoredAt` is null if the water did not come back, `endedAt` if open. */
export type TroubleSpan = {
  openedAt: number
  restoredAt: number | null
  endedAt: number | null
}

/**
 * Days until the water is back: by when half and nine tenths had it again. Open troubles, and
 * those that ended otherwise, count for as long as they were followed, so that a slow week does
 * not look quick by leaving its worst cases out.
 */
export function timeToRestore(troubles: readonly TroubleSpan[], cutOffAt: number) {
  const times = troubles
    .filter(({ openedAt }) => openedAt <= cutOffAt)
    .map(({ openedAt, restoredAt, endedAt }) => {
      const restored = restoredAt !== null && restoredAt <= cutOffAt
      const until = restored ? restoredAt : Math.min(endedAt ?? cutOffAt, cutOffAt)
      return { days: (until - openedAt) / day, failed: restored }
    })
  const steps = survival(times)
  return {
    n: times.length,
    restored: times.filter(({ failed }) => failed).length,
    median: survivalQuantile(steps, 0.5),
    ninety: survivalQuantile(steps, 0.9),
    cutOffAt,
  }
}

/** What the troubles came from, the commonest first, each with its share of all. */
export function causesOf(causes: readonly (string | null)[]): (Share & { cause: string | null })[] {
  const counts = new Map<string | null, number>()
  for (const cause of causes) counts.set(cause, (counts.get(cause) ?? 0) + 1)
  return [...counts]
    .map(([cause, count]) => ({ cause, ...shareOf(count, causes.length) }))
    .sort((one, other) => other.count - one.count)
}

/** How often depots had none of a part, of `n` ledgers (one a part and depot). */
export function stockOutShare(
  ledgers: readonly (readonly StockMove[])[],
  { from, to }: { from: number; to: number },
) {
  const outs = ledgers.map((moves) => stockOuts(moves, { from, to }))
  const outMilliseconds = outs.reduce((sum, { milliseconds }) => sum + milliseconds, 0)
  const looked = ledgers.length * (to - from)
  return {
    ...shareOf(outs.filter(({ times }) => times > 0).length, ledgers.length),
    times: outs.reduce((sum, { times }) => sum + times, 0),
    shareOfTime: looked > 0 ? outMilliseconds / looked : null,
    cutOffAt: to,
  }
}

/**
 * Cost of keeping one household's filter running for one month: all cost over all household-months,
 * with the 95 % interval of a ratio estimate (Cochran, Sampling Techniques, chapter 6). The
 * interval is null for fewer than two households.
 */
export function costPerHouseholdMonth(
  households: readonly { cost: number; months: number }[],
  cutOffOn: string,
) {
  const n = households.length
  const months = households.reduce((sum, household) => sum + household.months, 0)
  const cost = households.reduce((sum, household) => sum + household.cost, 0)
  if (months === 0) return { n, months, cost: null, low: null, high: null, cutOffOn }
  const ratio = cost / months
  if (n < 2) return { n, months, cost: ratio, low: null, high: null, cutOffOn }
  const residue = households.reduce((sum, one) => sum + (one.cost - ratio * one.months) ** 2, 0)
  const error = Math.sqrt(residue / (n - 1) / n) / (months / n)
  const reach = studentQuantile(upperTail95, n - 1) * error
  return { n, months, cost: ratio, low: ratio - reach, high: ratio + reach, cutOffOn }
}
