import { handle } from '@/lib/http'
import { retireWordApi } from '@/lib/schemas/reply-words'
import { retireWord } from '@/lib/services/retire-word'

export const POST = handle(retireWordApi, ({ deps, actor, params }) =>
  retireWord(deps, actor, params.id ?? ''),
)
