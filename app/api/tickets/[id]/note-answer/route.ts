import { handle } from '@/lib/http'
import { noteAnswerApi } from '@/lib/schemas/ticket-work'
import { noteAnswer } from '@/lib/services/note-answer'

export const POST = handle(noteAnswerApi, ({ deps, actor, params, body }) =>
  noteAnswer(deps, actor, { ...body, ticketId: params.id ?? '' }),
)
