import { handle } from '@/lib/http'
import { writeApi } from '@/lib/schemas/ticket-work'
import { writeToHousehold } from '@/lib/services/send-step'

export const POST = handle(writeApi, ({ deps, actor, params, body }) =>
  writeToHousehold(deps, actor, { ...body, ticketId: params.id ?? '' }),
)
