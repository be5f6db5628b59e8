import { bundle, type Due, type SendingSettings } from './round'

/** What one prompt's text says, and which of the things due it speaks of. */
export type RoundText = {
  moment: 'welcome' | 'change-due' | 'wash-due' | 'flow-check'
  due: Due[]
}

const fibre = 3

/**
 * Which text to send today of all that is due or will be. A text asks for one thing and stands only for what
 * it says, so that a "done" is never taken for something nobody was asked; whatever else is due waits for
 * another text. What is due goes before what only will be: a family asked to wash tomorrow's filter while
 * today's question is left out would do the wrong thing on each day. What falls within some days comes
 * along where the same text can ask for it: stages to change go together, and a new fibre stage also settles
 * the wash, so that nobody washes what is thrown away within days. Null: nothing is due yet.
 */
export function textFor(
  due: readonly Due[],
  today: string,
  settings?: Pick<SendingSettings, 'bundleDays'>,
): RoundText | null {
  const near = bundle(due, today, settings)
  const of = (kind: Due['kind']) => near.filter((one) => one.kind === kind)
  const isDue = (things: readonly Due[]) => things.some(({ dueOn }) => dueOn <= today)
  const [welcome, changes, washes, checks] = [
    of('welcome'),
    of('change'),
    of('wash'),
    of('flow check'),
  ]
  if (isDue(welcome)) return { moment: 'welcome', due: welcome }
  const isRenewed = changes.some(({ stagePosition }) => stagePosition === fibre)
  if (isDue(changes) || (isRenewed && isDue(washes))) {
    return { moment: 'change-due', due: isRenewed ? [...changes, ...washes] : changes }
  }
  if (isDue(washes)) return { moment: 'wash-due', due: washes }
  return isDue(checks) ? { moment: 'flow-check', due: checks } : null
}

/** Stages as the wordings choose by: 1, 2, 3, or several in order, 12 for the first and the second. */
export function stageKey(positions: readonly number[]): number {
  const sorted = [...new Set(positions)].sort((one, other) => one - other)
  return sorted.length === 0 ? fibre : Number(sorted.join(''))
}
