import { handle } from '@/lib/http'
import { proposalsApi } from '@/lib/schemas/reply-words'
import { listWordProposals } from '@/lib/services/list-proposals'

export const GET = handle(proposalsApi, ({ deps, actor, query }) =>
  listWordProposals(deps, actor, query),
)
