import { handle } from '@/lib/http'
import { publicHolidaysApi } from '@/lib/schemas/holiday'
import { publicHolidays } from '@/lib/services/public-holidays'

export const GET = handle(publicHolidaysApi, ({ deps, actor, params }) =>
  publicHolidays(deps, actor, { country: params.country ?? '' }),
)
