import { addDays, addMonths, daysBetween, monthOf } from './day'

/** How the household's raw water looks, as the trainer or the household told. */
export type SourceClass = 'clear' | 'cloudy' | 'very cloudy'

export type WashSettings = {
  /** Days between washes in the dry season. */
  days: Record<SourceClass, number>
  /** What is left of that interval in a wet month, when rivers run brown. */
  wetShare: number
  /** Washing oftener than this wears the fibre and the family. */
  floorDays: number
}

/** Common practice, no source. */
export const washDefaults: WashSettings = {
  days: { clear: 30, cloudy: 14, 'very cloudy': 7 },
  wetShare: 0.7,
  floorDays: 5,
}

/**
 * The day of the `count`-th change of a stage: its anchor plus `months * count`, the end of the
 * month clamped. Counted from the fitting, never from the last due date, so that a stage fitted
 * on the 31st does not drift to the 28th: `{ fittedOn: '2025-01-31', months: 1, count: 2 }` is
 * 2025-03-31.
 */
export function nextDue({
  fittedOn,
  months,
  count,
}: {
  fittedOn: string
  months: number
  count: number
}): string {
  return addMonths(fittedOn, months * count)
}

/** The day a fitting is to be changed. A new fitting starts its own cycle. */
export function nextChangeOn({
  fittedOn,
  changeMonths,
}: {
  fittedOn: string
  changeMonths: number
}): string {
  return nextDue({ fittedOn, months: changeMonths, count: 1 })
}

/**
 * Days from one wash to the next. `trendDays` is how many days after the last wash the trend sees
 * the flow fall under the family's need: it can bring the wash forward, never put it off.
 */
export function washIntervalDays({
  sourceClass,
  wet,
  trendDays,
  settings = washDefaults,
}: {
  sourceClass: SourceClass
  wet: boolean
  trendDays?: number | null
  settings?: WashSettings
}): number {
  const calendarDays = Math.floor(settings.days[sourceClass] * (wet ? settings.wetShare : 1))
  const neededDays = Math.floor(trendDays ?? calendarDays)
  return Math.max(settings.floorDays, Math.min(calendarDays, neededDays))
}

/** The next wash: the day that stands, and the day that the calendar alone gives. */
export type WashPlan = { nextWashOn: string; calendarWashOn: string }

/**
 * Plans the next wash, counted from the last one or from the day on which a question about it was
 * closed. `shortOn` is the day on which the trend sees the flow fall under the need: it brings the
 * wash forward, but not into the past and not under the floor, and never puts it off. Whether the
 * water is brown is told by the month the days are counted from.
 */
export function planWash({
  countedFrom,
  today,
  shortOn,
  sourceClass,
  wetMonths,
  settings = washDefaults,
}: {
  countedFrom: string
  today: string
  shortOn: string | null
  sourceClass: SourceClass
  wetMonths: readonly number[]
  settings?: WashSettings
}): WashPlan {
  const wet = wetMonths.includes(monthOf(countedFrom))
  const inDays = (trendDays: number | null) =>
    addDays(countedFrom, washIntervalDays({ sourceClass, wet, trendDays, settings }))
  const neededOn = shortOn !== null && shortOn < today ? today : shortOn
  return {
    nextWashOn: inDays(neededOn === null ? null : daysBetween(countedFrom, neededOn)),
    calendarWashOn: inDays(null),
  }
}
