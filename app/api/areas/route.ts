import { handle } from '@/lib/http'
import { enterAreaApi, listAreasApi } from '@/lib/schemas/area'
import { enterArea } from '@/lib/services/enter-area'
import { listAreas } from '@/lib/services/list-areas'

export const GET = handle(listAreasApi, ({ deps, actor }) => listAreas(deps, actor))

export const POST = handle(enterAreaApi, ({ deps, actor, body }) => enterArea(deps, actor, body))
