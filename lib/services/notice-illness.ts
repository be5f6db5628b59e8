import type { Transaction } from '@/db/client'
import type { KitFacts } from '@/db/queries/kit-facts'
import { listIllnessInArea } from '@/db/queries/ticket-events'
import type { Deps } from '@/lib/deps'
import { fellIllTogether } from '@/lib/domain/illness'
import { tellCoordinator } from './tell-coordinator'

/** Tells the coordinator when a second house of the area is ill within the week. */
export async function noticeIllness(
  tx: Transaction,
  deps: Deps,
  { facts, ticketId }: { facts: KitFacts; ticketId: string },
): Promise<void> {
  const others = await listIllnessInArea(tx, facts.area.id, facts.household.id)
  if (!fellIllTogether(others, deps.clock.now())) return
  await tellCoordinator(tx, deps, {
    subject: `Two houses of ${facts.area.name} are ill within a week`,
    ticketId,
  })
}
