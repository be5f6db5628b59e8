import { sql } from 'drizzle-orm'
import { bigserial, check, date, doublePrecision, index, pgTable, text } from 'drizzle-orm/pg-core'
import { instant } from './columns'
import { fittings, kits } from './kit'
import { texts } from './text'
import { tickets } from './ticket'

export const washes = pgTable(
  'washes',
  {
    n: bigserial('n', { mode: 'number' }).primaryKey(),
    kitId: text('kit_id')
      .notNull()
      .references(() => kits.id),
    ticketId: text('ticket_id').references(() => tickets.id),
    washedOn: date('washed_on').notNull(),
    known: text('known').$type<'said' | 'measured' | 'seen'>().notNull(),
    at: instant('at').notNull(),
  },
  (t) => [
    index('washes_kit').on(t.kitId),
    check('washes_known_how', sql`${t.known} in ('said', 'measured', 'seen')`),
  ],
)

/** A bottle-fill time and what it comes to; `normalised` is litres per hour at 20 °C and full head. */
export const flowReadings = pgTable(
  'flow_readings',
  {
    n: bigserial('n', { mode: 'number' }).primaryKey(),
    kitId: text('kit_id')
      .notNull()
      .references(() => kits.id),
    fibreFittingId: text('fibre_fitting_id')
      .notNull()
      .references(() => fittings.id),
    ticketId: text('ticket_id').references(() => tickets.id),
    textId: text('text_id')
      .unique('flow_readings_one_a_text')
      .references(() => texts.id),
    litres: doublePrecision('litres').notNull(),
    seconds: doublePrecision('seconds').notNull(),
    celsius: doublePrecision('celsius').notNull(),
    celsiusFrom: text('celsius_from').$type<'told' | 'area month'>().notNull(),
    headRatio: doublePrecision('head_ratio').notNull().default(1),
    litresPerHour: doublePrecision('litres_per_hour').notNull(),
    normalised: doublePrecision('normalised').notNull(),
    errorShare: doublePrecision('error_share').notNull(),
    known: text('known').$type<'said' | 'measured' | 'seen'>().notNull(),
    at: instant('at').notNull(),
  },
  (t) => [
    index('flow_readings_kit').on(t.kitId, t.at),
    check(
      'flow_readings_positive',
      sql`${t.litres} > 0 and ${t.seconds} > 0 and ${t.headRatio} > 0 and ${t.headRatio} <= 1`,
    ),
    check('flow_readings_known_how', sql`${t.known} in ('said', 'measured', 'seen')`),
  ],
)
