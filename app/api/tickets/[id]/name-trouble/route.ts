import { handle } from '@/lib/http'
import { nameTroubleApi } from '@/lib/schemas/ticket-work'
import { nameTrouble } from '@/lib/services/note-answer'

export const POST = handle(nameTroubleApi, ({ deps, actor, params, body }) =>
  nameTrouble(deps, actor, { ...body, ticketId: params.id ?? '' }),
)
