import { handle } from '@/lib/http'
import { changeAreaApi } from '@/lib/schemas/area'
import { changeArea } from '@/lib/services/enter-area'

export const PUT = handle(changeAreaApi, ({ deps, actor, params, body }) =>
  changeArea(deps, actor, { ...body, areaId: params.id ?? '' }),
)
