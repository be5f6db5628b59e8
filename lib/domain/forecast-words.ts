import { addDays } from './day'
import type { Forecast } from './flow-trend'
import { localDay } from './round-window'
import { dayWords, shortDayWords } from './stamp'

/** A latest day further off than this is as good as none to whoever plans by it. */
const worthNamingDays = 365

type Today = { now: number; timeZone: string }
type Fall = Extract<Forecast, { kind: 'falls' }>

/** Where a filter's flow goes, as staff read it. A bound that tells nothing is not named. */
export function forecastWords(forecast: Forecast, { now, timeZone }: Today): string {
  switch (forecast.kind) {
    case 'too few':
      return 'Too few readings since the last change to say where it goes.'
    case 'holds':
      return 'It holds: no fall under the need is in sight.'
    case 'falls':
      return fallWords(forecast, { now, timeZone })
  }
}

function fallWords(fall: Fall, { now, timeZone }: Today): string {
  const today = localDay(now, timeZone)
  const dayOf = (at: number) => localDay(at, timeZone)
  const printed = (day: string) =>
    day.slice(0, 4) === today.slice(0, 4) ? shortDayWords(day) : dayWords(day)
  const on = dayOf(fall.onAt)
  if (fall.perDay === 0) return 'By its readings under the need already, without falling further.'
  if (on <= today) return `By its trend under the need already, since about ${printed(on)}.`
  const earliest = dayOf(fall.earliestAt) > today ? printed(dayOf(fall.earliestAt)) : null
  const last = fall.latestAt === null ? null : dayOf(fall.latestAt)
  const latest = last !== null && last <= addDays(today, worthNamingDays) ? printed(last) : null
  const about = `Under the need about ${printed(on)}`
  if (earliest && latest) return `${about}: between ${earliest} and ${latest}.`
  if (earliest)
    return `${about}, hardly before ${earliest}; how much later the readings do not tell.`
  if (latest) return `${about}, perhaps already, and by ${latest} at the latest.`
  return `It may fall under the need about ${printed(on)}; the readings are too few or too uneven to say more.`
}
