import { handle } from '@/lib/http'
import { enterDepotApi, listDepotsApi } from '@/lib/schemas/depot'
import { enterDepot } from '@/lib/services/enter-depot'
import { listDepots } from '@/lib/services/list-depots'

export const GET = handle(listDepotsApi, ({ deps, actor }) => listDepots(deps, actor))

export const POST = handle(enterDepotApi, ({ deps, actor, body }) => enterDepot(deps, actor, body))
