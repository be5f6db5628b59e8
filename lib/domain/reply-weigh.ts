import { figureOf } from './reply-figure'
import { findIllness } from './reply-illness'
import { sureEnough, type ReplyKind, type ReplyReading } from './reply-kind'
import { isSupposed, type Sense } from './reply-sense'
import { slowSureness } from './reply-trouble'

export type Chance = { kind: ReplyKind; chance: number }

/** Kinds that a family is harmed by when they are missed. */
const grave: ReadonlySet<ReplyKind> = new Set([
  'unwell',
  'broken',
  'odd-water',
  'stop',
  'wrong-number',
])

/** The likeliest kind needs this chance, and more where the word lists read another. */
export const weighing = {
  whenAgreed: 0.45,
  whenAlone: 0.65,
  /** No word of the text is in any list. */
  whenStrange: 0.85,
  /** Chance of any grave kind together, from which a harmless reading is not believed. */
  graveDoubt: 0.12,
  /** A grave kind that the word lists read is set aside only by a chance as high as this. */
  againstGrave: 0.97,
  /** Texts end only by a reply that the word lists take for an opt-out, and with this chance. */
  stopAgreed: 0.7,
  stopBesideDanger: 0.8,
}

/**
 * One reading from two: the likeliest by the examples, if that is likely enough, with the figures that the word lists
 * found. Danger, an opt-out and a wrong number that either reader sees are never read as something else while there
 * is doubt: a person reads them.
 */
export function weigh(
  sense: Sense,
  byWords: ReplyReading,
  chances: readonly Chance[],
): ReplyReading {
  const [top, ...others] = chances
  if (!top) return byWords
  if (byWords.kind === 'stop') return weighStop(byWords, chances)
  const isAgreed = top.kind === byWords.kind
  const needed = isAgreed ? weighing.whenAgreed : neededAlone(sense)
  const isBelieved = top.chance >= needed && !isDangerous(sense, byWords, { top, others })
  const read = isAgreed && top.kind !== 'unclear' ? byWords : asRead(sense, top.kind)
  if (!isBelieved || read === null) return unclear(top.chance)
  return { ...read, sure: Math.max(sureEnough, top.chance) }
}

function unclear(chance: number): ReplyReading {
  return { kind: 'unclear', sure: Math.min(chance, sureEnough - 0.01) }
}

/** An opt-out comes before a danger in the same text; beside anything else it must be likely by itself. */
function weighStop(byWords: ReplyReading, chances: readonly Chance[]): ReplyReading {
  const stop = sumOf(chances, (kind) => kind === 'stop')
  const isBesideDanger = sumOf(chances, (kind) => grave.has(kind)) >= weighing.stopBesideDanger
  return stop >= weighing.stopAgreed || isBesideDanger ? byWords : unclear(stop)
}

function sumOf(chances: readonly Chance[], isMeant: (kind: ReplyKind) => boolean): number {
  return chances.reduce((sum, { kind, chance }) => sum + (isMeant(kind) ? chance : 0), 0)
}

function neededAlone({ marks, figures }: Sense): number {
  const isStrange = marks.length === 0 && figures.spans.length + figures.bare.length === 0
  return isStrange ? weighing.whenStrange : weighing.whenAlone
}

/** True where taking the likeliest kind may end a family's texts unasked, or pass over a danger. */
function isDangerous(
  sense: Sense,
  byWords: ReplyReading,
  { top, others }: { top: Chance; others: readonly Chance[] },
): boolean {
  if (top.kind === 'stop') return true
  // "What if it cracks?" tells of no danger, and yet a person answers it.
  if (grave.has(top.kind)) return isSupposed(sense)
  if (grave.has(byWords.kind)) return top.chance < weighing.againstGrave
  return sumOf(others, (kind) => grave.has(kind)) >= weighing.graveDoubt
}

/** A kind with what belongs to it, from the text; null where the text does not have it. */
function asRead(sense: Sense, kind: ReplyKind): Omit<ReplyReading, 'sure'> | null {
  const figure = figureOf(sense)
  const also = slowSureness(sense) >= sureEnough ? { alsoSlow: true } : {}
  switch (kind) {
    case 'unwell':
      return { kind, ...also, ...(findIllness(sense)?.dangerSign ? { dangerSign: true } : {}) }
    case 'broken':
    case 'odd-water':
      return { kind, ...also }
    case 'flow-figure':
      return figure && { kind, minutes: figure.minutes, ...also }
    case 'choice':
      return figure && !figure.hasUnit && [1, 2, 3].includes(figure.minutes)
        ? { kind, choice: figure.minutes, minutes: figure.minutes }
        : null
    case 'slow':
      return { kind, ...(figure ? { minutes: figure.minutes } : {}) }
    case 'unclear':
      return null
    default:
      return { kind }
  }
}
