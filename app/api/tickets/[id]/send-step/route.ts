import { handle } from '@/lib/http'
import { sendStepApi } from '@/lib/schemas/ticket-work'
import { sendStep } from '@/lib/services/send-step'

export const POST = handle(sendStepApi, ({ deps, actor, params, body }) =>
  sendStep(deps, actor, { ...body, ticketId: params.id ?? '' }),
)
