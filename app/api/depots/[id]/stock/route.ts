import { handle } from '@/lib/http'
import { countStockApi } from '@/lib/schemas/depot'
import { countStock } from '@/lib/services/enter-depot'

export const POST = handle(countStockApi, ({ deps, actor, params, body }) =>
  countStock(deps, actor, { ...body, depotId: params.id ?? '' }),
)
