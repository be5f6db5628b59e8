import { handle } from '@/lib/http'
import { handOnApi } from '@/lib/schemas/ticket-work'
import { handOnTicket } from '@/lib/services/take-ticket'

export const POST = handle(handOnApi, ({ deps, actor, params, body }) =>
  handOnTicket(deps, actor, { ...body, ticketId: params.id ?? '' }),
)
