import { z } from 'zod'

/** What the small or large drawing of a kit wants. */
export const columnSchema = z.object({
  stages: z.array(
    z.object({
      position: z.union([z.literal(1), z.literal(2), z.literal(3)]),
      left: z.number(),
      state: z.enum(['good', 'due', 'overdue', 'out']),
    }),
  ),
  level: z.number().nullable(),
  description: z.string(),
})

export type ColumnView = z.infer<typeof columnSchema>
