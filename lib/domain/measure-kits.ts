import { daysBetween } from './day'
import { knownKinds, shareOf, type Known, type Share } from './measure'
import { medianInterval, type Spread } from './measure-median'
import { survival, survivalQuantile, type LifeTime } from './measure-survival'

/** Kits with no stage and no wash overdue on the cut-off day. */
export function kitsInDate(
  kits: readonly { dueOn: readonly string[] }[],
  cutOffOn: string,
): Share & { cutOffOn: string } {
  const inDate = kits.filter(({ dueOn }) => dueOn.every((day) => day >= cutOffOn))
  return { ...shareOf(inDate.length, kits.length), cutOffOn }
}

/** What was learnt of a kit once: whether it gave enough, and how that is known. */
export type Evidence = { kitId: string; known: Known; flowing: boolean; on: string }

export type FlowColumn = {
  /** Kits whose last word of this kind is that they flow, of all kits. */
  flowing: Share
  notFlowing: number
  /** Kits of which nothing of this kind is known within the fresh days. */
  unknown: number
  /** Age in days of that last word. */
  ageDays: Spread | null
}

export type KitsFlowing = {
  n: number
  cutOffOn: string
  freshDays: number
  columns: Record<Known, FlowColumn>
  /** Kits of which nothing at all is known within the fresh days: never counted as flowing. */
  silent: Share
}

/**
 * Which kits flow, by their last reading, in three columns that are never added up: what
 * households say, what was measured, what was seen. Every share is of all kits, so that silence
 * pulls a figure down and never up. Evidence after the cut-off or older than `freshDays` is left.
 */
export function kitsFlowing({
  kitIds,
  evidence,
  cutOffOn,
  freshDays = 60,
}: {
  kitIds: readonly string[]
  evidence: readonly Evidence[]
  cutOffOn: string
  freshDays?: number
}): KitsFlowing {
  const kits = new Set(kitIds)
  const fresh = evidence.filter(({ kitId, on }) => {
    const age = daysBetween(on, cutOffOn)
    return kits.has(kitId) && age >= 0 && age <= freshDays
  })
  const heard = new Set(fresh.map(({ kitId }) => kitId))
  const columnOf = (known: Known) =>
    flowColumn(
      fresh.filter((piece) => piece.known === known),
      kits.size,
      cutOffOn,
    )
  const [said, measured, seen] = knownKinds.map(columnOf) as [FlowColumn, FlowColumn, FlowColumn]
  return {
    n: kits.size,
    cutOffOn,
    freshDays,
    columns: { said, measured, seen },
    silent: shareOf(kits.size - heard.size, kits.size),
  }
}

function flowColumn(evidence: readonly Evidence[], n: number, cutOffOn: string): FlowColumn {
  const last = new Map<string, Evidence>()
  for (const piece of evidence) {
    const before = last.get(piece.kitId)
    // Of two words of one day the worse counts.
    if (!before || piece.on > before.on || (piece.on === before.on && !piece.flowing)) {
      last.set(piece.kitId, piece)
    }
  }
  const words = [...last.values()]
  const flowing = words.filter((word) => word.flowing).length
  return {
    flowing: shareOf(flowing, n),
    notFlowing: words.length - flowing,
    unknown: n - words.length,
    ageDays: medianInterval(words.map(({ on }) => daysBetween(on, cutOffOn))),
  }
}

/** A fitting or a kit as followed: `failedOn` if it failed, `lastKnownOn` the last sign of it. */
export type Followed = { fittedOn: string; failedOn: string | null; lastKnownOn: string }

/**
 * How long filters last. What has not failed by the cut-off, or was lost from sight before it, is
 * followed up to the last sign of it and not counted as failed.
 */
export function filterSurvival(followed: readonly Followed[], cutOffOn: string) {
  const times = followed
    .filter(({ fittedOn }) => fittedOn <= cutOffOn)
    .map(({ fittedOn, failedOn, lastKnownOn }): LifeTime => {
      const failed = failedOn !== null && failedOn <= cutOffOn
      const until = failed ? failedOn : lastKnownOn < cutOffOn ? lastKnownOn : cutOffOn
      return { days: Math.max(0, daysBetween(fittedOn, until)), failed }
    })
  const steps = survival(times)
  return {
    n: times.length,
    failed: times.filter(({ failed }) => failed).length,
    cutOffOn,
    steps,
    median: survivalQuantile(steps, 0.5),
  }
}
