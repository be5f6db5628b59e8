import type { Handle } from '../client'
import { settings } from '../schema/area'

export async function listSettings(db: Handle) {
  return db.select().from(settings)
}

export async function upsertSetting(db: Handle, row: typeof settings.$inferInsert) {
  await db
    .insert(settings)
    .values(row)
    .onConflictDoUpdate({ target: settings.key, set: { value: row.value, setAt: row.setAt } })
}
