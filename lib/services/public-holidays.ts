import type { Deps } from '@/lib/deps'
import { addDays } from '@/lib/domain/day'
import type { Holiday } from '@/lib/domain/holiday'
import { allow, type Actor } from '@/lib/domain/role'
import { localDay } from '@/lib/domain/round-window'
import type { Refusal } from '@/lib/schemas/endpoint'
import type { Countries, PublicHolidays } from '@/lib/schemas/holiday'

const day = 86_400_000
const language = 'en'

/** Loaded when somebody asks: it brings the calendars of two hundred countries. */
async function calendars() {
  return (await import('date-holidays')).default
}

/** The countries whose public holidays are known, by name. */
export async function listCountries(_deps: Deps, actor: Actor): Promise<Countries> {
  allow(actor, 'set up areas')
  const Holidays = await calendars()
  const countries = Object.entries(new Holidays().getCountries(language))
    .map(([code, name]) => ({ code, name }))
    .toSorted((one, other) => one.name.localeCompare(other.name, language))
  return { countries }
}

/**
 * What a country's calendar says of this year and the next, from today on: to be looked over, not to be
 * trusted. Feasts that follow the moon may lie a day off, and holidays of one region are not in it.
 */
export async function publicHolidays(
  deps: Deps,
  actor: Actor,
  { country }: { country: string },
): Promise<PublicHolidays | Refusal> {
  allow(actor, 'set up areas')
  const Holidays = await calendars()
  const countries = new Holidays().getCountries(language)
  const name = Object.hasOwn(countries, country) ? countries[country] : undefined
  if (name === undefined) return { ok: false, reason: 'not found' }
  const calendar = new Holidays(country)
  const today = localDay(deps.clock.now(), 'UTC')
  const year = Number(today.slice(0, 4))
  const known = [year, year + 1]
    .flatMap((one) => calendar.getHolidays(one, language))
    .filter(({ type }) => type === 'public')
    .flatMap(everyDayOf)
    .filter(({ on }) => on >= today)
  const byDay = new Map(known.toReversed().map((holiday) => [holiday.on, holiday]))
  return {
    country: name,
    holidays: [...byDay.values()].toSorted((one, other) => (one.on < other.on ? -1 : 1)),
  }
}

/** A feast of several days is each of them. Its date is the local day, whenever its evening begins. */
function everyDayOf(feast: { date: string; name: string; start: Date; end: Date }): Holiday[] {
  const first = feast.date.slice(0, 10)
  const days = Math.max(1, Math.round((feast.end.getTime() - feast.start.getTime()) / day))
  return Array.from({ length: days }, (_, ahead) => ({
    on: addDays(first, ahead),
    name: feast.name.slice(0, 60),
  }))
}
