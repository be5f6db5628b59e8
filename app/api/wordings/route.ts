import { handle } from '@/lib/http'
import { wordingMatrixApi } from '@/lib/schemas/wording'
import { wordingMatrix } from '@/lib/services/wording-matrix'

export const GET = handle(wordingMatrixApi, ({ deps, actor }) => wordingMatrix(deps, actor))
