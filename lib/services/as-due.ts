import type { DueRow } from '@/db/queries/prompt'
import type { Due } from '@/lib/domain/round'

/** A row of what is due as the core reads it. */
export function asDue({ kind, dueOn, position }: DueRow): Due {
  return position === null ? { kind, dueOn } : { kind, dueOn, stagePosition: position }
}
