import { sql } from 'drizzle-orm'
import {
  bigserial,
  boolean,
  check,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  unique,
  uniqueIndex,
} from 'drizzle-orm/pg-core'
import type { TicketEvent, TicketStage, Trouble } from '@/lib/domain/ticket'
import type { Walk } from '@/lib/domain/walk'
import { id, instant } from './columns'
import { households } from './household'
import { kits } from './kit'
import { staff } from './staff'

/** A household's open trouble: the cache of its events. `version` is how two agents cannot both take it. */
export const tickets = pgTable(
  'tickets',
  {
    id: id(),
    kitId: text('kit_id')
      .notNull()
      .references(() => kits.id),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id),
    stage: text('stage').$type<TicketStage>().notNull(),
    trouble: text('trouble').$type<Trouble>().notNull(),
    waitingFor: text('waiting_for'),
    noSafeWaterSince: instant('no_safe_water_since'),
    takenBy: text('taken_by').references(() => staff.id),
    automatic: boolean('automatic').notNull(),
    version: integer('version').notNull(),
    openedAt: instant('opened_at').notNull(),
    endedAt: instant('ended_at'),
    cause: text('cause'),
  },
  (t) => [
    uniqueIndex('tickets_one_open_a_kit')
      .on(t.kitId)
      .where(sql`${t.endedAt} is null`),
    index('tickets_open')
      .on(t.openedAt)
      .where(sql`${t.endedAt} is null`),
    index('tickets_household').on(t.householdId),
    index('tickets_flowing')
      .on(t.endedAt)
      .where(sql`${t.stage} = 'flowing'`),
    check(
      'tickets_stage_known',
      sql`${t.stage} in ('new', 'walking', 'waiting', 'part owed', 'visit due', 'flowing', 'retired', 'withdrawn')`,
    ),
    check(
      'tickets_ended_means_closed_stage',
      sql`(${t.endedAt} is not null) = (${t.stage} in ('flowing', 'retired', 'withdrawn'))`,
    ),
  ],
)

/** What happened to a ticket, append-only, folded by `lib/domain/ticket`. */
export const ticketEvents = pgTable(
  'ticket_events',
  {
    id: bigserial('id', { mode: 'number' }).primaryKey(),
    ticketId: text('ticket_id')
      .notNull()
      .references(() => tickets.id),
    n: integer('n').notNull(),
    kind: text('kind').notNull(),
    event: jsonb('event').$type<TicketEvent>().notNull(),
    staffId: text('staff_id').references(() => staff.id),
    at: instant('at').notNull(),
  },
  (t) => [unique('ticket_events_in_order').on(t.ticketId, t.n)],
)

/** Where the walk of a ticket stands: its odds and the steps tried, kept for the counting of causes. */
export const walks = pgTable('walks', {
  ticketId: text('ticket_id')
    .primaryKey()
    .references(() => tickets.id),
  walk: jsonb('walk').$type<Walk>().notNull(),
  changedAt: instant('changed_at').notNull(),
})
