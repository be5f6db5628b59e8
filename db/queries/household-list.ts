import { and, asc, count, eq, exists, ilike, isNull, or, sql, type SQL } from 'drizzle-orm'
import type { Handle } from '../client'
import { areas } from '../schema/area'
import { householdPhones, households, phones } from '../schema/household'
import { kits } from '../schema/kit'
import { tickets } from '../schema/ticket'

/** The letters of a search as they stand, not as a pattern. */
function literally(text: string): string {
  return text.replace(/[\\%_]/g, '\\$&')
}

function hasPhone(db: Handle, digits: string): SQL {
  return exists(
    db
      .select({ one: sql`1` })
      .from(householdPhones)
      .innerJoin(phones, eq(phones.id, householdPhones.phoneId))
      .where(
        and(
          eq(householdPhones.householdId, households.id),
          ilike(phones.e164, `%${literally(digits)}%`),
        ),
      ),
  )
}

/** By name, place, area, phone (three digits or more) or kit number (`12` or `kit 12`). */
function matches(db: Handle, search: string): SQL | undefined {
  if (search === '') return undefined
  const pattern = `%${literally(search)}%`
  const kitNumber = /^(?:kit\s*)?(\d{1,9})$/i.exec(search)?.[1]
  const digits = /^[+\d\s().-]+$/.test(search) ? search.replace(/\D/g, '') : ''
  return or(
    ilike(households.name, pattern),
    ilike(households.place, pattern),
    ilike(areas.name, pattern),
    kitNumber === undefined ? undefined : eq(kits.number, Number(kitNumber)),
    digits.length >= 3 ? hasPhone(db, digits) : undefined,
  )
}

/** Kits with their households, by the household's name, one page, and how many there are in all. */
export async function listHouseholdRows(
  db: Handle,
  { search, limit, offset }: { search: string; limit: number; offset: number },
) {
  const where = matches(db, search)
  const rows = await db
    .select({ household: households, area: areas, kit: kits, ticket: tickets })
    .from(kits)
    .innerJoin(households, eq(households.id, kits.householdId))
    .innerJoin(areas, eq(areas.id, households.areaId))
    .leftJoin(tickets, and(eq(tickets.kitId, kits.id), isNull(tickets.endedAt)))
    .where(where)
    .orderBy(asc(households.name), asc(kits.number))
    .limit(limit)
    .offset(offset)
  const [all] = await db
    .select({ n: count() })
    .from(kits)
    .innerJoin(households, eq(households.id, kits.householdId))
    .innerJoin(areas, eq(areas.id, households.areaId))
    .where(where)
  return { rows, total: all?.n ?? 0 }
}
