import { z } from 'zod'
import { endpoint } from './endpoint'

/** Weeks that can be looked ahead. */
export const weeksAhead = [4, 13, 26, 52] as const

/** A whole number; left out it is as it stands. */
function whole(
  least: number,
  most: number,
  words: { missing: string; least: string; most: string },
) {
  return z.coerce
    .number({ error: words.missing })
    .int(words.missing)
    .min(least, words.least)
    .max(most, words.most)
    .optional()
}

const washDays = whole(2, 365, {
  missing: 'Write whole days.',
  least: 'At least 2 days: washing oftener wears the fibre and the family.',
  most: 'At most 365 days.',
})

const changeMonths = whole(1, 60, {
  missing: 'Write whole months.',
  least: 'At least 1 month.',
  most: 'At most 60 months.',
})

const fields = {
  washClear: washDays,
  washCloudy: washDays,
  washVeryCloudy: washDays,
  /** Share of the days between washes that is left in a wet month, in per cent. */
  wetPercent: whole(20, 100, {
    missing: 'Write whole per cent.',
    least: 'At least 20 %.',
    most: 'At most 100 %: a wet month asks for no fewer washes.',
  }),
  change1: changeMonths,
  change2: changeMonths,
  change3: changeMonths,
  flowCheckDays: whole(14, 365, {
    missing: 'Write whole days.',
    least: 'At least 14 days.',
    most: 'At most 365 days.',
  }),
}

export const whatIfQuerySchema = z.object({
  weeks: z.enum(['4', '13', '26', '52'], { error: 'Choose 4, 13, 26 or 52 weeks.' }).default('13'),
  ...fields,
})

export type WhatIfQuery = z.output<typeof whatIfQuerySchema>

const figuresSchema = z.object({
  texts: z.number(),
  washes: z.number(),
  /** Changes of cloth, carbon and fibre: one part each. */
  changes: z.array(z.number()).length(3),
  flowChecks: z.number(),
  cost: z.number(),
  busiest: z.object({ day: z.string(), texts: z.number() }).nullable(),
})

export type WhatIfFigures = z.infer<typeof figuresSchema>

/** Parts are what is changed, all stages together. */
const weekSchema = z.object({ texts: z.number(), parts: z.number() })

export const whatIfSchema = z.object({
  weeks: z.number(),
  /** First and last day, as printed. */
  from: z.string(),
  until: z.string(),
  kits: z.number(),
  /** Of these, kits of households that no text reaches. */
  unreached: z.number(),
  /** There are more kits than are counted. */
  cut: z.boolean(),
  /** What is other than it stands, in words. */
  changed: z.array(z.string()),
  today: figuresSchema,
  other: figuresSchema,
  byWeek: z.array(z.object({ from: z.string(), today: weekSchema, other: weekSchema })),
  carriesADay: z.number(),
  currency: z.string(),
  pricePerSegment: z.number(),
  /** Segments that a text takes on the average: a wash, a change, a flow check. */
  segmentsOfText: z.object({ wash: z.number(), change: z.number(), flowCheck: z.number() }),
})

export type WhatIfAnswer = z.infer<typeof whatIfSchema>

export const whatIfApi = endpoint({
  method: 'get',
  path: '/api/rounds/what-if',
  act: 'see rounds',
  summary:
    'What other cycles would bring in the weeks ahead, beside those that stand; keeps nothing',
  query: whatIfQuerySchema,
  response: whatIfSchema,
})
