import { mostWords } from '@/lib/domain/reply-added'

/** Words picked in a row: places `from` up to, not including, `to`. */
export type Picked = { from: number; to: number }

/** What is picked after a word was pressed: the row grows or shrinks at its ends, else begins anew. */
export function pickedAfter(picked: Picked | null, at: number): Picked | null {
  if (picked === null) return { from: at, to: at + 1 }
  const { from, to } = picked
  const isOnly = from === at && to === at + 1
  if (isOnly) return null
  if (at === from) return { from: from + 1, to }
  if (at === to - 1) return { from, to: to - 1 }
  const isRoom = to - from < mostWords
  if (isRoom && at === from - 1) return { from: at, to }
  if (isRoom && at === to) return { from, to: at + 1 }
  return { from: at, to: at + 1 }
}
