import { z } from 'zod'

/** What the coordinator can set; what is not set has these defaults. */
export const settingsSchema = z.object({
  /** The programme's name as the texts say it. */
  programme: z.string().min(1).max(40).default('Clear Water'),
  /** Price of one part of a text, in the programme's currency. */
  pricePerSegment: z.number().min(0).max(10).default(0.02),
  currency: z.string().min(1).max(8).default('EUR'),
  /** Texts the sender may hand over in a minute: one part a second is the carrier's common rate. */
  textsPerMinute: z.number().int().min(1).max(6000).default(60),
  litresPerPersonDay: z.number().min(3).max(20).default(5.3),
  flowCheckDays: z.number().int().min(14).max(365).default(60),
})

export type Settings = z.output<typeof settingsSchema>

/** The settings from rows of key and value; a value that no longer fits falls back to its default. */
export function readSettings(rows: readonly { key: string; value: unknown }[]): Settings {
  const settings = { ...settingsSchema.parse({}) }
  for (const [key, schema] of Object.entries(settingsSchema.shape)) {
    const row = rows.find((one) => one.key === key)
    const value = row && schema.safeParse(row.value)
    if (value?.success) Object.assign(settings, { [key]: value.data })
  }
  return settings
}
