import { handle } from '@/lib/http'
import { placeParams, saveDraftApi } from '@/lib/schemas/wording'
import { saveDraft } from '@/lib/services/save-draft'

export const PUT = handle(saveDraftApi, ({ deps, actor, params, body }) =>
  saveDraft(deps, actor, { ...placeParams(params), ...body }),
)
