import { startOfDay } from 'date-fns'
import { TZDate } from '@date-fns/tz'
import { weekdayOf } from './day'
import { hoursInWords, peopleInWords } from './harm-words'
import { localDay, localMinute } from './round-window'

const weekdays = ['Sunday', 'Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday']

/** `Tuesday, before noon`: the shift's own name for now, on an area's clock. */
export function shiftTitle(now: number, timeZone: string): string {
  const hour = Math.floor(localMinute(now, timeZone) / 60)
  const weekday = weekdays[weekdayOf(localDay(now, timeZone))] ?? ''
  return `${weekday}, ${partOfDay(hour)}`
}

function partOfDay(hour: number): string {
  if (hour < 5) return 'night'
  if (hour < 12) return 'before noon'
  return hour < 18 ? 'after noon' : 'evening'
}

/** How long: `5 h 30`, from four days on `6 days`. */
export function waitedInWords(sinceAt: number, now: number): string {
  const hours = Math.max(0, now - sinceAt) / 3_600_000
  return hours < 96 ? hoursInWords(hours) : `${Math.floor(hours / 24)} days`
}

type Counted = { houses: number; people: number; enough: number }

/** Beside a band's name: `4 houses, 18 people, enough to drink in 3`. */
export function bandNote({ houses, people, enough }: Counted): string {
  const count = houses === 1 ? '1 house' : `${houses} houses`
  const drink = enough > 0 ? `, enough to drink in ${enough}` : ''
  return `${count}, ${peopleInWords(people)}${drink}`
}

/** The instant at which the local day of `now` began. */
export function dayStart(now: number, timeZone: string): number {
  return startOfDay(new TZDate(now, timeZone)).getTime()
}

/** `Spanish or English`. */
export function eitherOf(names: readonly string[]): string {
  if (names.length < 2) return names[0] ?? 'no language'
  return `${names.slice(0, -1).join(', ')} or ${names.at(-1) ?? ''}`
}
