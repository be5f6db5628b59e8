import { z } from 'zod'

/**
 * The work the desk does by itself. Options speak the terms of a common job queue (`attempts`, `backoff`,
 * `repeat`), so that the handlers would not change under another one. What is due stands in our own rows
 * and is read by our own clock: `repeat` only wakes a sweep over them.
 */
type QueueOptions = {
  payload: z.ZodType
  attempts: number
  /** First wait before another attempt; each later one doubles. */
  backoffSeconds: number
  /** A handler that takes longer is taken for dead and its job given to another. */
  expireSeconds: number
  batch: number
  repeat?: string
}

const textPayload = z.object({ textId: z.string() })
const nothing = z.object({})
const sweep = { payload: nothing, attempts: 1, backoffSeconds: 1, expireSeconds: 600, batch: 1 }

export const queues = {
  'plan-prompts': { ...sweep, repeat: '*/10 * * * *' },
  'wake-texts': { ...sweep, repeat: '* * * * *' },
  'follow-silence': { ...sweep, repeat: '*/10 * * * *' },
  'reconcile-attempts': { ...sweep, repeat: '* * * * *' },
  'keep-house': { ...sweep, repeat: '17 * * * *' },
  'send-text': {
    payload: textPayload,
    attempts: 3,
    backoffSeconds: 5,
    expireSeconds: 120,
    batch: 10,
  },
  'receive-text': {
    payload: textPayload,
    attempts: 5,
    backoffSeconds: 2,
    expireSeconds: 60,
    batch: 10,
  },
  'receive-receipt': {
    payload: z.object({ receiptN: z.number() }),
    attempts: 5,
    backoffSeconds: 2,
    expireSeconds: 60,
    batch: 20,
  },
  'tell-coordinator': {
    payload: z.object({ subject: z.string(), body: z.string() }),
    attempts: 5,
    backoffSeconds: 30,
    expireSeconds: 60,
    batch: 5,
  },
} as const satisfies Record<string, QueueOptions>

export type QueueName = keyof typeof queues
export type Payload<N extends QueueName> = z.infer<(typeof queues)[N]['payload']>
