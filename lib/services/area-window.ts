import type { AreaRow } from '@/db/queries/area'
import { carriedADay } from '@/lib/domain/round-going'
import type { Window } from '@/lib/domain/round-window'

/** When an area may be texted, by its row. */
export function windowOf(area: AreaRow): Window {
  const { timeZone, sundaysOff, holidays } = area
  return {
    timeZone,
    opensMinute: area.windowOpensMinute,
    closesMinute: area.windowClosesMinute,
    sundaysOff,
    holidays: holidays.map(({ on }) => on),
  }
}

/** Texts that the sender can hand over in a day, at most: while the longest of the windows is open. */
export function mostCarriedADay(areas: readonly AreaRow[], textsPerMinute: number): number {
  return Math.max(0, ...areas.map((area) => carriedADay(windowOf(area), textsPerMinute)))
}
