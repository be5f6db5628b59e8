import { handle } from '@/lib/http'
import { handOverApi } from '@/lib/schemas/ticket-work'
import { handOverPart } from '@/lib/services/owe-part'

export const POST = handle(handOverApi, ({ deps, actor, params, body }) =>
  handOverPart(deps, actor, { ...body, ticketId: params.id ?? '' }),
)
