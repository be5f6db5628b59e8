import type { AreaRow } from '@/db/queries/area'
import { monthOf } from '@/lib/domain/day'
import { localDay } from '@/lib/domain/round'

/** The water's temperature in an area on a day, °C: the month's value, where nobody told one. */
export function areaCelsius(area: AreaRow, at: number): number {
  const month = monthOf(localDay(at, area.timeZone))
  return area.monthCelsius[month - 1] ?? 20
}
