import { listPhonesOfHouseholds } from '@/db/queries/household'
import { listHouseholdRows } from '@/db/queries/household-list'
import { listLastReadings, listOpenFittingsOfKits } from '@/db/queries/kit'
import type { Deps } from '@/lib/deps'
import { daysBetween } from '@/lib/domain/day'
import { kitPlan } from '@/lib/domain/kit-life'
import { dailyNeed } from '@/lib/domain/need'
import { allow, type Actor } from '@/lib/domain/role'
import { localDay } from '@/lib/domain/round'
import type { Settings } from '@/lib/domain/settings'
import { silenceWords } from '@/lib/domain/silence-words'
import type { HouseholdList, HouseholdQuery, HouseholdRow } from '@/lib/schemas/household'
import { spacedNumber } from '@/lib/schemas/phone-number'
import { kitLook } from './kit-look'
import { settingsNow } from './settings-now'

const PAGE = 40

type Row = Awaited<ReturnType<typeof listHouseholdRows>>['rows'][number]
type Around = {
  fittings: Awaited<ReturnType<typeof listOpenFittingsOfKits>>
  readings: Awaited<ReturnType<typeof listLastReadings>>
  phones: Awaited<ReturnType<typeof listPhonesOfHouseholds>>
  settings: Settings
  now: number
}

function nextDue({ kit }: Row, fittings: Around['fittings'], today: string) {
  const next = kitPlan({ ...kit, fittings }, today)[0]
  if (!next) return null
  const late = daysBetween(next.on, today)
  if (late <= 0) return { words: next.title, day: next.beside ?? next.day, overdue: false }
  return {
    words: `${next.title} late`,
    day: `${late} ${late === 1 ? 'day' : 'days'}`,
    overdue: true,
  }
}

function viewOf(row: Row, around: Around): HouseholdRow {
  const { household, area, kit, ticket } = row
  const today = localDay(around.now, area.timeZone)
  const fittings = around.fittings.filter(({ kitId }) => kitId === kit.id)
  const reading = around.readings.find(({ kitId }) => kitId === kit.id)
  const phone = around.phones.find(({ link }) => link.householdId === household.id)?.phone
  const { settings } = around
  const litresPerDay = dailyNeed({ people: household.people, ...settings.need })
  const litresPerHour = reading?.litresPerHour ?? null
  return {
    key: kit.id,
    householdId: household.id,
    name: household.name,
    area: area.name,
    language: household.language,
    people: household.people,
    kitNumber: kit.number,
    kitState: kit.state,
    column: kitLook(
      { state: kit.state, fittings, litresPerHour, litresPerDay },
      { today, settings },
    ),
    phone: phone ? spacedNumber(phone.e164) : null,
    silentBecause: phone ? silenceWords(phone) : 'no phone',
    nextDue: nextDue(row, fittings, today),
    ticket: ticket && { id: ticket.id, words: `${ticket.trouble}, ${ticket.stage}` },
  }
}

/** Households by name, one page of what matches. A page past the end is the last one. */
export async function listHouseholds(
  deps: Deps,
  actor: Actor,
  { q, page }: HouseholdQuery,
): Promise<HouseholdList> {
  allow(actor, 'see households')
  const { db } = deps.store
  const find = (at: number) =>
    listHouseholdRows(db, { search: q, limit: PAGE, offset: (at - 1) * PAGE })
  const asked = await find(page)
  const pages = Math.max(1, Math.ceil(asked.total / PAGE))
  const { rows, total } = page > pages ? await find(pages) : asked
  const kitIds = rows.map(({ kit }) => kit.id)
  const around = {
    fittings: await listOpenFittingsOfKits(db, kitIds),
    readings: await listLastReadings(db, kitIds),
    phones: await listPhonesOfHouseholds(
      db,
      rows.map(({ household }) => household.id),
    ),
    settings: await settingsNow(db),
    now: deps.clock.now(),
  }
  return { rows: rows.map((row) => viewOf(row, around)), total, page: Math.min(page, pages), pages }
}
