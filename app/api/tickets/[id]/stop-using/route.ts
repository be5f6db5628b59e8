import { handle } from '@/lib/http'
import { stopUsingApi } from '@/lib/schemas/ticket-work'
import { stopUsing } from '@/lib/services/end-ticket'

export const POST = handle(stopUsingApi, ({ deps, actor, params, body }) =>
  stopUsing(deps, actor, { ...body, ticketId: params.id ?? '' }),
)
