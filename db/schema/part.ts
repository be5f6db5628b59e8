import { pgTable, text } from 'drizzle-orm/pg-core'
import { id } from './columns'

export const parts = pgTable('parts', {
  id: id(),
  name: text('name').notNull().unique(),
  kind: text('kind').$type<'cloth' | 'carbon' | 'fibre' | 'cap' | 'hose'>().notNull(),
})
