import { daysBetween } from './day'
import { enough, needDefaults } from './need'
import { sendingDefaults } from './round'

/** A stage as the drawn column shows it; `left` is the share of its cycle that is left, 0 to 1. */
export type StageLook = {
  position: 1 | 2 | 3
  left: number
  state: 'good' | 'due' | 'overdue' | 'out'
}

type Fitted = { position: 1 | 2 | 3; fittedOn: string; dueOn: string }

const stageNames = { 1: 'cloth', 2: 'carbon', 3: 'fibre' } as const

type Seen = {
  today: string
  outPosition: 1 | 2 | 3 | null
  /** From how many days before its day a change counts as due: what one text bundles. */
  dueDays?: number
}

function stateOf(
  fitted: Fitted,
  { today, dueDays = sendingDefaults.bundleDays }: Seen,
): StageLook['state'] {
  const daysLeft = daysBetween(today, fitted.dueOn)
  if (daysLeft < 0) return 'overdue'
  return daysLeft <= dueDays ? 'due' : 'good'
}

/**
 * How a kit's stages are drawn today, top to bottom. `outPosition` is the stage that keeps the kit out of
 * service: the spent one, or the fibre stage when none is known.
 */
export function stageLooks(fitted: readonly Fitted[], seen: Seen): StageLook[] {
  const { today, outPosition } = seen
  return fitted
    .map((one): StageLook => {
      const cycleDays = Math.max(1, daysBetween(one.fittedOn, one.dueOn))
      const left = Math.min(1, Math.max(0, daysBetween(today, one.dueOn) / cycleDays))
      const state = one.position === outPosition ? 'out' : stateOf(one, seen)
      return { position: one.position, left, state }
    })
    .sort((a, b) => a.position - b.position)
}

/** The last flow against the need, 0 to 1: full when the day's water comes in the hours that are enough. */
export function vesselLevel(
  litresPerHour: number | null,
  litresPerDay: number,
  enoughHours = needDefaults.enoughHours,
): number | null {
  if (litresPerHour === null) return null
  const { hours } = enough({ litresPerHour, litresPerDay, enoughHours })
  return Math.min(1, enoughHours / hours)
}

function stageWords({ position, left, state }: StageLook): string {
  const name = stageNames[position]
  switch (state) {
    case 'good':
      return `${name} ${Math.round(left * 100)} % of its time left`
    case 'due':
      return `${name} due`
    case 'overdue':
      return `${name} overdue`
    case 'out':
      return `${name} out of service`
  }
}

/** The column in words, for who cannot see it. */
export function columnWords(stages: readonly StageLook[], level: number | null): string {
  const water =
    level === null
      ? 'no flow reading'
      : level >= 1
        ? 'flow enough'
        : `flow ${Math.round(level * 100)} % of the need`
  return ['The kit', ...stages.map(stageWords), water].join(', ').replace('kit,', 'kit:')
}
