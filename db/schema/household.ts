import { sql } from 'drizzle-orm'
import {
  boolean,
  check,
  index,
  integer,
  pgTable,
  primaryKey,
  text,
  uniqueIndex,
} from 'drizzle-orm/pg-core'
import type { SourceClass } from '@/lib/domain/cycle'
import type { Language } from '@/lib/domain/language'
import { areas } from './area'
import { id, instant } from './columns'

export const households = pgTable(
  'households',
  {
    id: id(),
    name: text('name').notNull(),
    areaId: text('area_id')
      .notNull()
      .references(() => areas.id),
    language: text('language').$type<Language>().notNull(),
    place: text('place').notNull().default(''),
    people: integer('people').notNull(),
    infant: boolean('infant').notNull().default(false),
    pregnant: boolean('pregnant').notNull().default(false),
    elderly: boolean('elderly').notNull().default(false),
    ill: boolean('ill').notNull().default(false),
    sourceClass: text('source_class').$type<SourceClass>().notNull(),
    movedAt: instant('moved_at'),
    createdAt: instant('created_at').notNull(),
  },
  (t) => [
    index('households_area').on(t.areaId),
    check('households_people_sane', sql`${t.people} between 1 and 60`),
    check('households_source_known', sql`${t.sourceClass} in ('clear', 'cloudy', 'very cloudy')`),
  ],
)

/** A number. Our consent and the carrier's block are kept apart; a text goes only if both allow. */
export const phones = pgTable(
  'phones',
  {
    id: id(),
    e164: text('e164').notNull().unique(),
    state: text('state').$type<'active' | 'suspended' | 'gone'>().notNull().default('active'),
    stateWhy: text('state_why').notNull().default(''),
    consent: text('consent').$type<'none' | 'given' | 'withdrawn'>().notNull().default('none'),
    carrierBlocked: boolean('carrier_blocked').notNull().default(false),
    createdAt: instant('created_at').notNull(),
  },
  (t) => [
    check('phones_e164_shape', sql`${t.e164} ~ '^[+][1-9][0-9]{6,14}$'`),
    check('phones_state_known', sql`${t.state} in ('active', 'suspended', 'gone')`),
    check('phones_consent_known', sql`${t.consent} in ('none', 'given', 'withdrawn')`),
  ],
)

/** Who answers which phone: several households may share one, a household may have several. */
export const householdPhones = pgTable(
  'household_phones',
  {
    householdId: text('household_id')
      .notNull()
      .references(() => households.id),
    phoneId: text('phone_id')
      .notNull()
      .references(() => phones.id),
    answeredBy: text('answered_by').notNull().default(''),
    first: boolean('first').notNull().default(true),
  },
  (t) => [
    primaryKey({ columns: [t.householdId, t.phoneId] }),
    index('household_phones_phone').on(t.phoneId),
    uniqueIndex('household_phones_one_first')
      .on(t.householdId)
      .where(sql`${t.first}`),
  ],
)
