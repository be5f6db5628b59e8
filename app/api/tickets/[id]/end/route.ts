import { handle } from '@/lib/http'
import { endApi } from '@/lib/schemas/ticket-work'
import { endTicket } from '@/lib/services/end-ticket'

export const POST = handle(endApi, ({ deps, actor, params, body }) =>
  endTicket(deps, actor, { ...body, ticketId: params.id ?? '' }),
)
