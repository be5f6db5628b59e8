import { sql } from 'drizzle-orm'
import { check, integer, pgTable, text, unique, uniqueIndex } from 'drizzle-orm/pg-core'
import type { Language } from '@/lib/domain/language'
import { id, instant } from './columns'
import { staff } from './staff'

/** One edition of what a text says at a moment in a language. One draft and one in use at a time. */
export const wordings = pgTable(
  'wordings',
  {
    id: id(),
    moment: text('moment').notNull(),
    language: text('language').$type<Language>().notNull(),
    edition: integer('edition').notNull(),
    body: text('body').notNull(),
    state: text('state').$type<'draft' | 'approved' | 'in use' | 'retired'>().notNull(),
    note: text('note').notNull().default(''),
    firstLanguageEdition: integer('first_language_edition').notNull(),
    writtenBy: text('written_by').references(() => staff.id),
    approvedBy: text('approved_by').references(() => staff.id),
    secondApprovedBy: text('second_approved_by').references(() => staff.id),
    writtenAt: instant('written_at').notNull(),
    inUseFrom: instant('in_use_from'),
  },
  (t) => [
    unique('wordings_edition_one').on(t.moment, t.language, t.edition),
    uniqueIndex('wordings_one_in_use')
      .on(t.moment, t.language)
      .where(sql`${t.state} = 'in use'`),
    uniqueIndex('wordings_one_open')
      .on(t.moment, t.language)
      .where(sql`${t.state} in ('draft', 'approved')`),
    check('wordings_state_known', sql`${t.state} in ('draft', 'approved', 'in use', 'retired')`),
    check(
      'wordings_two_people',
      sql`${t.secondApprovedBy} is null or ${t.secondApprovedBy} <> ${t.approvedBy}`,
    ),
  ],
)
