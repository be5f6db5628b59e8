import { handle } from '@/lib/http'
import { placeParams, retireDraftApi } from '@/lib/schemas/wording'
import { retireDraft } from '@/lib/services/retire-draft'

export const POST = handle(retireDraftApi, ({ deps, actor, params, body }) =>
  retireDraft(deps, actor, { ...placeParams(params), ...body }),
)
