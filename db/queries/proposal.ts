import { aliasedTable, and, desc, eq, gt, isNull, lt, ne, notExists, or, sql } from 'drizzle-orm'
import type { Language } from '@/lib/domain/language'
import type { Handle } from '../client'
import { settledProposals } from '../schema/reply-word'
import { staff } from '../schema/staff'
import { replyReadings, texts } from '../schema/text'

const person = aliasedTable(replyReadings, 'person')
const desk = aliasedTable(replyReadings, 'desk')
const later = aliasedTable(replyReadings, 'later')

/** A person's last reading of a text beside the desk's, where they differ and nobody has looked yet. */
function openProposals(db: Handle) {
  const isLast = notExists(
    db
      .select({ n: later.n })
      .from(later)
      .where(and(eq(later.textId, person.textId), ne(later.readBy, 'desk'), gt(later.n, person.n))),
  )
  // Of other kinds the desk may note minutes too, where a person has nowhere to write them.
  const differs = or(
    ne(person.kind, desk.kind),
    and(eq(person.kind, 'flow-figure'), sql`${person.minutes} is distinct from ${desk.minutes}`),
  )
  return and(ne(person.readBy, 'desk'), isLast, differs, isNull(settledProposals.readingN))
}

function proposals(db: Handle) {
  return db
    .select({ text: texts, person, desk, by: staff.name })
    .from(person)
    .innerJoin(desk, and(eq(desk.textId, person.textId), eq(desk.readBy, 'desk')))
    .innerJoin(texts, eq(texts.id, person.textId))
    .leftJoin(settledProposals, eq(settledProposals.readingN, person.n))
    .leftJoin(staff, eq(staff.id, sql`split_part(${person.readBy}, ':', 1)`))
}

export type ProposalRow = Awaited<ReturnType<typeof listProposals>>[number]

/** Open proposals, newest first, before a reading's number. */
export async function listProposals(
  db: Handle,
  { before, limit }: { before: number | null; limit: number },
) {
  const earlier = before === null ? undefined : lt(person.n, before)
  return proposals(db)
    .where(and(openProposals(db), earlier))
    .orderBy(desc(person.n))
    .limit(limit)
}

/** The open proposal of one text. */
export async function findProposal(db: Handle, textId: string) {
  const [row] = await proposals(db).where(and(openProposals(db), eq(person.textId, textId)))
  return row ?? null
}

/** False when somebody has settled it in the meantime. */
export async function insertSettledProposal(
  db: Handle,
  row: typeof settledProposals.$inferInsert,
): Promise<boolean> {
  const made = await db
    .insert(settledProposals)
    .values(row)
    .onConflictDoNothing()
    .returning({ n: settledProposals.readingN })
  return made.length > 0
}

/** The last texts of a language that the desk has read, newest first, with what each answered. */
export async function listReadTexts(db: Handle, language: Language, limit: number) {
  return db
    .select({ textId: texts.id, body: texts.body, asked: desk.asked })
    .from(texts)
    .innerJoin(desk, and(eq(desk.textId, texts.id), eq(desk.readBy, 'desk')))
    .where(and(eq(texts.direction, 'in'), eq(texts.language, language)))
    .orderBy(desc(texts.n))
    .limit(limit)
}
