import { sql } from 'drizzle-orm'
import { bigint, check, pgTable, text, uniqueIndex } from 'drizzle-orm/pg-core'
import type { Language } from '@/lib/domain/language'
import { id, instant } from './columns'
import { staff } from './staff'
import { replyReadings, texts } from './text'

/** A word that the programme gave a meaning to, beside the packs. Retired, never deleted. */
export const addedWords = pgTable(
  'added_words',
  {
    id: id(),
    language: text('language').$type<Language>().notNull(),
    /** A concept of the core by its name; one that a later version no longer has counts for nothing. */
    concept: text('concept').notNull(),
    /** Folded as texts are. */
    phrase: text('phrase').notNull(),
    /** The text it was taken from, if any. */
    textId: text('text_id').references(() => texts.id, { onDelete: 'set null' }),
    addedBy: text('added_by')
      .notNull()
      .references(() => staff.id),
    addedAt: instant('added_at').notNull(),
    retiredBy: text('retired_by').references(() => staff.id),
    retiredAt: instant('retired_at'),
  },
  (t) => [
    uniqueIndex('added_words_one_meaning')
      .on(t.language, t.phrase)
      .where(sql`${t.retiredAt} is null`),
    check(
      'added_words_retired_by_somebody',
      sql`(${t.retiredBy} is null) = (${t.retiredAt} is null)`,
    ),
  ],
)

/** A person's reading that was looked at as a proposal for the word lists, and what became of it. */
export const settledProposals = pgTable(
  'settled_proposals',
  {
    /** The person's reading; a later reading of the same text is a new proposal. */
    readingN: bigint('reading_n', { mode: 'number' })
      .primaryKey()
      .references(() => replyReadings.n, { onDelete: 'cascade' }),
    outcome: text('outcome').$type<'words added' | 'set aside'>().notNull(),
    settledBy: text('settled_by')
      .notNull()
      .references(() => staff.id),
    settledAt: instant('settled_at').notNull(),
  },
  (t) => [
    check('settled_proposals_outcome_known', sql`${t.outcome} in ('words added', 'set aside')`),
  ],
)
