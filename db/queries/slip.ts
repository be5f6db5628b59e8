import { and, desc, eq, inArray, lt } from 'drizzle-orm'
import type { Handle } from '../client'
import { replyReadings, texts } from '../schema/text'

/** The texts with a household before a number, newest first. */
export async function listSlipTexts(
  db: Handle,
  { householdId, before, limit }: { householdId: string; before: number | null; limit: number },
) {
  const earlier = before === null ? undefined : lt(texts.n, before)
  return db
    .select()
    .from(texts)
    .where(and(eq(texts.householdId, householdId), earlier))
    .orderBy(desc(texts.n))
    .limit(limit)
}

/** Prompts and nudges to a household by one phone that have not left yet, held until the transaction ends. */
export async function listWaitingPromptTexts(
  db: Handle,
  { householdId, phoneId }: { householdId: string; phoneId: string },
) {
  return db
    .select()
    .from(texts)
    .where(
      and(
        eq(texts.householdId, householdId),
        eq(texts.phoneId, phoneId),
        eq(texts.state, 'queued'),
        eq(texts.anyHour, false),
      ),
    )
    .orderBy(texts.n)
    .for('update')
}

/** Every reading of these replies, oldest first: the last of a text is what counts. */
export async function listReadingsOfTexts(db: Handle, textIds: string[]) {
  if (textIds.length === 0) return []
  return db
    .select()
    .from(replyReadings)
    .where(inArray(replyReadings.textId, textIds))
    .orderBy(replyReadings.n)
}
