import { handle } from '@/lib/http'
import { changeSettingsApi, seeSettingsApi } from '@/lib/schemas/settings'
import { changeSettings, seeSettings } from '@/lib/services/change-settings'

export const GET = handle(seeSettingsApi, ({ deps, actor }) => seeSettings(deps, actor))

export const PUT = handle(changeSettingsApi, ({ deps, actor, body }) =>
  changeSettings(deps, actor, body),
)
