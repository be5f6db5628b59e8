import { handle } from '@/lib/http'
import { reinstatePhoneApi } from '@/lib/schemas/household-entry'
import { reinstatePhone } from '@/lib/services/change-household'

export const POST = handle(reinstatePhoneApi, ({ deps, actor, params, body }) =>
  reinstatePhone(deps, actor, { ...body, phoneId: params.id ?? '' }),
)
