import { listTimeZones } from '@/db/queries/time-zone'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import { localDay } from '@/lib/domain/round-window'
import { clockWords } from '@/lib/domain/stamp'
import type { Refusal } from '@/lib/schemas/endpoint'
import type { Practice } from '@/lib/schemas/practice'
import { dayNames } from './day-names'

const ZONES_SHOWN = 4

/** What the practice page shows; there is none where a real carrier could be reached. */
export async function practiceDesk(deps: Deps, actor: Actor): Promise<Practice | Refusal> {
  allow(actor, 'move the practice clock')
  if (!deps.practice) return { ok: false, reason: 'not found' }
  const now = deps.clock.now()
  const zones = await listTimeZones(deps.store.db)
  return {
    clocks: (zones.length > 0 ? zones : ['UTC']).slice(0, ZONES_SHOWN).map((zone) => {
      const on = localDay(now, zone)
      return {
        zone,
        day: `${dayNames(on).long} ${on.slice(0, 4)}`,
        hour: clockWords(now, zone),
      }
    }),
    phonesUrl: deps.practicePhonesUrl,
  }
}
