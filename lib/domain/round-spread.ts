import { nextInsideWindow, windowClosesAt, type Window } from './round-window'

const minute = 60_000

/**
 * When the `spreadIndex`-th text (from 0) of those planned now may leave: texts go one behind the
 * other at the sender's rate, only while the window is open, and what one day's window cannot hold
 * goes on in the next. In no minute do more than `perMinute` leave.
 */
export function sendAfter({
  now,
  window,
  spreadIndex,
  perMinute,
}: {
  now: number
  window: Window
  spreadIndex: number
  perMinute: number
}): number {
  if (!(perMinute > 0)) throw new RangeError('the sender must send at some rate')
  let left = Math.ceil((spreadIndex * minute) / perMinute)
  let at = nextInsideWindow(now, window)
  for (;;) {
    const closesAt = windowClosesAt(at, at + left, window)
    if (closesAt === null) return at + left
    left -= closesAt - at
    at = nextInsideWindow(closesAt, window)
  }
}
