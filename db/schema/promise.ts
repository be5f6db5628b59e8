import { sql } from 'drizzle-orm'
import { check, index, integer, pgTable, text, uniqueIndex } from 'drizzle-orm/pg-core'
import { depots } from './area'
import { id, instant } from './columns'
import { kits } from './kit'
import { parts } from './part'
import { tickets } from './ticket'

/** A part owed to a kit, reserved from a depot until handed over or withdrawn. */
export const partPromises = pgTable(
  'part_promises',
  {
    id: id(),
    ticketId: text('ticket_id').references(() => tickets.id),
    kitId: text('kit_id')
      .notNull()
      .references(() => kits.id),
    position: integer('position').$type<1 | 2 | 3>().notNull(),
    partId: text('part_id')
      .notNull()
      .references(() => parts.id),
    depotId: text('depot_id')
      .notNull()
      .references(() => depots.id),
    state: text('state')
      .$type<'promised' | 'handed over' | 'withdrawn'>()
      .notNull()
      .default('promised'),
    promisedAt: instant('promised_at').notNull(),
    endedAt: instant('ended_at'),
  },
  (t) => [
    uniqueIndex('part_promises_one_open')
      .on(t.kitId, t.position)
      .where(sql`${t.state} = 'promised'`),
    index('part_promises_depot')
      .on(t.depotId, t.partId)
      .where(sql`${t.state} = 'promised'`),
    check('part_promises_state_known', sql`${t.state} in ('promised', 'handed over', 'withdrawn')`),
  ],
)
