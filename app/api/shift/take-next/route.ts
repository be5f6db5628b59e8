import { handle } from '@/lib/http'
import { takeNextApi } from '@/lib/schemas/shift'
import { takeNext } from '@/lib/services/take-next'

export const POST = handle(takeNextApi, ({ deps, actor }) => takeNext(deps, actor))
