import { handle } from '@/lib/http'
import { noteVisitApi } from '@/lib/schemas/ticket-work'
import { noteVisit } from '@/lib/services/book-visit'

export const POST = handle(noteVisitApi, ({ deps, actor, params, body }) =>
  noteVisit(deps, actor, { ...body, ticketId: params.id ?? '' }),
)
