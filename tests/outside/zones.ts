import { DateTime } from 'luxon'
import { Temporal } from 'temporal-polyfill'
import type { Window } from '@/lib/domain/round'

/*
 * Oracles of time: the zones of the IANA data that this Node carries, the changes of their clocks by
 * Temporal (TC39, polyfilled), the wall clock by luxon. Each has its own calendar.
 */

export const at = (text: string) => Temporal.Instant.from(text).epochMilliseconds

export const zones = Intl.supportedValuesOf('timeZone')
export const start = at('2024-01-01T00:00:00Z')
export const end = at('2031-01-01T00:00:00Z')

/** Every change of a zone's clocks from 2024 to 2030. */
function changesOf(timeZone: string): number[] {
  const found: number[] = []
  let from = Temporal.Instant.fromEpochMilliseconds(start).toZonedDateTimeISO(timeZone)
  for (;;) {
    const change = from.getTimeZoneTransition('next')
    if (change === null || change.epochMilliseconds >= end) return found
    found.push(change.epochMilliseconds)
    from = change
  }
}

/** The zones that change their clocks in these years. */
export const changing = zones
  .map((timeZone) => ({ timeZone, changes: changesOf(timeZone) }))
  .filter(({ changes }) => changes.length > 0)

/** The local day that luxon sees. */
export function dayByLuxon(instant: number, timeZone: string): string {
  return DateTime.fromMillis(instant, { zone: timeZone }).toISODate() ?? ''
}

/** Whether the window is open, as luxon sees it. */
export function openByLuxon(instant: number, window: Window): boolean {
  const local = DateTime.fromMillis(instant, { zone: window.timeZone })
  const clock = local.hour * 60 + local.minute
  if (window.sundaysOff && local.weekday === 7) return false
  if (window.holidays.includes(local.toISODate() ?? '')) return false
  return clock >= window.opensMinute && clock < window.closesMinute
}
