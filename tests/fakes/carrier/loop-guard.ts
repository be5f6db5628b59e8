import type { Carrier } from './carrier'
import type { Message } from './message'

const guardMilliseconds = 30_000
const repliesAllowed = 30

/** True when two numbers have already exchanged 30 replies in the last 30 seconds; source: the carrier's error 14107. */
export function replyLoops(carrier: Carrier, message: Message, at: number): boolean {
  const recent = carrier.state.messages.filter(
    (other) =>
      other.direction === 'outbound-reply' &&
      other.sid !== message.sid &&
      other.from === message.from &&
      other.to === message.to &&
      other.createdAt > at - guardMilliseconds,
  )
  return recent.length >= repliesAllowed
}
