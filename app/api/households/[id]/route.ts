import { handle } from '@/lib/http'
import { householdSheetApi } from '@/lib/schemas/household'
import { changeHouseholdApi } from '@/lib/schemas/household-entry'
import { changeHousehold } from '@/lib/services/change-household'
import { householdSheet } from '@/lib/services/household-sheet'

export const GET = handle(householdSheetApi, ({ deps, actor, params }) =>
  householdSheet(deps, actor, params.id ?? ''),
)

export const PUT = handle(changeHouseholdApi, ({ deps, actor, params, body }) =>
  changeHousehold(deps, actor, { ...body, householdId: params.id ?? '' }),
)
