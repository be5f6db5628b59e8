import type { Due } from './round'

/** What one prompt's text says, and which of the things due it speaks of. */
export type RoundText = {
  moment: 'welcome' | 'change-due' | 'wash-due' | 'flow-check'
  due: Due[]
}

const fibre = 3

/**
 * Which text to send for what is due now. A text asks for one thing and stands only for what it says, so
 * that a "done" is never taken for something nobody was asked: stages to change go together, a new fibre
 * stage also settles the wash, and whatever else is due waits for another text. Null: nothing is due.
 */
export function textFor(due: readonly Due[]): RoundText | null {
  const of = (kind: Due['kind']) => due.filter((one) => one.kind === kind)
  const [welcome, changes, washes, checks] = [
    of('welcome'),
    of('change'),
    of('wash'),
    of('flow check'),
  ]
  if (welcome.length > 0) return { moment: 'welcome', due: welcome }
  if (changes.length > 0) {
    const isRenewed = changes.some(({ stagePosition }) => stagePosition === fibre)
    return { moment: 'change-due', due: isRenewed ? [...changes, ...washes] : changes }
  }
  if (washes.length > 0) return { moment: 'wash-due', due: washes }
  return checks.length > 0 ? { moment: 'flow-check', due: checks } : null
}

/** Stages as the wordings choose by: 1, 2, 3, or several in order, 12 for the first and the second. */
export function stageKey(positions: readonly number[]): number {
  const sorted = [...new Set(positions)].sort((one, other) => one - other)
  return sorted.length === 0 ? fibre : Number(sorted.join(''))
}
