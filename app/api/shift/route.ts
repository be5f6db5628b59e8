import { handle } from '@/lib/http'
import { shiftApi } from '@/lib/schemas/shift'
import { listShift } from '@/lib/services/list-shift'

export const GET = handle(shiftApi, ({ deps, actor }) => listShift(deps, actor))
