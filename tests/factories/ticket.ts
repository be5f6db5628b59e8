import { recovery, type Recovery } from '@/lib/domain/flow'
import { decide, type TicketEffect, type TicketEvent, type TicketState } from '@/lib/domain/ticket'
import type { Trouble } from '@/lib/domain/trouble'

export const now = 1_780_000_000_000

export function decided(state: TicketState | null, event: TicketEvent) {
  const decision = decide(state, event, now)
  if (!decision.ok) throw new Error(`${event.kind} refused: ${decision.reason}`)
  return decision
}

export function after(...events: TicketEvent[]): { state: TicketState; effects: TicketEffect[] } {
  let last: { state: TicketState; effects: TicketEffect[] } | null = null
  for (const event of events) last = decided(last?.state ?? null, event)
  if (!last) throw new Error('no events')
  return last
}

export function refused(state: TicketState | null, event: TicketEvent): string {
  const decision = decide(state, event, now)
  return decision.ok ? 'accepted' : decision.reason
}

export const opened = (trouble: Trouble): TicketEvent => ({ kind: 'opened', trouble })
export const taken: TicketEvent = { kind: 'taken', staffId: 'ana' }
export const share = (of: number): Recovery => recovery({ flow: of * 15, first: 15, nominal: 15 })
export const answered = (stepId: string, of: number): TicketEvent => ({
  kind: 'answered',
  stepId,
  answer: 'done',
  recovery: share(of),
})

/** What goes with every taking out of service. */
export const advice: TicketEffect[] = [
  { kind: 'out of service' },
  { kind: 'send', moment: 'drink-advice' },
]
