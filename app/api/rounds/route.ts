import { handle } from '@/lib/http'
import { roundsApi } from '@/lib/schemas/rounds'
import { listRounds } from '@/lib/services/list-rounds'

export const GET = handle(roundsApi, ({ deps, actor }) => listRounds(deps, actor))
