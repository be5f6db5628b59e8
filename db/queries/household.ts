import { and, asc, eq, inArray, ne } from 'drizzle-orm'
import type { Handle } from '../client'
import { areas } from '../schema/area'
import { consents } from '../schema/consent'
import { householdPhones, households, phones } from '../schema/household'
import { staff } from '../schema/staff'
import { texts } from '../schema/text'

export async function findHousehold(db: Handle, householdId: string) {
  const [row] = await db
    .select({ household: households, area: areas })
    .from(households)
    .innerJoin(areas, eq(areas.id, households.areaId))
    .where(eq(households.id, householdId))
  return row ?? null
}

export type HouseholdInArea = NonNullable<Awaited<ReturnType<typeof findHousehold>>>

/**
 * Holds a household until the end of the transaction, so that no two find room for the same text. Rows that
 * only refer to it, such as an agent's text, may still be written meanwhile.
 */
export async function holdHousehold(tx: Handle, householdId: string): Promise<void> {
  await tx
    .select({ id: households.id })
    .from(households)
    .where(eq(households.id, householdId))
    .for('no key update')
}

export async function insertHousehold(db: Handle, row: typeof households.$inferInsert) {
  const [made] = await db.insert(households).values(row).returning()
  if (!made) throw new Error('The household was not kept.')
  return made
}

export async function updateHousehold(
  db: Handle,
  householdId: string,
  change: Partial<typeof households.$inferInsert>,
) {
  await db.update(households).set(change).where(eq(households.id, householdId))
}

/** The phone with this number, made when there is none. Held, so that two entries agree on its consent. */
export async function upsertPhone(db: Handle, row: { e164: string; createdAt: number }) {
  const [made] = await db.insert(phones).values(row).onConflictDoNothing().returning()
  if (made) return { phone: made, isNew: true }
  const [known] = await db.select().from(phones).where(eq(phones.e164, row.e164)).for('update')
  if (!known) throw new Error('A phone was neither there nor made.')
  return { phone: known, isNew: false }
}

export async function upsertHouseholdPhone(db: Handle, row: typeof householdPhones.$inferInsert) {
  await db
    .insert(householdPhones)
    .values(row)
    .onConflictDoUpdate({
      target: [householdPhones.householdId, householdPhones.phoneId],
      set: { answeredBy: row.answeredBy, first: row.first },
    })
}

export async function deleteHouseholdPhone(db: Handle, householdId: string, phoneId: string) {
  await db
    .delete(householdPhones)
    .where(and(eq(householdPhones.householdId, householdId), eq(householdPhones.phoneId, phoneId)))
}

/** A household's phones, the one that prompts go to first. */
export async function listPhonesOfHouseholds(db: Handle, householdIds: string[]) {
  if (householdIds.length === 0) return []
  return db
    .select({ link: householdPhones, phone: phones })
    .from(householdPhones)
    .innerJoin(phones, eq(phones.id, householdPhones.phoneId))
    .where(inArray(householdPhones.householdId, householdIds))
    .orderBy(ne(householdPhones.first, true), asc(phones.createdAt), asc(phones.id))
}

/** The other households that these phones answer for. */
export async function listSharers(db: Handle, phoneIds: string[], householdId: string) {
  if (phoneIds.length === 0) return []
  return db
    .select({ phoneId: householdPhones.phoneId, id: households.id, name: households.name })
    .from(householdPhones)
    .innerJoin(households, eq(households.id, householdPhones.householdId))
    .where(
      and(inArray(householdPhones.phoneId, phoneIds), ne(householdPhones.householdId, householdId)),
    )
    .orderBy(asc(households.name))
}

/** Each yes and no of these phones, oldest first, with who wrote it down or the words it came in. */
export async function listConsents(db: Handle, phoneIds: string[]) {
  if (phoneIds.length === 0) return []
  return db
    .select({ consent: consents, staffName: staff.name, body: texts.body })
    .from(consents)
    .leftJoin(staff, eq(staff.id, consents.staffId))
    .leftJoin(texts, eq(texts.id, consents.textId))
    .where(inArray(consents.phoneId, phoneIds))
    .orderBy(asc(consents.n))
}
