import { normalQuantile, upperTail95 } from './quantile'

/** How long something was followed, and whether it failed then or was only lost from sight. */
export type LifeTime = { days: number; failed: boolean }

/** The share still standing from this day on, with its 95 % interval, of `atRisk` before it. */
export type SurvivalStep = {
  days: number
  survival: number
  atRisk: number
  low: number
  high: number
}

/**
 * Kaplan and Meier's estimate: a step at every day on which something failed. Those lost from sight
 * (`failed` false) count as standing up to the day they were last known, and then no more. What is
 * lost on the day of a failure counts as at risk for it. Interval: Greenwood's variance on the
 * log(-log) scale; where nothing is left standing the upper end stays that of the step before.
 */
export function survival(times: readonly LifeTime[]): SurvivalStep[] {
  const failureDays = [...new Set(times.filter(({ failed }) => failed).map(({ days }) => days))]
  const z = normalQuantile(upperTail95)
  const steps: SurvivalStep[] = []
  let share = 1
  let greenwood = 0
  let high = 1
  for (const on of failureDays.sort((one, other) => one - other)) {
    const atRisk = times.filter(({ days }) => days >= on).length
    const failures = times.filter(({ days, failed }) => failed && days === on).length
    share *= 1 - failures / atRisk
    greenwood += failures / (atRisk * (atRisk - failures))
    let low = 0
    if (share > 0) {
      const reach = (z * Math.sqrt(greenwood)) / Math.abs(Math.log(share))
      low = share ** Math.exp(reach)
      high = share ** Math.exp(-reach)
    }
    steps.push({ days: on, survival: share, atRisk, low, high })
  }
  return steps
}

/**
 * The day by which a share has failed (0.5 is the median), with its 95 % interval; null for what
 * the follow-up was too short to see.
 */
export function survivalQuantile(steps: readonly SurvivalStep[], failedShare: number) {
  const standing = 1 - failedShare + 1e-12 // 1 - 0.9 is not quite 0.1 to a computer
  const firstDay = (read: (step: SurvivalStep) => number) =>
    steps.find((step) => read(step) <= standing)?.days ?? null
  return {
    days: firstDay((step) => step.survival),
    low: firstDay((step) => step.low),
    high: firstDay((step) => step.high),
  }
}
