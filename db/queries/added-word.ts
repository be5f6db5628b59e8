import { aliasedTable, and, asc, desc, eq, isNotNull, isNull } from 'drizzle-orm'
import type { Language } from '@/lib/domain/language'
import type { Handle } from '../client'
import { addedWords } from '../schema/reply-word'
import { staff } from '../schema/staff'
import { texts } from '../schema/text'

/** The words in force in every language, oldest first. */
export async function listWordsInForce(db: Handle, limit: number) {
  return db
    .select({
      id: addedWords.id,
      language: addedWords.language,
      concept: addedWords.concept,
      phrase: addedWords.phrase,
    })
    .from(addedWords)
    .where(isNull(addedWords.retiredAt))
    .orderBy(asc(addedWords.addedAt), asc(addedWords.id))
    .limit(limit)
}

const adder = aliasedTable(staff, 'adder')
const retirer = aliasedTable(staff, 'retirer')

function withPeople(db: Handle) {
  return db
    .select({ word: addedWords, body: texts.body, addedBy: adder.name, retiredBy: retirer.name })
    .from(addedWords)
    .leftJoin(adder, eq(adder.id, addedWords.addedBy))
    .leftJoin(retirer, eq(retirer.id, addedWords.retiredBy))
    .leftJoin(texts, eq(texts.id, addedWords.textId))
}

export type WordWithPeople = Awaited<ReturnType<typeof listWordsOfLanguage>>[number]

/** What the programme added to a language and has in force, newest first. */
export async function listWordsOfLanguage(db: Handle, language: Language, limit: number) {
  return withPeople(db)
    .where(and(eq(addedWords.language, language), isNull(addedWords.retiredAt)))
    .orderBy(desc(addedWords.addedAt), asc(addedWords.id))
    .limit(limit)
}

/** What it added and has retired since, the last retired on top. */
export async function listRetiredWords(db: Handle, language: Language, limit: number) {
  return withPeople(db)
    .where(and(eq(addedWords.language, language), isNotNull(addedWords.retiredAt)))
    .orderBy(desc(addedWords.retiredAt), asc(addedWords.id))
    .limit(limit)
}

/** Null when the phrase has a meaning in force in this language already. */
export async function insertAddedWord(db: Handle, row: typeof addedWords.$inferInsert) {
  const [made] = await db.insert(addedWords).values(row).onConflictDoNothing().returning()
  return made ?? null
}

/** Takes a word out of force; null when there is none such in force. */
export async function retireAddedWord(
  db: Handle,
  wordId: string,
  { retiredBy, retiredAt }: { retiredBy: string; retiredAt: number },
) {
  const [row] = await db
    .update(addedWords)
    .set({ retiredBy, retiredAt })
    .where(and(eq(addedWords.id, wordId), isNull(addedWords.retiredAt)))
    .returning()
  return row ?? null
}
