import { z } from 'zod'
import {
  grouped,
  percentOf,
  settingInfos,
  settingPaths,
  type Grouped,
  type SettingInfo,
} from '@/lib/domain/setting-catalogue'
import {
  contradictions,
  defaultSettings,
  withValue,
  type SettingPath,
  type Settings,
  type SettingValue,
} from '@/lib/domain/settings'
import { endpoint } from './endpoint'

function numberSchema(least: number, most: number, unit: string) {
  return z
    .number({ error: 'Write a number.' })
    .min(least, `At least ${unit === '%' ? percentOf(least) : least} ${unit}.`)
    .max(most, `At most ${unit === '%' ? percentOf(most) : most} ${unit}.`)
}

function valueSchema(info: SettingInfo): z.ZodType<SettingValue> {
  switch (info.kind) {
    case 'switch':
      return z.boolean()
    case 'text':
      return z
        .string({ error: 'Write something.' })
        .trim()
        .min(1, 'Write something.')
        .max(info.longest, `At most ${info.longest} characters.`)
    case 'share':
      return numberSchema(info.least, info.most, '%')
    case 'number': {
      const number = numberSchema(info.least, info.most, info.unit)
      return info.whole ? number.int('Write a whole number.') : number
    }
  }
}

/** Built once: the settings are read for every text that is worded and every answer. */
const valueSchemas = Object.fromEntries(
  settingPaths.map((path) => [path, valueSchema(settingInfos[path])]),
) as Record<SettingPath, z.ZodType<SettingValue>>

function objectOf(fields: Grouped<z.ZodType>): z.ZodType {
  const shape = Object.entries(fields).map(([key, field]) => [
    key,
    field instanceof z.ZodType ? field : objectOf(field),
  ])
  return z.object(Object.fromEntries(shape) as Record<string, z.ZodType>)
}

/** One object in the groups of the settings, each field within the bounds of the catalogue. */
const catalogueSchema = objectOf(grouped((path) => valueSchemas[path])) as z.ZodType<Settings>

const settingsSchema = catalogueSchema.superRefine((settings, context) => {
  for (const { path, message } of contradictions(settings)) {
    context.addIssue({ code: 'custom', path: path.split('.'), message })
  }
})

/** The settings from rows of key and value; a value that no longer fits falls back to its default. */
export function readSettings(rows: readonly { key: string; value: unknown }[]): Settings {
  const values = new Map(rows.map(({ key, value }) => [key, value]))
  return settingPaths.reduce((settings: Settings, path: SettingPath) => {
    const value = valueSchemas[path].safeParse(values.get(path))
    return value.success ? withValue(settings, path, value.data) : settings
  }, defaultSettings)
}

export const settingsInputSchema = z.object({
  /** Which state of the settings the person saw: a change of an older one is refused. */
  version: z.number().int().min(0),
  settings: settingsSchema,
})

export type SettingsInput = z.output<typeof settingsInputSchema>

const startingOddsSchema = z.array(
  z.object({
    areaId: z.string(),
    area: z.string(),
    season: z.enum(['wet', 'dry']),
    trouble: z.enum(['slow', 'no flow']),
    /** Closed in a year with a cause that is a suspect. */
    tickets: z.number(),
    /** The cause that most of them had. */
    likely: z.object({ words: z.string(), tickets: z.number() }),
    /** The likeliest suspects at the start, 0 to 1, with these tickets counted and without. */
    odds: z.array(z.object({ words: z.string(), used: z.number(), catalogue: z.number() })),
  }),
)

export type StartingOdds = z.infer<typeof startingOddsSchema>

const settingsViewSchema = z.object({
  version: z.number(),
  settings: settingsSchema,
  startingOdds: startingOddsSchema,
})

export type SettingsView = z.infer<typeof settingsViewSchema>

const keptSchema = z.object({ ok: z.literal(true), version: z.number(), changed: z.number() })

export type KeptSettings = z.infer<typeof keptSchema>

export const seeSettingsApi = endpoint({
  method: 'get',
  path: '/api/settings',
  act: 'change settings',
  summary: 'What the coordinator has set, and the defaults of all that nobody has',
  response: settingsViewSchema,
})

export const changeSettingsApi = endpoint({
  method: 'put',
  path: '/api/settings',
  act: 'change settings',
  summary: 'Change the settings; each change is audited with its old and new value',
  body: settingsInputSchema,
  response: keptSchema,
})

export const settingsEndpoints = [seeSettingsApi, changeSettingsApi]
