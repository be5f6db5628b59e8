import { tzOffset } from '@date-fns/tz'
import { toDate } from 'date-fns'
import { addDays, dayNumber, dayOfNumber, weekdayOf } from './day'

/** When an area may be texted, in its own local time. Minutes count from midnight. */
export type Window = {
  timeZone: string
  opensMinute: number
  closesMinute: number
  sundaysOff: boolean
  /** Days without prompts. */
  holidays: readonly string[]
}

const minute = 60_000
const day = 1440 * minute

function offsetAt(at: number, timeZone: string): number {
  const offsetMinutes = tzOffset(timeZone, toDate(at))
  if (Number.isNaN(offsetMinutes)) throw new RangeError(`no such time zone: ${timeZone}`)
  return offsetMinutes * minute
}

/** The calendar day of an instant in a zone. */
export function localDay(at: number, timeZone: string): string {
  return dayOfNumber(Math.floor((at + offsetAt(at, timeZone)) / day))
}

/** The minute of the local day, 0 to 1439, as the clock on the wall shows it. */
export function localMinute(at: number, timeZone: string): number {
  const local = at + offsetAt(at, timeZone)
  return Math.floor((local - Math.floor(local / day) * day) / minute)
}

function isDayOff(localDayOn: string, window: Window): boolean {
  return (window.sundaysOff && weekdayOf(localDayOn) === 0) || window.holidays.includes(localDayOn)
}

/** Whether a text may go out: opening ≤ wall clock < closing, on a day that is not off. */
export function insideWindow(at: number, window: Window): boolean {
  const clock = localMinute(at, window.timeZone)
  if (clock < window.opensMinute || clock >= window.closesMinute) return false
  return !isDayOff(localDay(at, window.timeZone), window)
}

/** The first instant in (before, after] that has the later offset. */
function changeOfOffset(before: number, after: number, timeZone: string): number {
  const later = offsetAt(after, timeZone)
  let low = before
  let high = after
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2)
    if (offsetAt(middle, timeZone) === later) high = middle
    else low = middle
  }
  return high
}

/**
 * Every instant of a local day at which the wall clock may come to show one of `clockMinutes`.
 * When the clocks change that day there may be two of them, or none but the change itself.
 */
function instantsOf(localDayOn: string, clockMinutes: readonly number[], timeZone: string) {
  const midnight = dayNumber(localDayOn) * day
  // Zones run from UTC-12 to UTC+14: these two instants enclose the local day in any of them.
  const before = midnight - 15 * 60 * minute
  const after = midnight + day + 13 * 60 * minute
  const offsets = [offsetAt(before, timeZone), offsetAt(after, timeZone)]
  const instants = offsets.flatMap((offset) =>
    clockMinutes.map((clock) => midnight + clock * minute - offset),
  )
  if (offsets[0] !== offsets[1]) instants.push(changeOfOffset(before, after, timeZone))
  return instants.filter((instant) => localDay(instant, timeZone) === localDayOn)
}

const searchDays = 400

/** The first instant from `at` on that lies inside the window. Throws if there is none in a year. */
export function nextInsideWindow(at: number, window: Window): number {
  if (insideWindow(at, window)) return at
  const firstDay = localDay(at, window.timeZone)
  for (let ahead = 0; ahead <= searchDays; ahead += 1) {
    const localDayOn = addDays(firstDay, ahead)
    if (isDayOff(localDayOn, window)) continue
    const openings = instantsOf(localDayOn, [window.opensMinute], window.timeZone)
    const inside = openings.filter((opening) => opening > at && insideWindow(opening, window))
    if (inside.length > 0) return Math.min(...inside)
  }
  throw new RangeError('the sending window never opens')
}

/** The first instant after `at` and up to `until` that lies outside the window; null if none. */
export function windowClosesAt(at: number, until: number, window: Window): number | null {
  const lastDay = localDay(until, window.timeZone)
  for (let on = localDay(at, window.timeZone); on <= lastDay; on = addDays(on, 1)) {
    const edges = instantsOf(on, [0, window.closesMinute], window.timeZone)
    const outside = edges.filter((edge) => edge > at && !insideWindow(edge, window))
    const closesAt = Math.min(...outside)
    if (closesAt <= until) return closesAt
  }
  return null
}
