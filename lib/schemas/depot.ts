import { z } from 'zod'
import { endpoint } from './endpoint'

const quantitySchema = z
  .number({ error: 'Write a whole number.' })
  .int('Write a whole number.')
  .min(0, 'Not under 0.')
  .max(100_000, 'At most 100 000.')

/** A null leaves that part as it was. */
const shelfInputSchema = z.object({
  partId: z.string().min(1),
  quantity: quantitySchema.nullable(),
})

const stockSchema = z
  .array(shelfInputSchema)
  .max(50)
  .refine(
    (stock) => new Set(stock.map(({ partId }) => partId)).size === stock.length,
    'One number a part.',
  )

export const depotInputSchema = z.object({
  name: z
    .string({ error: 'Write a name.' })
    .trim()
    .min(1, 'Write a name.')
    .max(60, 'At most 60 characters.'),
  place: z.string().trim().max(200, 'At most 200 characters.').default(''),
  stock: stockSchema.default([]),
})

export type DepotInput = z.output<typeof depotInputSchema>

export const stockInputSchema = z.object({
  /** `received` adds to what is there; `counted` is what is there. */
  why: z.enum(['received', 'counted'], { error: 'Say whether parts came in or were counted.' }),
  stock: stockSchema.refine(
    (stock) => stock.some(({ quantity }) => quantity !== null),
    'Write a number for at least one part.',
  ),
})

export type StockInput = z.output<typeof stockInputSchema>

export const shelfSchema = z.object({
  partId: z.string(),
  name: z.string(),
  inHand: z.number(),
  promised: z.number(),
  /** In hand less promised; below 0 where more was promised than is there. */
  available: z.number(),
})

export const depotSchema = z.object({
  id: z.string(),
  name: z.string(),
  place: z.string(),
  areas: z.array(z.string()),
  shelves: z.array(shelfSchema),
})

export type Depot = z.infer<typeof depotSchema>

export const depotListSchema = z.object({
  depots: z.array(depotSchema),
  parts: z.array(z.object({ id: z.string(), name: z.string() })),
})
export type DepotList = z.infer<typeof depotListSchema>

const keptSchema = z.object({ ok: z.literal(true), depotId: z.string() })

export const listDepotsApi = endpoint({
  method: 'get',
  path: '/api/depots',
  act: 'keep stock',
  summary: 'Every depot with what it has in hand, has promised and can promise',
  response: depotListSchema,
})

export const enterDepotApi = endpoint({
  method: 'post',
  path: '/api/depots',
  act: 'keep stock',
  summary: 'Enter a depot with its stock',
  body: depotInputSchema,
  response: keptSchema,
})

export const countStockApi = endpoint({
  method: 'post',
  path: '/api/depots/{id}/stock',
  act: 'keep stock',
  summary: 'Write down what came in, or what was counted on the shelf',
  body: stockInputSchema,
  response: keptSchema,
})

export const depotEndpoints = [listDepotsApi, enterDepotApi, countStockApi]
