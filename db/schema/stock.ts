import { sql } from 'drizzle-orm'
import { bigserial, check, index, integer, pgTable, text } from 'drizzle-orm/pg-core'
import { depots } from './area'
import { instant } from './columns'
import { parts } from './part'
import { partPromises } from './promise'
import { staff } from './staff'

/** The stock ledger: what came in (+) and went out (−) of a depot; never updated. */
export const stockMoves = pgTable(
  'stock_moves',
  {
    n: bigserial('n', { mode: 'number' }).primaryKey(),
    depotId: text('depot_id')
      .notNull()
      .references(() => depots.id),
    partId: text('part_id')
      .notNull()
      .references(() => parts.id),
    quantity: integer('quantity').notNull(),
    why: text('why').$type<'received' | 'handed over' | 'counted' | 'lost'>().notNull(),
    promiseId: text('promise_id')
      .unique('stock_moves_one_a_promise')
      .references(() => partPromises.id),
    staffId: text('staff_id').references(() => staff.id),
    at: instant('at').notNull(),
  },
  (t) => [
    index('stock_moves_place').on(t.depotId, t.partId),
    check('stock_moves_not_nothing', sql`${t.quantity} <> 0`),
    check('stock_moves_why_known', sql`${t.why} in ('received', 'handed over', 'counted', 'lost')`),
  ],
)
