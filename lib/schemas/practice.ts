import { z } from 'zod'
import { endpoint } from './endpoint'

export const practiceSchema = z.object({
  /** The practice time in each zone of the areas, the one with most households first. */
  clocks: z.array(z.object({ zone: z.string(), day: z.string(), hour: z.string() })),
  phonesUrl: z.string().nullable(),
})

export const movedSchema = z.object({
  practice: practiceSchema,
  moved: z.string(),
  prompts: z.number(),
  texts: z.number(),
  tickets: z.number(),
})

/** The clock never jumps further in one go; a longer wait is several. */
export const LONGEST_MOVE_HOURS = 92 * 24

const moveClockSchema = z.union([
  z.object({ hours: z.number().int().min(1).max(LONGEST_MOVE_HOURS) }),
  z.object({ toNext: z.literal(true) }),
])

export type Practice = z.infer<typeof practiceSchema>
export type Moved = z.infer<typeof movedSchema>
export type MoveClock = z.infer<typeof moveClockSchema>

export const practiceApi = endpoint({
  method: 'get',
  path: '/api/practice',
  act: 'move the practice clock',
  summary: 'The practice time; 404 where a real carrier could be reached',
  response: practiceSchema,
})

export const moveClockApi = endpoint({
  method: 'post',
  path: '/api/practice/move',
  act: 'move the practice clock',
  summary: 'Move the practice clock forward and do what falls due on the way',
  body: moveClockSchema,
  response: movedSchema,
})

export const practiceEndpoints = [practiceApi, moveClockApi]
