import { handle } from '@/lib/http'
import { placeParams, tryWordingApi } from '@/lib/schemas/wording'
import { tryWording } from '@/lib/services/try-wording'

export const POST = handle(tryWordingApi, ({ deps, actor, params, body }) =>
  tryWording(deps, actor, { ...placeParams(params), ...body }),
)
