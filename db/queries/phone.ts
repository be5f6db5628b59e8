import { asc, desc, eq } from 'drizzle-orm'
import type { Handle } from '../client'
import { consents } from '../schema/consent'
import { householdPhones, households, phones } from '../schema/household'
import { kits } from '../schema/kit'

export async function findPhoneByNumber(db: Handle, e164: string) {
  const [row] = await db.select().from(phones).where(eq(phones.e164, e164))
  return row ?? null
}

export async function findPhone(db: Handle, phoneId: string) {
  const [row] = await db.select().from(phones).where(eq(phones.id, phoneId))
  return row ?? null
}

/** The phone that a household's prompts go to, or null where it has none. */
export async function findFirstPhone(db: Handle, householdId: string) {
  const [row] = await db
    .select({ phone: phones })
    .from(householdPhones)
    .innerJoin(phones, eq(phones.id, householdPhones.phoneId))
    .where(eq(householdPhones.householdId, householdId))
    .orderBy(desc(householdPhones.first), asc(phones.createdAt))
    .limit(1)
  return row?.phone ?? null
}

/** The households that a phone answers for, with their kits, oldest first. */
export async function listHouseholdsOfPhone(db: Handle, phoneId: string) {
  return db
    .select({ household: households, kit: kits })
    .from(householdPhones)
    .innerJoin(households, eq(households.id, householdPhones.householdId))
    .innerJoin(kits, eq(kits.householdId, households.id))
    .where(eq(householdPhones.phoneId, phoneId))
    .orderBy(asc(households.createdAt), asc(kits.number))
    .limit(50)
}

export async function updatePhone(
  db: Handle,
  phoneId: string,
  change: Partial<typeof phones.$inferInsert>,
) {
  await db.update(phones).set(change).where(eq(phones.id, phoneId))
}

/** A yes or a no of a phone, kept for ever, and the phone's present state with it. */
export async function insertConsent(db: Handle, row: typeof consents.$inferInsert) {
  await db.insert(consents).values(row)
  await db.update(phones).set({ consent: row.consent }).where(eq(phones.id, row.phoneId))
}
