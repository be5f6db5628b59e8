import { handle } from '@/lib/http'
import { householdTextsApi } from '@/lib/schemas/household'
import { householdTexts } from '@/lib/services/list-slips'

export const GET = handle(householdTextsApi, ({ deps, actor, params, query }) =>
  householdTexts(deps, actor, { householdId: params.id ?? '', before: query.before ?? null }),
)
