import { handle } from '@/lib/http'
import { setAsideApi } from '@/lib/schemas/reply-words'
import { setAsideProposal } from '@/lib/services/set-aside-proposal'

export const POST = handle(setAsideApi, ({ deps, actor, params, body }) =>
  setAsideProposal(deps, actor, { ...body, textId: params.id ?? '' }),
)
