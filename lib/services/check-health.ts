import { findHealth } from '@/db/queries/health'
import type { Deps } from '@/lib/deps'

/** How the desk is, for a machine to watch: nothing of any household in it. */
export async function checkHealth(deps: Deps) {
  const now = deps.clock.now()
  const found = await findHealth(deps.store.db, now)
  const depth = await deps.queue.depth()
  return {
    ok: true as const,
    database: deps.store.kind,
    jobs: depth,
    carrier: { inDoubt: found.inDoubt, lastSentAt: iso(found.lastSentAt) },
    mail: deps.mailSet ? ('set' as const) : ('not set' as const),
    lastPlanAt: iso(found.lastPlanAt),
    oldestUnsentMinutes:
      found.oldestUnsentAt === null ? null : Math.round((now - found.oldestUnsentAt) / 60_000),
    practice: deps.practice !== null,
    now: iso(now),
  }
}

function iso(at: number | null): string | null {
  return at === null ? null : new Date(at).toISOString()
}
