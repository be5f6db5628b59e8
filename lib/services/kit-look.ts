import { columnWords, stageLooks, vesselLevel } from '@/lib/domain/kit-column'
import type { Settings } from '@/lib/domain/settings'
import type { ColumnView } from '@/lib/schemas/column'

type KitState = {
  state: 'in use' | 'out of service' | 'retired'
  fittings: readonly { position: 1 | 2 | 3; fittedOn: string; dueOn: string }[]
  /** As read; null when there is no reading. */
  litresPerHour: number | null
  litresPerDay: number
}

/** A kit as its column is drawn today. */
export function kitLook(
  kit: KitState,
  { today, settings: { need, sending } }: { today: string; settings: Settings },
): ColumnView {
  // Which stage is spent stands in the ticket; on its own a kit out of service is barred at the fibre.
  const outPosition = kit.state === 'out of service' ? 3 : null
  const stages = stageLooks(kit.fittings, { today, outPosition, dueDays: sending.bundleDays })
  const level = vesselLevel(kit.litresPerHour, kit.litresPerDay, need.enoughHours)
  return { stages, level, description: columnWords(stages, level) }
}
