import { dayNumber } from './day'
import { localDay } from './round-window'

/*
 * Days and hours as staff read them. Always with the area's own zone: a page made on the server and one
 * made in a browser elsewhere must say the same.
 */

const dayMilliseconds = 86_400_000

const plainDay = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  timeZone: 'UTC',
})

const plainShortDay = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  timeZone: 'UTC',
})

/** A day as `12 Mar`: where the year is told beside it, or is this year. */
export function shortDayWords(day: string): string {
  return plainShortDay.format(dayNumber(day) * dayMilliseconds)
}

/** A day as `12 Mar 2026`. */
export function dayWords(day: string): string {
  return plainDay.format(dayNumber(day) * dayMilliseconds)
}

/** An instant's local hour as `08:20`. */
export function clockWords(at: number, timeZone: string): string {
  return new Intl.DateTimeFormat('en-GB', {
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
    timeZone,
  }).format(at)
}

/** An instant's local day and hour as `12 Mar 2026, 08:20`. */
export function momentWords(at: number, timeZone: string): string {
  return `${dayWords(localDay(at, timeZone))}, ${clockWords(at, timeZone)}`
}

/** How far a day lies from today: `today`, `in 12 days`, `3 days ago`. */
export function distanceWords(day: string, today: string): string {
  const days = dayNumber(day) - dayNumber(today)
  if (days === 0) return 'today'
  const count = `${Math.abs(days)} ${Math.abs(days) === 1 ? 'day' : 'days'}`
  return days > 0 ? `in ${count}` : `${count} ago`
}

/** How far ahead something due lies: `today`, `in 12 days`, `3 days late`. */
export function dueWords(day: string, today: string): string {
  return distanceWords(day, today).replace(/ ago$/, ' late')
}

/** Minutes after midnight as `08:00`; the end of the day is `24:00`. */
export function minuteWords(minute: number): string {
  const pad = (value: number) => String(value).padStart(2, '0')
  return `${pad(Math.floor(minute / 60))}:${pad(minute % 60)}`
}
