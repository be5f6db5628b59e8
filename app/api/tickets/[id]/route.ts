import { handle } from '@/lib/http'
import { ticketSheetApi } from '@/lib/schemas/ticket-work'
import { ticketSheet } from '@/lib/services/ticket-sheet'

export const GET = handle(ticketSheetApi, ({ deps, actor, params, query }) =>
  ticketSheet(deps, actor, { ticketId: params.id ?? '', step: query.step }),
)
