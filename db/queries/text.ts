import { and, asc, desc, eq, gte, inArray, isNotNull, like, lte, ne, sql } from 'drizzle-orm'
import type { Handle } from '../client'
import { replyReadings, texts } from '../schema/text'

export type TextRow = typeof texts.$inferSelect

/** Inserts a text once for its purpose; null when that purpose has its text already. */
export async function insertText(db: Handle, row: typeof texts.$inferInsert) {
  const [made] = await db
    .insert(texts)
    .values(row)
    .onConflictDoNothing({ target: texts.purpose })
    .returning()
  return made ?? null
}

export async function findText(db: Handle, textId: string) {
  const [row] = await db.select().from(texts).where(eq(texts.id, textId))
  return row ?? null
}

/** The text, held until the end of the transaction so that nobody else decides over it. */
export async function findTextForUpdate(db: Handle, textId: string) {
  const [row] = await db.select().from(texts).where(eq(texts.id, textId)).for('update')
  return row ?? null
}

export async function updateText(
  db: Handle,
  textId: string,
  change: Partial<typeof texts.$inferInsert>,
) {
  await db.update(texts).set(change).where(eq(texts.id, textId))
}

/** Texts whose hour has come, oldest hour first. */
export async function listDueTexts(db: Handle, now: number, limit: number) {
  return db
    .select({ id: texts.id })
    .from(texts)
    .where(and(eq(texts.state, 'queued'), lte(texts.sendAfter, now)))
    .orderBy(asc(texts.sendAfter), asc(texts.n))
    .limit(limit)
}

/** How many texts wait for an hour that has not come. */
export async function countWaitingTexts(db: Handle, now: number) {
  const [row] = await db
    .select({ n: sql<number>`count(*)::int` })
    .from(texts)
    .where(and(eq(texts.state, 'queued'), gte(texts.sendAfter, now)))
  return row?.n ?? 0
}

/** The last thing that was put to a phone since `since`: what an answer from it is about. */
export async function findLastAsked(db: Handle, phoneId: string, since: number) {
  const [row] = await db
    .select()
    .from(texts)
    .where(
      and(
        eq(texts.phoneId, phoneId),
        eq(texts.direction, 'out'),
        isNotNull(texts.householdId),
        ne(texts.asked, 'none'),
        gte(texts.createdAt, since),
        inArray(texts.state, ['sending', 'in doubt', 'sent', 'delivered']),
      ),
    )
    .orderBy(desc(texts.n))
    .limit(1)
  return row ?? null
}

/** When prompts and nudges went, or are to go, to each of these households since an instant. */
export async function listPromptHours(db: Handle, householdIds: string[], since: number) {
  if (householdIds.length === 0) return []
  return db
    .select({
      householdId: texts.householdId,
      at: sql<number>`extract(epoch from coalesce(${texts.sentAt}, ${texts.sendAfter}))::float8 * 1000`,
    })
    .from(texts)
    .where(
      and(
        inArray(texts.householdId, householdIds),
        eq(texts.direction, 'out'),
        sql`(${texts.purpose} like 'prompt:%' or ${texts.purpose} like 'nudge:%')`,
        inArray(texts.state, ['queued', 'sending', 'in doubt', 'sent', 'delivered']),
        gte(texts.sendAfter, since),
      ),
    )
}

export async function insertReplyReading(db: Handle, row: typeof replyReadings.$inferInsert) {
  await db.insert(replyReadings).values(row).onConflictDoNothing()
}

/** How often somebody has read this text anew; each reading has its own number. */
export async function countReadingsBy(db: Handle, textId: string, reader: string) {
  const [row] = await db
    .select({ n: sql<number>`count(*)::int` })
    .from(replyReadings)
    .where(and(eq(replyReadings.textId, textId), like(replyReadings.readBy, `${reader}%`)))
  return row?.n ?? 0
}

/** Texts stored but not read yet: a crash between storing and enqueueing leaves some. */
export async function listUnreadTexts(db: Handle, before: number, limit: number) {
  return db
    .select({ id: texts.id })
    .from(texts)
    .where(and(eq(texts.state, 'received'), lte(texts.createdAt, before)))
    .orderBy(asc(texts.n))
    .limit(limit)
}
