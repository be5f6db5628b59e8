import { and, asc, eq, gt, ne } from 'drizzle-orm'
import type { Handle } from '../client'
import { suppressions } from '../schema/consent'
import { phones } from '../schema/household'

export async function insertSuppressions(db: Handle, rows: (typeof suppressions.$inferInsert)[]) {
  if (rows.length > 0) await db.insert(suppressions).values(rows).onConflictDoNothing()
}

export async function deleteSuppression(db: Handle, hash: string) {
  await db.delete(suppressions).where(eq(suppressions.hash, hash))
}

export async function hasSuppression(db: Handle, hash: string): Promise<boolean> {
  const found = await db
    .select({ hash: suppressions.hash })
    .from(suppressions)
    .where(eq(suppressions.hash, hash))
  return found.length > 0
}

/** True if some number was kept with another key than this one. */
export async function hasOtherKey(db: Handle, keyMark: string): Promise<boolean> {
  const found = await db
    .select({ hash: suppressions.hash })
    .from(suppressions)
    .where(ne(suppressions.keyMark, keyMark))
    .limit(1)
  return found.length > 0
}

/** One page of the numbers whose phone has opted out, in order; `after` is the last of the page before. */
export async function listWithdrawnNumbers(
  db: Handle,
  { after, limit }: { after: string; limit: number },
): Promise<string[]> {
  const rows = await db
    .select({ e164: phones.e164 })
    .from(phones)
    .where(and(eq(phones.consent, 'withdrawn'), gt(phones.e164, after)))
    .orderBy(asc(phones.e164))
    .limit(limit)
  return rows.map(({ e164 }) => e164)
}
