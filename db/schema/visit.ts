import { sql } from 'drizzle-orm'
import { check, date, index, pgTable, text, uniqueIndex } from 'drizzle-orm/pg-core'
import { id, instant } from './columns'
import { households } from './household'
import { staff } from './staff'
import { tickets } from './ticket'

/** A pair of hands to a household that texts cannot help. `visitorId` is null until one is asked. */
export const visits = pgTable(
  'visits',
  {
    id: id(),
    ticketId: text('ticket_id').references(() => tickets.id),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id),
    visitorId: text('visitor_id').references(() => staff.id),
    why: text('why').notNull(),
    dueOn: date('due_on').notNull(),
    state: text('state').$type<'due' | 'done' | 'withdrawn'>().notNull().default('due'),
    note: text('note').notNull().default(''),
    createdAt: instant('created_at').notNull(),
    endedAt: instant('ended_at'),
  },
  (t) => [
    uniqueIndex('visits_one_due_a_household')
      .on(t.householdId)
      .where(sql`${t.state} = 'due'`),
    index('visits_visitor').on(t.visitorId, t.state),
    check('visits_state_known', sql`${t.state} in ('due', 'done', 'withdrawn')`),
  ],
)
