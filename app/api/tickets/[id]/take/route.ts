import { handle } from '@/lib/http'
import { takeApi } from '@/lib/schemas/ticket-work'
import { takeTicket } from '@/lib/services/take-ticket'

export const POST = handle(takeApi, ({ deps, actor, params, body }) =>
  takeTicket(deps, actor, { ...body, ticketId: params.id ?? '' }),
)
