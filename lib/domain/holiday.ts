import { dayNumber, isSunday } from './day'
import { joined } from './round-words'

/** A day without prompts. The name may be empty: days off were kept without one at first. */
export type Holiday = { on: string; name: string }

/** A line of the form, `2026-12-25 Midwinter day`: its first word is the day, the rest the name. */
export function holidayOfLine(line: string): Holiday {
  const [on = '', ...name] = line.trim().split(/\s+/)
  return { on, name: name.join(' ') }
}

/** The line that a holiday is written as. */
export function lineOfHoliday({ on, name }: Holiday): string {
  return `${on} ${name}`.trim()
}

/**
 * Lines with more days off put among them, in order of the day. What is written stays as it is, faults too,
 * and a day that stands there already keeps its own name.
 */
export function withHolidays(lines: readonly string[], more: readonly Holiday[]): string[] {
  const known = new Set(lines.map((line) => holidayOfLine(line).on))
  const added = more.filter(({ on }) => !known.has(on)).map(lineOfHoliday)
  return [...lines, ...added].toSorted()
}

type Off = { sundaysOff: boolean; holidays: readonly Holiday[] }

/** Why no prompt goes on a day, in words; null when one may. */
export function whyOff(on: string, { sundaysOff, holidays }: Off): string | null {
  const named = holidays.find((holiday) => holiday.on === on)
  if (named) return named.name || 'a day off'
  return sundaysOff && isSunday(dayNumber(on)) ? 'Sunday' : null
}

/** One reason for no texts on a day, and in which areas; no area is named when it holds in all. */
export type DayOff = { why: string; areas: string[] }

/** Why there are no texts on a day, reason by reason; none where texts go everywhere. */
export function daysOffOn(on: string, areas: readonly (Off & { name: string })[]): DayOff[] {
  const byReason = new Map<string, string[]>()
  for (const area of areas) {
    const why = whyOff(on, area)
    if (why !== null) byReason.set(why, [...(byReason.get(why) ?? []), area.name])
  }
  return [...byReason].map(([why, names]) => ({
    why,
    areas: names.length === areas.length ? [] : names,
  }))
}

/** `Midwinter day`, `Midwinter day in Loma Clara; Sunday in Ferry Bank and Char Nodi`. */
export function dayOffWords(daysOff: readonly DayOff[]): string {
  return daysOff
    .map(({ why, areas }) => (areas.length === 0 ? why : `${why} in ${joined(areas)}`))
    .join('; ')
}
