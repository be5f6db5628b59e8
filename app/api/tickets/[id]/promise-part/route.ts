import { handle } from '@/lib/http'
import { promisePartApi } from '@/lib/schemas/ticket-work'
import { owePart } from '@/lib/services/owe-part'

export const POST = handle(promisePartApi, ({ deps, actor, params, body }) =>
  owePart(deps, actor, { ...body, ticketId: params.id ?? '' }),
)
