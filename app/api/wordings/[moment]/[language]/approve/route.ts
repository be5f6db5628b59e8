import { handle } from '@/lib/http'
import { placeParams, approveWordingApi } from '@/lib/schemas/wording'
import { approveWording } from '@/lib/services/approve-wording'

export const POST = handle(approveWordingApi, ({ deps, actor, params, body }) =>
  approveWording(deps, actor, { ...placeParams(params), ...body }),
)
