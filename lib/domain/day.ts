/*
 * Calendar days as ISO strings (YYYY-MM-DD), counted as whole days since 1970-01-01.
 * Plain integer arithmetic in the proleptic Gregorian calendar: a day has no zone, so nothing
 * here can slip by one when the process runs in another zone than the household lives in.
 */

const daysPerEra = 146_097 // 400 Gregorian years
const epochShift = 719_468 // days from 0000-03-01 to 1970-01-01

type Parts = { year: number; month: number; dayOfMonth: number }

function partsOf(day: string): Parts {
  const match = /^(\d{4})-(\d{2})-(\d{2})$/.exec(day)
  const parts = {
    year: Number(match?.[1]),
    month: Number(match?.[2]),
    dayOfMonth: Number(match?.[3]),
  }
  const real =
    parts.month >= 1 &&
    parts.month <= 12 &&
    parts.dayOfMonth >= 1 &&
    parts.dayOfMonth <= daysInMonth(parts.year, parts.month)
  if (!real) throw new RangeError(`not a day: ${day}`)
  return parts
}

function isoOf({ year, month, dayOfMonth }: Parts): string {
  const pad = (value: number, width: number) => String(value).padStart(width, '0')
  return `${pad(year, 4)}-${pad(month, 2)}-${pad(dayOfMonth, 2)}`
}

/** Days in a month; `month` is 1 to 12. */
export function daysInMonth(year: number, month: number): number {
  if (month === 2) return year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0) ? 29 : 28
  return month === 4 || month === 6 || month === 9 || month === 11 ? 30 : 31
}

/**
 * Whole days from 1970-01-01 to the day. Throws a RangeError if the text is no real day.
 * Years start in March here, so that the leap day is the last of its year.
 */
export function dayNumber(day: string): number {
  const { year, month, dayOfMonth } = partsOf(day)
  const marchYear = month > 2 ? year : year - 1
  const era = Math.floor(marchYear / 400)
  const yearOfEra = marchYear - era * 400
  const dayOfYear = Math.floor((153 * ((month + 9) % 12) + 2) / 5) + dayOfMonth - 1
  const dayOfEra =
    yearOfEra * 365 + Math.floor(yearOfEra / 4) - Math.floor(yearOfEra / 100) + dayOfYear
  return era * daysPerEra + dayOfEra - epochShift
}

/** The day that lies `number` days after 1970-01-01: the inverse of `dayNumber`. */
export function dayOfNumber(number: number): string {
  const shifted = number + epochShift
  const era = Math.floor(shifted / daysPerEra)
  const dayOfEra = shifted - era * daysPerEra
  const yearOfEra = Math.floor(
    (dayOfEra -
      Math.floor(dayOfEra / 1460) +
      Math.floor(dayOfEra / 36_524) -
      Math.floor(dayOfEra / 146_096)) /
      365,
  )
  const dayOfYear =
    dayOfEra - (365 * yearOfEra + Math.floor(yearOfEra / 4) - Math.floor(yearOfEra / 100))
  const marchMonth = Math.floor((5 * dayOfYear + 2) / 153)
  const month = marchMonth < 10 ? marchMonth + 3 : marchMonth - 9
  return isoOf({
    year: yearOfEra + era * 400 + (month <= 2 ? 1 : 0),
    month,
    dayOfMonth: dayOfYear - Math.floor((153 * marchMonth + 2) / 5) + 1,
  })
}

/** The day `days` later (earlier when negative). */
export function addDays(day: string, days: number): string {
  return dayOfNumber(dayNumber(day) + days)
}

/** The same day of the month, `months` later; a day that month lacks becomes its last day. */
export function addMonths(day: string, months: number): string {
  const { year, month, dayOfMonth } = partsOf(day)
  const monthsFromZero = year * 12 + (month - 1) + months
  const then = { year: Math.floor(monthsFromZero / 12), month: (monthsFromZero % 12) + 1 }
  return isoOf({ ...then, dayOfMonth: Math.min(dayOfMonth, daysInMonth(then.year, then.month)) })
}

/** Whole days from one day to another; negative when the second is the earlier. */
export function daysBetween(from: string, to: string): number {
  return dayNumber(to) - dayNumber(from)
}

/** Day of the week, 0 for Sunday to 6 for Saturday. */
export function weekdayOf(day: string): number {
  return weekdayOfNumber(dayNumber(day))
}

function weekdayOfNumber(number: number): number {
  return (((number + 4) % 7) + 7) % 7 // 1970-01-01 was a Thursday
}

/** Whether the day of this number is a Sunday. */
export function isSunday(number: number): boolean {
  return weekdayOfNumber(number) === 0
}

/** The month of a day, 1 to 12. */
export function monthOf(day: string): number {
  return partsOf(day).month
}
