import { addDays } from './day'
import { normalQuantile } from './quantile'

export { available, countCorrection, onHand, stockOuts } from './part-ledger'

function chanceArgument(chance: number) {
  if (!(chance > 0 && chance < 1)) throw new RangeError('a chance lies between 0 and 1')
}

/** Chance that a Poisson demand of this mean is at most `upTo`. */
export function demandAtMost({ mean, upTo }: { mean: number; upTo: number }): number {
  if (!(mean >= 0)) throw new RangeError('a mean demand is not negative')
  if (mean === 0) return upTo < 0 ? 0 : 1
  let logTerm = -mean // in logarithms, since e^-mean is 0 to a computer for a mean above 745
  let sum = 0
  for (let count = 0; count <= upTo; count += 1) {
    if (count > 0) logTerm += Math.log(mean / count)
    sum += Math.exp(logTerm)
  }
  return Math.min(1, sum)
}

/**
 * The smallest stock that lasts with the stated chance: smallest S with P(demand ≤ S) ≥ chance,
 * the demand being Poisson. This is the chance of not running out, not the share of demands met:
 * for that see `fillRate`.
 */
export function orderUpTo({ mean, chance }: { mean: number; chance: number }): number {
  chanceArgument(chance)
  if (!(mean >= 0)) throw new RangeError('a mean demand is not negative')
  let logTerm = -mean
  let sum = Math.exp(logTerm)
  let stock = 0
  while (sum < chance && mean > 0) {
    stock += 1
    logTerm += Math.log(mean / stock)
    const term = Math.exp(logTerm)
    // Past the mean the terms only shrink: when they no longer count, rounding is all that is left.
    if (stock > mean && term < 1e-18) break
    sum += term
  }
  return stock
}

/**
 * Share of Poisson demands that find a part on the shelf when every one taken is ordered anew up
 * to `stock`: each demand must find fewer than `stock` others before it.
 */
export function fillRate({ mean, stock }: { mean: number; stock: number }): number {
  return demandAtMost({ mean, upTo: stock - 1 })
}

/** The smallest order-up-to stock whose fill rate reaches `share`. */
export function orderUpToForFill({ mean, share }: { mean: number; share: number }): number {
  chanceArgument(share)
  return orderUpTo({ mean, chance: share }) + 1
}

/**
 * The order-up-to stock for a steady demand told as mean and deviation a day, normally spread,
 * over the days until an order placed at the next review has come. Not rounded.
 */
export function orderUpToNormal({
  dailyMean,
  dailyDeviation,
  days,
  chance,
}: {
  dailyMean: number
  dailyDeviation: number
  days: number
  chance: number
}): number {
  return dailyMean * days + normalQuantile(chance) * dailyDeviation * Math.sqrt(days)
}

/** What drives the demand for one part at one depot. */
export type DemandInput = {
  /** Due days of the fittings of this part, overdue ones too. */
  dueOn: readonly string[]
  today: string
  /** Changes a day that no date foretold: spent early, cracked, lost. */
  conditionChangesPerDay: number
}

export type Demand = { fromDates: number; fromCondition: number; mean: number }

/**
 * Demand for a part over the coming `days`: every fitting due by then, overdue ones with them (the
 * wave that a hand-out day makes comes back whole), and the changes that condition will bring.
 */
export function demandAhead({
  dueOn,
  today,
  days,
  conditionChangesPerDay,
}: DemandInput & { days: number }): Demand {
  const lastDay = addDays(today, days)
  const fromDates = dueOn.filter((day) => day <= lastDay).length
  const fromCondition = Math.max(0, conditionChangesPerDay) * Math.max(0, days)
  return { fromDates, fromCondition, mean: fromDates + fromCondition }
}

/** Changes a day by condition, from `changes` seen in `days` of looking; 0 before any looking. */
export function conditionChangesPerDay({
  changes,
  days,
}: {
  changes: number
  days: number
}): number {
  return days > 0 ? changes / days : 0
}

/** The stock at which to order: what lasts, with the stated chance, until the order has come. */
export function reorderPoint({
  leadDays,
  chance,
  ...input
}: DemandInput & { leadDays: number; chance: number }): number {
  return orderUpTo({ mean: demandAhead({ ...input, days: leadDays }).mean, chance })
}

export type OrderPlan = { reorderAt: number; upTo: number; order: number; demand: Demand }

/**
 * What to order today for one part at one depot. `available` is what stands there unpromised plus
 * what is on its way. Nothing is ordered above the reorder point; at or under it, up to what lasts
 * until the order after this one has come.
 */
export function orderPlan({
  leadDays,
  reviewDays,
  chance,
  available: inStock,
  ...input
}: DemandInput & {
  leadDays: number
  reviewDays: number
  chance: number
  available: number
}): OrderPlan {
  const demand = demandAhead({ ...input, days: leadDays + reviewDays })
  const reorderAt = reorderPoint({ ...input, leadDays, chance })
  const upTo = orderUpTo({ mean: demand.mean, chance })
  return { reorderAt, upTo, demand, order: inStock <= reorderAt ? Math.max(0, upTo - inStock) : 0 }
}
