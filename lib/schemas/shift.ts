import { z } from 'zod'
import { columnSchema } from './column'
import { endpoint } from './endpoint'
import { languageSchema } from './language'

/** A few words of which the middle ones weigh more: `taken by` `M. Duarte`. */
const markSchema = z.object({ before: z.string(), strong: z.string(), after: z.string() })

export const shiftRowSchema = z.object({
  ticketId: z.string(),
  house: z.string(),
  area: z.string(),
  language: languageSchema,
  /** Why it stands where it stands. */
  sentence: z.string(),
  /** The reader's own. */
  sentenceLanguage: languageSchema,
  /** The last words received, as they came; null when none ever came. */
  words: z.string().nullable(),
  /** What is being done: where the walk stands, which advice went. */
  about: z.string().nullable(),
  waited: z.string(),
  since: z.string(),
  bead: z.enum(['ring', 'half', 'full', 'broken']),
  beadWords: z.string(),
  tone: z.enum(['water', 'clay']),
  /** A person is waited for: nobody has it and nothing goes by itself. */
  waits: z.boolean(),
  marks: z.array(markSchema),
  column: columnSchema,
})

export type ShiftRow = z.infer<typeof shiftRowSchema>

export const shiftBandSchema = z.object({
  name: z.enum(['Unwell', 'No safe water', 'Slow', 'Unread words', 'Silent']),
  note: z.string(),
  rows: z.array(shiftRowSchema),
})

export type ShiftBand = z.infer<typeof shiftBandSchema>

export const shiftSchema = z.object({
  /** `Tuesday, before noon`. */
  title: z.string(),
  bands: z.array(shiftBandSchema),
  waiting: z.number(),
  taken: z.number(),
  /** Since when the longest of those that nobody has; null when nobody waits. */
  longest: z.string().nullable(),
  today: z.object({ flowing: z.number(), parts: z.number(), visits: z.number() }),
  /** The worst that this person can serve, and in words which that is or why there is none. */
  next: z.object({ ticketId: z.string().nullable(), words: z.string() }),
  /** There are more than the page shows: the worst are on it. */
  cut: z.boolean(),
})

export type Shift = z.infer<typeof shiftSchema>

export const shiftApi = endpoint({
  method: 'get',
  path: '/api/shift',
  act: 'see the shift',
  summary: 'Open tickets in order of harm, at most 500, and what came of today',
  response: shiftSchema,
})

export const takeNextApi = endpoint({
  method: 'post',
  path: '/api/shift/take-next',
  act: 'work tickets',
  summary: 'Take the worst ticket that nobody has and whose language you speak',
  response: z.object({ ok: z.literal(true), ticketId: z.string(), version: z.number() }),
})

export const shiftEndpoints = [shiftApi, takeNextApi]
