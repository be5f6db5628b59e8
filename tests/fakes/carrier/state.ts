import type { Message } from './message'

/** A text as it stands on a practice phone. It is a copy: redacting or deleting the message does not reach it. */
export type HandsetText = {
  /** Seen from the phone: `received` came to it, `written` was typed on it. */
  way: 'received' | 'written'
  phone: string
  other: string
  sid: string
  body: string
  segments: number
  at: number
  /** Written by the carrier itself (answers to STOP, START, HELP); the desk never hears of these. */
  byCarrier: boolean
  media: number
}

/** One line of the carrier's debugger: what it could not do with our answers, by its own code. */
export type DebuggerEntry = {
  at: number
  code: number
  text: string
  sid: string | null
  detail: string
}

/** Everything the carrier remembers; plain JSON, so that it can be kept in a file as it is. */
export type CarrierState = {
  nextSequence: number
  messages: Message[]
  /** What stands on the practice phones, in the order in which it came to stand there. */
  handsetTexts: HandsetText[]
  /** `sender phone` pairs that are opted out, and since when. */
  optOuts: Record<string, number>
  /** Until when each sender is busy, in epoch milliseconds. */
  busyUntil: Record<string, number>
  debuggerLog: DebuggerEntry[]
}

export function emptyState(): CarrierState {
  return {
    nextSequence: 1,
    messages: [],
    handsetTexts: [],
    optOuts: {},
    busyUntil: {},
    debuggerLog: [],
  }
}
