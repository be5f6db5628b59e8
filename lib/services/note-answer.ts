import type { Deps } from '@/lib/deps'
import type { Actor } from '@/lib/domain/role'
import type { Trouble } from '@/lib/domain/trouble'
import type { StepAnswer } from '@/lib/domain/walk-catalogue'
import { applyTicketEvent } from './apply-ticket-event'
import { recordFlow } from './record-flow'
import { workTicket, type TicketRef, type Worked } from './ticket-work'

/** Notes an answer that was given by phone, with the minutes of a bottle where they were timed. */
export function noteAnswer(
  deps: Deps,
  actor: Actor,
  input: TicketRef & { stepId: string; answer: StepAnswer; minutes?: number; celsius?: number },
): Promise<Worked> {
  const { stepId, answer, minutes, celsius, ...ref } = input
  return workTicket(deps, actor, {
    ...ref,
    act: 'note answer',
    detail: { stepId, answer },
    work: async ({ tx, ticket, facts }) => {
      const verdict =
        minutes === undefined
          ? null
          : await recordFlow(tx, deps, {
              facts,
              minutes,
              celsius,
              known: 'said',
              ticketId: ticket.id,
            })
      return applyTicketEvent(tx, deps, {
        ticketId: ticket.id,
        staffId: actor.staffId,
        minutes,
        event: {
          kind: 'answered',
          stepId,
          answer,
          ...(verdict ? { recovery: verdict.recovery, minutes, need: verdict.need.kind } : {}),
        },
      })
    },
  })
}

/** Says what words that nobody understood are about. It only makes a trouble weigh more, never less. */
export function nameTrouble(
  deps: Deps,
  actor: Actor,
  { trouble, ...ref }: TicketRef & { trouble: Trouble },
): Promise<Worked> {
  return workTicket(deps, actor, {
    ...ref,
    act: 'name trouble',
    detail: { trouble },
    work: ({ tx, ticket }) =>
      applyTicketEvent(tx, deps, {
        ticketId: ticket.id,
        staffId: actor.staffId,
        event: { kind: 'worsened', trouble },
      }),
  })
}
