import { handle } from '@/lib/http'
import { bookVisitApi } from '@/lib/schemas/ticket-work'
import { bookVisit } from '@/lib/services/book-visit'

export const POST = handle(bookVisitApi, ({ deps, actor, params, body }) =>
  bookVisit(deps, actor, { ...body, ticketId: params.id ?? '' }),
)
