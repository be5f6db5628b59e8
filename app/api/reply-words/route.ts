import { handle } from '@/lib/http'
import { replyWordsApi } from '@/lib/schemas/reply-words'
import { replyWords } from '@/lib/services/reply-words'

export const GET = handle(replyWordsApi, ({ deps, actor, query }) => replyWords(deps, actor, query))
