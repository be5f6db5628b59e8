import { sql } from 'drizzle-orm'
import { bigserial, check, index, pgTable, text } from 'drizzle-orm/pg-core'
import { instant } from './columns'
import { phones } from './household'
import { staff } from './staff'
import { texts } from './text'

/**
 * Numbers that asked for no texts, as keyed hashes: they outlive the phone's own row, so that neither an erasure
 * nor an entry of old lists brings texts back. `keyMark` tells which key made the hash.
 */
export const suppressions = pgTable('suppressions', {
  hash: text('hash').primaryKey(),
  keyMark: text('key_mark').notNull(),
  at: instant('at').notNull(),
})

/** Each yes and no a phone gave, append-only; `phones.consent` is the last of them. */
export const consents = pgTable(
  'consents',
  {
    n: bigserial('n', { mode: 'number' }).primaryKey(),
    phoneId: text('phone_id')
      .notNull()
      .references(() => phones.id),
    consent: text('consent').$type<'given' | 'withdrawn'>().notNull(),
    how: text('how').notNull(),
    textId: text('text_id').references(() => texts.id),
    staffId: text('staff_id').references(() => staff.id),
    at: instant('at').notNull(),
  },
  (t) => [
    index('consents_phone').on(t.phoneId),
    check('consents_known', sql`${t.consent} in ('given', 'withdrawn')`),
  ],
)
