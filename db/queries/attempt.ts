import { and, asc, eq, inArray, isNull, lte, sql } from 'drizzle-orm'
import type { Handle } from '../client'
import { attempts, receipts, texts } from '../schema/text'

export type AttemptRow = typeof attempts.$inferSelect

/** Writes an attempt before its POST; null when the phone has another in flight or in doubt. */
export async function insertAttempt(db: Handle, row: Omit<typeof attempts.$inferInsert, 'n'>) {
  const [made] = await db
    .insert(attempts)
    .values({
      ...row,
      n: sql`(select count(*)::int + 1 from ${attempts} where ${attempts.textId} = ${row.textId})`,
    })
    .onConflictDoNothing()
    .returning()
  return made ?? null
}

export async function findAttempt(db: Handle, attemptId: string) {
  const [row] = await db.select().from(attempts).where(eq(attempts.id, attemptId)).for('update')
  return row ?? null
}

export async function findAttemptBySid(db: Handle, sid: string) {
  const [row] = await db.select().from(attempts).where(eq(attempts.sid, sid)).for('update')
  return row ?? null
}

export async function updateAttempt(
  db: Handle,
  attemptId: string,
  change: Partial<typeof attempts.$inferInsert>,
) {
  await db.update(attempts).set(change).where(eq(attempts.id, attemptId))
}

/** Attempts whose end nobody knows: posted before `before` and never answered. */
export async function listDoubtfulAttempts(db: Handle, before: number, limit: number) {
  return db
    .select({ attempt: attempts, text: texts })
    .from(attempts)
    .innerJoin(texts, eq(texts.id, attempts.textId))
    .where(and(inArray(attempts.state, ['posting', 'in doubt']), lte(attempts.postingAt, before)))
    .orderBy(asc(attempts.postingAt))
    .limit(limit)
}

/** Which of these carrier ids belong to an attempt already. */
export async function listBoundSids(db: Handle, sids: string[]) {
  if (sids.length === 0) return []
  const rows = await db
    .select({ sid: attempts.sid })
    .from(attempts)
    .where(inArray(attempts.sid, sids))
  return rows.flatMap((row) => (row.sid === null ? [] : [row.sid]))
}

/** Keeps a receipt once; null when this very one came before. */
export async function insertReceipt(db: Handle, row: typeof receipts.$inferInsert) {
  const [made] = await db.insert(receipts).values(row).onConflictDoNothing().returning()
  return made ?? null
}

export async function findReceipt(db: Handle, n: number) {
  const [row] = await db.select().from(receipts).where(eq(receipts.n, n))
  return row ?? null
}

/** Receipts that came before their attempt was known. */
export async function listLooseReceipts(db: Handle, sid: string) {
  return db
    .select()
    .from(receipts)
    .where(and(eq(receipts.sid, sid), isNull(receipts.attemptId)))
}
