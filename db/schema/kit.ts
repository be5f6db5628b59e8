import { sql } from 'drizzle-orm'
import {
  bigserial,
  boolean,
  check,
  date,
  doublePrecision,
  index,
  integer,
  pgTable,
  text,
  unique,
  uniqueIndex,
} from 'drizzle-orm/pg-core'
import { id, instant } from './columns'
import { households } from './household'
import { parts } from './part'

export const kitModels = pgTable('kit_models', {
  id: id(),
  name: text('name').notNull().unique(),
  nominalLitresPerHour: doublePrecision('nominal_litres_per_hour').notNull(),
  bottleLitres: doublePrecision('bottle_litres').notNull().default(1),
})

/** The three stages of a model, top to bottom, each with its part and its months between changes. */
export const kitModelStages = pgTable(
  'kit_model_stages',
  {
    id: id(),
    modelId: text('model_id')
      .notNull()
      .references(() => kitModels.id),
    position: integer('position').$type<1 | 2 | 3>().notNull(),
    kind: text('kind').$type<'cloth' | 'carbon' | 'fibre'>().notNull(),
    partId: text('part_id')
      .notNull()
      .references(() => parts.id),
    changeMonths: integer('change_months').notNull(),
    washed: boolean('washed').notNull(),
  },
  (t) => [
    unique('kit_model_stages_position_one').on(t.modelId, t.position),
    check('kit_model_stages_position_known', sql`${t.position} between 1 and 3`),
    check('kit_model_stages_kind_known', sql`${t.kind} in ('cloth', 'carbon', 'fibre')`),
    check('kit_model_stages_months_sane', sql`${t.changeMonths} between 1 and 60`),
  ],
)

export const kits = pgTable(
  'kits',
  {
    id: id(),
    number: bigserial('number', { mode: 'number' }).notNull().unique(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id),
    modelId: text('model_id')
      .notNull()
      .references(() => kitModels.id),
    handedOverOn: date('handed_over_on').notNull(),
    state: text('state')
      .$type<'in use' | 'out of service' | 'retired'>()
      .notNull()
      .default('in use'),
    outOfServiceSince: instant('out_of_service_since'),
    lastWashOn: date('last_wash_on').notNull(),
    /** The day the wash interval counts from: the last wash, or when a question about it was closed. */
    washCountedFrom: date('wash_counted_from').notNull(),
    nextWashOn: date('next_wash_on').notNull(),
    /** When the wash would be due without the trend; later than `nextWashOn` where it was brought forward. */
    calendarWashOn: date('calendar_wash_on').notNull(),
    nextFlowCheckOn: date('next_flow_check_on').notNull(),
    /** From when on the household is owed its welcome; null once that has left. */
    welcomeDueOn: date('welcome_due_on'),
    createdAt: instant('created_at').notNull(),
  },
  (t) => [
    index('kits_household').on(t.householdId),
    // Planning walks these: a kit that is welcomed, or no longer in use, must cost it nothing.
    index('kits_wash_due')
      .on(t.nextWashOn)
      .where(sql`${t.state} = 'in use'`),
    index('kits_flow_check_due')
      .on(t.nextFlowCheckOn)
      .where(sql`${t.state} = 'in use'`),
    index('kits_welcome_due')
      .on(t.welcomeDueOn)
      .where(sql`${t.state} = 'in use' and ${t.welcomeDueOn} is not null`),
    check('kits_state_known', sql`${t.state} in ('in use', 'out of service', 'retired')`),
    check('kits_wash_never_put_off', sql`${t.nextWashOn} <= ${t.calendarWashOn}`),
    check(
      'kits_out_has_since',
      sql`(${t.state} = 'out of service') = (${t.outOfServiceSince} is not null)`,
    ),
  ],
)

/** One part in one stage from a date on; at most one stands in a stage at a time. */
export const fittings = pgTable(
  'fittings',
  {
    id: id(),
    kitId: text('kit_id')
      .notNull()
      .references(() => kits.id),
    position: integer('position').$type<1 | 2 | 3>().notNull(),
    partId: text('part_id')
      .notNull()
      .references(() => parts.id),
    fittedOn: date('fitted_on').notNull(),
    dueOn: date('due_on').notNull(),
    removedOn: date('removed_on'),
    removedFor: text('removed_for'),
    createdAt: instant('created_at').notNull(),
  },
  (t) => [
    uniqueIndex('fittings_one_in_a_stage')
      .on(t.kitId, t.position)
      .where(sql`${t.removedOn} is null`),
    index('fittings_due')
      .on(t.dueOn)
      .where(sql`${t.removedOn} is null`),
    check('fittings_position_known', sql`${t.position} between 1 and 3`),
    check(
      'fittings_removed_after_fitted',
      sql`${t.removedOn} is null or ${t.removedOn} >= ${t.fittedOn}`,
    ),
    check('fittings_due_after_fitted', sql`${t.dueOn} > ${t.fittedOn}`),
  ],
)
