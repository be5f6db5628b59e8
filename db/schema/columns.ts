import { randomUUID } from 'node:crypto'
import { customType, text } from 'drizzle-orm/pg-core'

/** A random primary key. Never the order of anything: order by a serial or an instant and the key. */
export const id = () =>
  text('id')
    .primaryKey()
    .$defaultFn(() => randomUUID())

/** An instant: epoch milliseconds in code, `timestamptz` in the database. */
export const instant = customType<{ data: number; driverData: string | Date }>({
  dataType: () => 'timestamp (3) with time zone',
  toDriver: (milliseconds) => new Date(milliseconds).toISOString(),
  fromDriver: (value) => (value instanceof Date ? value : new Date(value)).getTime(),
})
