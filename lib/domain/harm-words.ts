import { format } from 'date-fns'
import { TZDate } from '@date-fns/tz'
import { daysBetween } from './day'
import type { House } from './need'
import { localDay } from './round-window'

/** "6 people, an infant": who is in the house, the vulnerable named. */
export function houseInWords(house: House): string {
  const vulnerable = [
    house.infant && 'an infant',
    house.pregnant && 'a pregnancy',
    house.elderly && 'an old person',
    house.ill && 'an ill person',
  ].filter((words) => words !== false)
  return [peopleInWords(house.people), ...vulnerable].join(', ')
}

export function peopleInWords(people: number): string {
  return people === 1 ? '1 person' : `${people} people`
}

/**
 * A past moment as the shift says it, on the area's own clock: "07:40" today, "yesterday 18:20",
 * "Friday 18:20" within the week, "3 March" before that.
 */
export function sinceInWords(at: number, { now, timeZone }: { now: number; timeZone: string }) {
  const local = new TZDate(at, timeZone)
  const days = daysBetween(localDay(at, timeZone), localDay(now, timeZone))
  if (days <= 0) return format(local, 'HH:mm')
  if (days === 1) return `yesterday ${format(local, 'HH:mm')}`
  return days < 7 ? format(local, 'EEEE HH:mm') : format(local, 'd MMMM')
}

/** "8 h 05"; whole minutes, rounded. */
export function hoursInWords(hours: number): string {
  const minutes = Math.round(hours * 60)
  return `${Math.floor(minutes / 60)} h ${String(minutes % 60).padStart(2, '0')}`
}
