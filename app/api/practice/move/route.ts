import { handle } from '@/lib/http'
import { moveClockApi } from '@/lib/schemas/practice'
import { moveClock } from '@/lib/services/move-clock'

export const POST = handle(moveClockApi, ({ deps, actor, body }) => moveClock(deps, actor, body))
