import { z } from 'zod'
import { languageSchema } from './language'

export const slipSchema = z.object({
  /** Grows with time: pages are cut by it. */
  n: z.number(),
  textId: z.string(),
  direction: z.enum(['in', 'out']),
  body: z.string(),
  language: languageSchema,
  /** ISO, for the machine. */
  at: z.string(),
  /** The local day and hour as printed. */
  day: z.string(),
  time: z.string(),
  receipt: z.enum(['ring', 'half', 'full', 'broken']),
  receiptWords: z.string(),
  /** What it was read as, or the staff's language of the same wording. */
  under: z.string().nullable(),
})

export type SlipView = z.infer<typeof slipSchema>

export const slipPageSchema = z.object({
  /** Oldest first. */
  slips: z.array(slipSchema),
  /** Give it as `before` for the page before this one; null where there is none. */
  before: z.number().nullable(),
})

export type SlipPage = z.infer<typeof slipPageSchema>
