import { z } from 'zod'

/** A visit that is due, as a visitor reads it. */
export const dueVisitSchema = z.object({
  id: z.string(),
  /** The local day, as words. */
  day: z.string(),
  household: z.string(),
  area: z.string(),
  place: z.string(),
  language: z.string(),
  why: z.string(),
  /** Whether it is this visitor's; else it is still anybody's. */
  given: z.boolean(),
})
export type DueVisit = z.infer<typeof dueVisitSchema>
