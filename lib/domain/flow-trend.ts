import { flowDefaults, flowErrorShare, type FlowSettings } from './flow-settings'
import { normalQuantile, studentQuantile, upperTail95 } from './quantile'
import { localDay } from './round-window'

/** A flow reading; `normalised` is L/h at 20 °C and full head. */
export type Reading = { takenAt: number; normalised: number }

/**
 * When a filter's flow falls under the need. `perDay` is the share of the flow lost a day.
 * `latestAt` is null when the readings cannot tell a fall from none.
 */
export type Forecast =
  | { kind: 'too few' }
  | { kind: 'holds' }
  | { kind: 'falls'; onAt: number; earliestAt: number; latestAt: number | null; perDay: number }

const millisecondsPerDay = 86_400_000

/** Beyond this many days after the last reading a straight line says nothing worth planning by. */
const horizonDays = 365

type Line = {
  level: number
  slope: number
  meanDay: number
  spread: number
  n: number
  sxx: number
}

/** Least squares of ln flow over days since the first reading; null if all are of one moment. */
function fitLine(points: readonly { day: number; log: number }[], errorShare: number): Line | null {
  const n = points.length
  const meanDay = points.reduce((sum, { day }) => sum + day, 0) / n
  const level = points.reduce((sum, { log }) => sum + log, 0) / n
  const sxx = points.reduce((sum, { day }) => sum + (day - meanDay) ** 2, 0)
  if (sxx === 0) return null
  const sxy = points.reduce((sum, { day, log }) => sum + (day - meanDay) * (log - level), 0)
  const slope = sxy / sxx
  const residue = points.reduce(
    (sum, { day, log }) => sum + (log - level - slope * (day - meanDay)) ** 2,
    0,
  )
  const freedom = n - 2
  // Three readings may lie on one line by luck: the band is never narrower than what a reading
  // is known to err by.
  const spread = Math.max(
    studentQuantile(upperTail95, freedom) * Math.sqrt(residue / freedom),
    normalQuantile(upperTail95) * errorShare,
  )
  return { level, slope, meanDay, spread, n, sxx }
}

/**
 * Days from the mean day between which the line's 95 % band meets the need (Fieller): the roots of
 * (drop + slope·x)² = spread²·(1/n + x²/sxx), looked for from the first reading on. `latest` is
 * null where the slope cannot be told from level, so that the upper edge need never fall under.
 */
function crossingBand(line: Line, drop: number): { earliest: number; latest: number | null } {
  const first = -line.meanDay
  const a = line.slope ** 2 - line.spread ** 2 / line.sxx
  const b = 2 * drop * line.slope
  const c = drop ** 2 - line.spread ** 2 / line.n
  const half = -(b + (b < 0 ? -1 : 1) * Math.sqrt(Math.max(0, b * b - 4 * a * c))) / 2
  const roots = [half / a, c / half].filter(Number.isFinite)
  const lowerEdge =
    drop + line.slope * first - line.spread * Math.sqrt(1 / line.n + first ** 2 / line.sxx)
  return {
    earliest: lowerEdge < 0 ? first : Math.min(...roots.filter((root) => root >= first)),
    latest: a > 0 ? Math.max(first, ...roots) : null,
  }
}

/**
 * A line through ln Q20 of the readings since the last change, and the moment it falls under the
 * need, with its 95 % interval. Under three readings there is no forecast. A reading of no flow has
 * no logarithm and is left out: it is a trouble of its own. It never says why the flow falls.
 * A crossing in the past means the line is under the need already; it is never looked for before
 * the first reading.
 */
export function trend(
  readings: readonly Reading[],
  needLitresPerHour: number,
  settings: Pick<FlowSettings, 'timeErrorShare' | 'bottleErrorShare'> = flowDefaults,
): Forecast {
  const flowing = readings.filter(({ normalised }) => normalised > 0)
  const firstAt = Math.min(...flowing.map(({ takenAt }) => takenAt))
  const lastAt = Math.max(...flowing.map(({ takenAt }) => takenAt))
  const points = flowing.map(({ takenAt, normalised }) => ({
    day: (takenAt - firstAt) / millisecondsPerDay,
    log: Math.log(normalised),
  }))
  const line = points.length < 3 ? null : fitLine(points, flowErrorShare(settings))
  if (line === null) return { kind: 'too few' }

  const drop = line.level - Math.log(needLitresPerHour)
  const lastDay = (lastAt - firstAt) / millisecondsPerDay
  const under = drop + line.slope * (lastDay - line.meanDay) < 0
  const toInstant = (day: number) => Math.round(firstAt + (line.meanDay + day) * millisecondsPerDay)
  if (line.slope >= 0) {
    if (!under) return { kind: 'holds' }
    return { kind: 'falls', onAt: lastAt, earliestAt: firstAt, latestAt: null, perDay: 0 }
  }
  const crossing = Math.max(-drop / line.slope, -line.meanDay)
  if (line.meanDay + crossing > lastDay + horizonDays) return { kind: 'holds' }
  const { earliest, latest } = crossingBand(line, drop)
  return {
    kind: 'falls',
    onAt: toInstant(crossing),
    earliestAt: toInstant(earliest),
    latestAt: latest === null ? null : toInstant(latest),
    perDay: 1 - Math.exp(line.slope),
  }
}

/**
 * The local day on which a falling line meets the need, for the wash cycle; in the past when it was
 * under the need before. Null where no fall is foretold: more washes do not help a filter that runs
 * low without falling.
 */
export function shortOn(forecast: Forecast, timeZone: string): string | null {
  if (forecast.kind !== 'falls' || forecast.perDay === 0) return null
  return localDay(forecast.onAt, timeZone)
}
