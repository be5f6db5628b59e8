import { z } from 'zod'
import { endpoint } from './endpoint'
import { whatIfApi } from './what-if'

export const roundKinds = ['wash', 'change', 'flow check', 'welcome', 'nudge', 'other'] as const
export type RoundKind = (typeof roundKinds)[number]

const goingSchema = z.object({
  householdId: z.string(),
  house: z.string(),
  area: z.string(),
  /** The area's own clock. */
  hour: z.string(),
  /** What it speaks of, in words. */
  what: z.string(),
  /** queued = written and waiting, planned = will be written that day, if silent = only without an answer. */
  state: z.enum(['queued', 'planned', 'if silent']),
})

const roundDaySchema = z.object({
  on: z.string(),
  /** `Tue`, `3 Mar`, `Tuesday 3 March`. */
  weekday: z.string(),
  short: z.string(),
  long: z.string(),
  texts: z.number(),
  /** A text may speak of two things: these may add up to more than `texts`. */
  counts: z.record(z.enum(roundKinds), z.number()),
  /** No area's window opens that day. */
  off: z.boolean(),
  /** Why no texts go, and in which areas; no area is named when it holds in all. */
  daysOff: z.array(z.object({ why: z.string(), areas: z.array(z.string()) })),
  going: z.array(goingSchema),
  /** Texts of the day that are not listed. */
  more: z.number(),
})

export const roundsSchema = z.object({
  days: z.array(roundDaySchema),
  texts: z.number(),
  /** Texts that the sender can hand over in one day's window. */
  carriesADay: z.number(),
  textsPerMinute: z.number(),
  /** The plan stops at a limit: there is more than is counted. */
  cut: z.boolean(),
})

export type Rounds = z.infer<typeof roundsSchema>
export type RoundDay = z.infer<typeof roundDaySchema>
export type Going = z.infer<typeof goingSchema>

export const roundsApi = endpoint({
  method: 'get',
  path: '/api/rounds',
  act: 'see rounds',
  summary: 'What goes out in the next 14 days, day by day and household by household',
  response: roundsSchema,
})

export const roundsEndpoints = [roundsApi, whatIfApi]
