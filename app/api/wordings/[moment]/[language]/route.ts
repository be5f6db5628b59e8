import { handle } from '@/lib/http'
import { placeParams, wordingCellApi } from '@/lib/schemas/wording'
import { wordingCell } from '@/lib/services/wording-cell'

export const GET = handle(wordingCellApi, ({ deps, actor, params }) =>
  wordingCell(deps, actor, placeParams(params)),
)
