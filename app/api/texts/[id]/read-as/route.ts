import { handle } from '@/lib/http'
import { readAsApi } from '@/lib/schemas/ticket-work'
import { readAs } from '@/lib/services/read-as'

export const POST = handle(readAsApi, ({ deps, actor, params, body }) =>
  readAs(deps, actor, { ...body, textId: params.id ?? '' }),
)
