import { format, parseISO } from 'date-fns'

/** A local day as staff read it: `Tue`, `3 Mar`, `Tuesday 3 March`. */
export function dayNames(on: string): { weekday: string; short: string; long: string } {
  const date = parseISO(on)
  return {
    weekday: format(date, 'EEE'),
    short: format(date, 'd MMM'),
    long: format(date, 'EEEE d MMMM'),
  }
}
