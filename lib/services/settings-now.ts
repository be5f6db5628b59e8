import type { Handle } from '@/db/client'
import { listSettings } from '@/db/queries/setting'
import type { Settings } from '@/lib/domain/settings'
import { readSettings } from '@/lib/schemas/settings'

/** The settings as they are now; what nobody has set has its default. */
export async function settingsNow(db: Handle): Promise<Settings> {
  return readSettings(await listSettings(db))
}
