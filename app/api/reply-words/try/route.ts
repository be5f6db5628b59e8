import { handle } from '@/lib/http'
import { tryReplyApi } from '@/lib/schemas/reply-words'
import { tryReply } from '@/lib/services/try-reply'

export const POST = handle(tryReplyApi, ({ deps, actor, body }) => tryReply(deps, actor, body))
