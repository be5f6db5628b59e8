import type { ReplyKind, ReplyReading } from './reply'

type Read<T> = { text: T; before: ReplyReading; after: ReplyReading }

export type ReplyEffect<T> = {
  looked: number
  changed: number
  /** Of those, how many spoke of a danger before and no longer do. */
  calmed: number
  /** The first of them, those that were calmed on top. */
  some: Read<T>[]
}

const dangers: ReadonlySet<ReplyKind> = new Set<ReplyKind>(['unwell', 'broken', 'odd-water'])

function isOther({ before, after }: Read<unknown>): boolean {
  return (
    before.kind !== after.kind ||
    before.minutes !== after.minutes ||
    before.choice !== after.choice ||
    before.dangerSign !== after.dangerSign
  )
}

/** A danger before that is none any more, or is less of one. */
function isCalmed({ before, after }: Read<unknown>): boolean {
  if (!dangers.has(before.kind)) return false
  return !dangers.has(after.kind) || (before.dangerSign === true && !after.dangerSign)
}

/** What a change of the words does to texts that are stored: which are read otherwise. */
export function replyEffect<T>(reads: readonly Read<T>[], most: number): ReplyEffect<T> {
  const changed = reads.filter(isOther)
  const calmed = changed.filter(isCalmed)
  const others = changed.filter((read) => !isCalmed(read))
  return {
    looked: reads.length,
    changed: changed.length,
    calmed: calmed.length,
    some: [...calmed, ...others].slice(0, most),
  }
}
