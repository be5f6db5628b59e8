import { aliasedTable, and, desc, eq, inArray, sql } from 'drizzle-orm'
import type { Language } from '@/lib/domain/language'
import type { Handle } from '../client'
import { staff } from '../schema/staff'
import { texts } from '../schema/text'
import { wordings } from '../schema/wording'

export type WordingRow = typeof wordings.$inferSelect

/** The first of `lib/domain/language`, of which only types may come in here; a test holds them together. */
export const firstLanguage: Language = 'en'

type Place = { moment: string; language: Language }

const at = ({ moment, language }: Place) =>
  and(eq(wordings.moment, moment), eq(wordings.language, language))

/**
 * What a text says at a moment: the edition in use in the language, or in the first language where it
 * has none. The row's own `language` says which. Null: nothing may be texted at this moment.
 */
export async function findWordingInUse(
  db: Handle,
  moment: string,
  language: Language,
): Promise<WordingRow | null> {
  const rows = await db
    .select()
    .from(wordings)
    .where(
      and(
        eq(wordings.moment, moment),
        eq(wordings.state, 'in use'),
        inArray(wordings.language, [language, firstLanguage]),
      ),
    )
  return rows.find((row) => row.language === language) ?? rows[0] ?? null
}

const writer = aliasedTable(staff, 'writer')
const approver = aliasedTable(staff, 'approver')
const second = aliasedTable(staff, 'second_approver')

function withPeople(db: Handle) {
  return db
    .select({
      wording: wordings,
      writtenByName: writer.name,
      approvedByName: approver.name,
      secondApprovedByName: second.name,
    })
    .from(wordings)
    .leftJoin(writer, eq(writer.id, wordings.writtenBy))
    .leftJoin(approver, eq(approver.id, wordings.approvedBy))
    .leftJoin(second, eq(second.id, wordings.secondApprovedBy))
}

export type WordingWithPeople = Awaited<ReturnType<typeof listLivingWordings>>[number]

/** Every wording in use and every open draft, with the names of who wrote and approved. */
export async function listLivingWordings(db: Handle) {
  return withPeople(db).where(inArray(wordings.state, ['in use', 'draft', 'approved']))
}

/** All editions of one place, newest first. */
export async function listEditions(db: Handle, place: Place) {
  return withPeople(db).where(at(place)).orderBy(desc(wordings.edition))
}

/** The open draft of a place, held until the end of the transaction. */
export async function findOpenWordingForUpdate(tx: Handle, place: Place) {
  const [row] = await tx
    .select()
    .from(wordings)
    .where(and(at(place), inArray(wordings.state, ['draft', 'approved'])))
    .for('update')
  return row ?? null
}

/** The edition in use at exactly this place: no falling back. */
export async function findOwnWordingInUse(db: Handle, place: Place) {
  const [row] = await db
    .select()
    .from(wordings)
    .where(and(at(place), eq(wordings.state, 'in use')))
  return row ?? null
}

/** The highest edition of a place, 0 where there is none. */
export async function findLastEdition(db: Handle, place: Place): Promise<number> {
  const [row] = await db
    .select({ last: sql<number>`coalesce(max(${wordings.edition}), 0)::int` })
    .from(wordings)
    .where(at(place))
  return row?.last ?? 0
}

/** Null when somebody else has opened a draft there in the meantime. */
export async function insertWording(db: Handle, row: typeof wordings.$inferInsert) {
  const [made] = await db.insert(wordings).values(row).onConflictDoNothing().returning()
  return made ?? null
}

export async function updateWording(
  db: Handle,
  wordingId: string,
  change: Partial<typeof wordings.$inferInsert>,
) {
  await db.update(wordings).set(change).where(eq(wordings.id, wordingId))
}

/** How many texts of a place left the desk since an instant, and how many parts they took. */
export async function countTextsSince(db: Handle, place: Place & { since: number }) {
  const [row] = await db
    .select({
      texts: sql<number>`count(*)::int`,
      parts: sql<number>`coalesce(sum(${texts.segments}), 0)::int`,
    })
    .from(texts)
    .where(
      and(
        eq(texts.direction, 'out'),
        eq(texts.moment, place.moment),
        eq(texts.language, place.language),
        sql`${texts.sentAt} >= ${new Date(place.since).toISOString()}::timestamptz`,
      ),
    )
  return row ?? { texts: 0, parts: 0 }
}

export type FirstWording = Place & { body: string; note: string }

/**
 * Puts a first edition in use at every place that has no edition at all. Once there, a place is the
 * coordinator's: a later first edition never comes back. Returns how many were put in.
 */
export async function insertFirstEditions(
  tx: Handle,
  given: readonly FirstWording[],
  now: number,
): Promise<number> {
  if (given.length === 0) return 0
  const made = await tx
    .insert(wordings)
    .values(
      given.map((wording) => ({
        ...wording,
        edition: 1,
        state: 'in use' as const,
        firstLanguageEdition: 1,
        writtenAt: now,
        inUseFrom: now,
      })),
    )
    .onConflictDoNothing()
    .returning({ id: wordings.id })
  return made.length
}
