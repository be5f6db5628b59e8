import { tzOffset } from '@date-fns/tz'
import { toDate } from 'date-fns'
import { dayOfNumber, isSunday } from './day'

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

/** What calendar and wall clock show: the day's number and the minute of it. */
function wallAt(at: number, timeZone: string): { dayNumber: number; minute: number } {
  const local = at + offsetAt(at, timeZone)
  const number = Math.floor(local / day)
  return { dayNumber: number, minute: Math.floor((local - number * day) / minute) }
}

/** The calendar day of an instant in a zone. */
export function localDay(at: number, timeZone: string): string {
  return dayOfNumber(wallAt(at, timeZone).dayNumber)
}

/** The minute of the local day, 0 to 1439, as the clock on the wall shows it. */
export function localMinute(at: number, timeZone: string): number {
  return wallAt(at, timeZone).minute
}

function isDayOff(number: number, window: Window): boolean {
  if (window.sundaysOff && isSunday(number)) return true
  return window.holidays.length > 0 && window.holidays.includes(dayOfNumber(number))
}

/** Whether a text may go out: opening ≤ wall clock < closing, on a day that is not off. */
export function insideWindow(at: number, window: Window): boolean {
  const wall = wallAt(at, window.timeZone)
  if (wall.minute < window.opensMinute || wall.minute >= window.closesMinute) return false
  return !isDayOff(wall.dayNumber, window)
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
function instantsOf(number: number, clockMinutes: readonly number[], timeZone: string) {
  const midnight = number * day
  // Zones run from UTC-12 to UTC+14: these two instants enclose the local day in any of them.
  const before = midnight - 15 * 60 * minute
  const after = midnight + day + 13 * 60 * minute
  const offset = offsetAt(before, timeZone)
  const instantsAt = (at: number) => clockMinutes.map((clock) => midnight + clock * minute - at)
  const instants = instantsAt(offset)
  const laterOffset = offsetAt(after, timeZone)
  if (laterOffset !== offset) {
    instants.push(...instantsAt(laterOffset), changeOfOffset(before, after, timeZone))
  }
  return instants.filter((instant) => wallAt(instant, timeZone).dayNumber === number)
}

const searchDays = 400

/** The first instant from `at` on that lies inside the window. Throws if there is none in a year. */
export function nextInsideWindow(at: number, window: Window): number {
  if (insideWindow(at, window)) return at
  const today = wallAt(at, window.timeZone).dayNumber
  for (let number = today; number <= today + searchDays; number += 1) {
    if (isDayOff(number, window)) continue
    const openings = instantsOf(number, [window.opensMinute], window.timeZone)
    const inside = openings.filter((opening) => opening > at && insideWindow(opening, window))
    if (inside.length > 0) return Math.min(...inside)
  }
  throw new RangeError('the sending window never opens')
}

/** The first instant after `at` and up to `until` that lies outside the window; null if none. */
export function windowClosesAt(at: number, until: number, window: Window): number | null {
  const { timeZone, closesMinute } = window
  const today = wallAt(at, timeZone)
  // The common case, for a round of thousands: it is over before the window of this day closes,
  // and the clocks do not change in between.
  const closesToday = at + (closesMinute - today.minute - 1) * minute
  if (until < closesToday && offsetAt(at, timeZone) === offsetAt(closesToday, timeZone)) return null
  const lastDay = wallAt(until, timeZone).dayNumber
  for (let number = today.dayNumber; number <= lastDay; number += 1) {
    const edges = instantsOf(number, [0, closesMinute], timeZone)
    const outside = edges.filter((edge) => edge > at && !insideWindow(edge, window))
    const closesAt = Math.min(...outside)
    if (closesAt <= until) return closesAt
  }
  return null
}
