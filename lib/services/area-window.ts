import type { AreaRow } from '@/db/queries/area'
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
