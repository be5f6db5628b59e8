import type { Carrier } from './carrier'
import { landOnHandset } from './handset'
import { isTollFree, optedOut } from './keywords'
import { logProblem } from './debugger-log'
import { replyLoops } from './loop-guard'
import type { Message, PlannedStep } from './message'
import { longestQueueSeconds } from './message-book'
import { fateOf, stepsAfterSending } from './number-fates'
import { reportStatus } from './status-callback'

/** A service takes this long to pick a sender for a message it accepted. */
const acceptMilliseconds = 60

/** A clock set back by more than this was reset on purpose; smaller steps are the machine's own. */
const setBackMilliseconds = 5_000

/** Puts a new message on its way. `scheduledAt` is set when it is to wait for its hour. */
export function startMessage(carrier: Carrier, message: Message, scheduledAt?: number): void {
  if (message.status === 'queued') planSending(carrier, message, carrier.clock.now())
  else {
    const at = scheduledAt ?? carrier.clock.now() + acceptMilliseconds
    message.plan = [{ at, to: 'queued' }]
  }
  carrier.pending.add(message)
  carrier.changed()
}

export function cancelMessage(carrier: Carrier, message: Message): void {
  message.plan = []
  carrier.pending.delete(message)
  applyStep(carrier, message, { at: carrier.clock.now(), to: 'canceled' })
}

/** Takes every step that is due, in the order of their instants and not of the messages. */
export function takeDueSteps(carrier: Carrier): void {
  const now = carrier.clock.now()
  for (;;) {
    const message = earliestDue(carrier, now)
    if (!message) return
    const step = message.plan.shift()
    if (step) {
      applyStep(carrier, message, step)
      if (step.to === 'queued') planSending(carrier, message, step.at)
    }
    if (message.plan.length === 0) carrier.pending.delete(message)
  }
}

function earliestDue(carrier: Carrier, now: number): Message | null {
  let found: Message | null = null
  let foundAt = Infinity
  for (const message of carrier.pending) {
    const at = message.plan[0]?.at ?? -Infinity
    if (at <= now && at < foundAt) {
      found = message
      foundAt = at
    }
  }
  return found
}

function applyStep(carrier: Carrier, message: Message, step: PlannedStep): void {
  message.status = step.to
  message.updatedAt = step.at
  message.errorCode = step.errorCode ?? null
  if (step.to === 'sent' || (step.to === 'failed' && message.sentAt === null)) {
    message.sentAt = step.at
  }
  if (step.landsOnHandset) landOnHandset(carrier, message, step.at)
  carrier.changed()
  reportStatus(carrier, message, step.at)
}

/** Queues behind what the sender still has to say: segments count against its rate, not messages. */
function planSending(carrier: Carrier, message: Message, queuedAt: number): void {
  const sender = message.from ?? carrier.settings.senders[0] ?? ''
  message.from = sender
  const refused = refusalInQueue(carrier, message, queuedAt)
  if (refused !== null) {
    message.plan = [{ at: queuedAt + 1, to: 'failed', errorCode: refused }]
    return
  }
  const startsAt = Math.max(queuedAt, carrier.state.busyUntil[sender] ?? 0)
  if (message.messagingServiceSid && startsAt - queuedAt > longestQueueSeconds * 1000) {
    message.plan = [{ at: queuedAt + 1, to: 'failed', errorCode: 30001 }]
    return
  }
  const expiresAt = message.createdAt + message.validitySeconds * 1000
  if (startsAt > Math.max(expiresAt, queuedAt)) {
    message.plan = [{ at: expiresAt, to: 'failed', errorCode: 30036 }]
    return
  }
  const sentAt = startsAt + (message.segments / carrier.settings.segmentsPerSecond) * 1000
  carrier.state.busyUntil[sender] = sentAt
  const { airMilliseconds, lateMilliseconds } = carrier.settings
  const earlier = countEarlier(carrier, message)
  message.plan = [
    { at: startsAt, to: 'sending' },
    ...stepsAfterSending(
      fateOf(message.to),
      { sentAt, airMilliseconds, lateMilliseconds },
      earlier,
    ),
  ]
}

function refusalInQueue(carrier: Carrier, message: Message, at: number): number | null {
  if (message.direction === 'outbound-reply' && replyLoops(carrier, message, at)) {
    logProblem(carrier, { code: 14107, sid: message.sid, detail: `${message.from} ${message.to}` })
    return 14107
  }
  if (!optedOut(carrier, message.from ?? '', message.to)) return null
  return isTollFree(message.from ?? '') ? 30004 : 21610
}

function countEarlier(carrier: Carrier, message: Message): number {
  return carrier.state.messages.filter(
    (other) =>
      other.to === message.to && other.direction !== 'inbound' && other.sequence < message.sequence,
  ).length
}

/** Moves what is planned along with a clock that was set back, so that nothing waits for a lost future. */
export function followClockBack(carrier: Carrier, before: number, now: number): void {
  const back = before - now
  if (back <= setBackMilliseconds) return
  for (const message of carrier.pending) {
    for (const step of message.plan) step.at -= back
  }
  for (const sender of Object.keys(carrier.state.busyUntil)) {
    carrier.state.busyUntil[sender] = (carrier.state.busyUntil[sender] ?? 0) - back
  }
  carrier.changed()
}
