import { handle } from '@/lib/http'
import { addWordsApi } from '@/lib/schemas/reply-words'
import { addWords } from '@/lib/services/add-words'

export const POST = handle(addWordsApi, ({ deps, actor, body }) => addWords(deps, actor, body))
