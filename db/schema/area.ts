import { sql } from 'drizzle-orm'
import { boolean, check, integer, jsonb, pgTable, text } from 'drizzle-orm/pg-core'
import type { Holiday } from '@/lib/domain/holiday'
import type { Language } from '@/lib/domain/language'
import { id, instant } from './columns'

export const depots = pgTable('depots', {
  id: id(),
  name: text('name').notNull().unique(),
  place: text('place').notNull().default(''),
  createdAt: instant('created_at').notNull(),
})

/** Where households live. The window is minutes after local midnight, `opens <= t < closes`. */
export const areas = pgTable(
  'areas',
  {
    id: id(),
    name: text('name').notNull().unique(),
    timeZone: text('time_zone').notNull(),
    language: text('language').$type<Language>().notNull(),
    windowOpensMinute: integer('window_opens_minute').notNull().default(480),
    windowClosesMinute: integer('window_closes_minute').notNull().default(1200),
    sundaysOff: boolean('sundays_off').notNull().default(true),
    /** Days without prompts, in order. */
    holidays: jsonb('holidays').$type<Holiday[]>().notNull().default([]),
    altitudeMetres: integer('altitude_metres').notNull().default(0),
    wetMonths: integer('wet_months')
      .array()
      .notNull()
      .default(sql`'{}'::integer[]`),
    monthCelsius: integer('month_celsius').array().notNull(),
    depotId: text('depot_id')
      .notNull()
      .references(() => depots.id),
    createdAt: instant('created_at').notNull(),
  },
  (t) => [
    check(
      'areas_window_whole',
      sql`${t.windowOpensMinute} >= 0 and ${t.windowClosesMinute} <= 1440 and ${t.windowOpensMinute} < ${t.windowClosesMinute}`,
    ),
    check('areas_month_celsius_twelve', sql`cardinality(${t.monthCelsius}) = 12`),
  ],
)

/** What the coordinator has set, one row a key; what is not here has the default of the core. */
export const settings = pgTable('settings', {
  key: text('key').primaryKey(),
  value: jsonb('value').$type<unknown>().notNull(),
  setAt: instant('set_at').notNull(),
})
