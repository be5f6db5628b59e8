import { handle } from '@/lib/http'
import { listHouseholdsApi } from '@/lib/schemas/household'
import { enterHouseholdApi } from '@/lib/schemas/household-entry'
import { enterHousehold } from '@/lib/services/enter-household'
import { listHouseholds } from '@/lib/services/list-households'

export const GET = handle(listHouseholdsApi, ({ deps, actor, query }) =>
  listHouseholds(deps, actor, query),
)

export const POST = handle(enterHouseholdApi, ({ deps, actor, body }) =>
  enterHousehold(deps, actor, body),
)
