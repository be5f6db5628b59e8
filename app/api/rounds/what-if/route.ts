import { handle } from '@/lib/http'
import { whatIfApi } from '@/lib/schemas/what-if'
import { whatIf } from '@/lib/services/what-if'

export const GET = handle(whatIfApi, ({ deps, actor, query }) => whatIf(deps, actor, query))
