import { and, desc, eq, inArray, sql } from 'drizzle-orm'
import type { Handle, Transaction } from '../client'
import { settings } from '../schema/area'
import { audit } from '../schema/staff'

export async function listSettings(db: Handle) {
  return db.select().from(settings)
}

export async function upsertSetting(db: Handle, row: typeof settings.$inferInsert) {
  await db
    .insert(settings)
    .values(row)
    .onConflictDoUpdate({ target: settings.key, set: { value: row.value, setAt: row.setAt } })
}

/** What is not set any more has its default again. */
export async function deleteSettings(db: Handle, keys: string[]) {
  if (keys.length > 0) await db.delete(settings).where(inArray(settings.key, keys))
}

/** Keeps others from changing the settings until this transaction ends; they may still be read. */
export async function lockSettings(tx: Transaction) {
  await tx.execute(sql`lock table ${settings} in exclusive mode`)
}

/** The number of the last change of a setting, as the audit counts; 0 before the first. */
export async function findLastSettingChange(db: Handle) {
  const [row] = await db
    .select({ n: audit.n })
    .from(audit)
    .where(and(eq(audit.subject, 'setting'), eq(audit.act, 'change setting')))
    .orderBy(desc(audit.n))
    .limit(1)
  return row?.n ?? 0
}
