import { handle } from '@/lib/http'
import { practiceApi } from '@/lib/schemas/practice'
import { practiceDesk } from '@/lib/services/practice'

export const GET = handle(practiceApi, ({ deps, actor }) => practiceDesk(deps, actor))
