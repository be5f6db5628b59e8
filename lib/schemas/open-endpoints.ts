import { z } from 'zod'
import { inboundSchema, receiptSchema } from './carrier'
import { endpoint } from './endpoint'

/*
 * Routes that no session guards: they check a signature, lead to the sign-in, or tell nothing of anybody.
 */

const instant = z.iso.datetime().nullable()

export const healthSchema = z.object({
  ok: z.literal(true),
  database: z.enum(['pglite', 'postgres']),
  /** Jobs that wait or are under way, by queue. */
  jobs: z.record(z.string(), z.number()),
  carrier: z.object({ inDoubt: z.number(), lastSentAt: instant }),
  mail: z.enum(['set', 'not set']),
  lastPlanAt: instant,
  oldestUnsentMinutes: z.number().nullable(),
  practice: z.boolean(),
  now: instant,
})

const emptyAnswer = z.string().meta({ description: 'An empty <Response/>' })

export const openEndpoints = [
  endpoint({
    method: 'get',
    path: '/api/health',
    act: 'public',
    summary: 'How the desk is; 503 when the database does not answer',
    response: healthSchema,
  }),
  endpoint({
    method: 'post',
    path: '/api/sms/inbound',
    act: 'public',
    summary: 'A text came in; signed by the carrier, anything unsigned gets 403',
    body: inboundSchema,
    response: emptyAnswer,
  }),
  endpoint({
    method: 'post',
    path: '/api/sms/receipt',
    act: 'public',
    summary: 'What became of a text; signed by the carrier, the attempt in its signed address',
    query: z.object({ a: z.string().optional() }),
    body: receiptSchema,
    response: emptyAnswer,
  }),
  endpoint({
    method: 'get',
    path: '/api/openapi.json',
    act: 'public',
    summary: 'This document',
    response: z.looseObject({ openapi: z.string() }),
  }),
  endpoint({
    method: 'get',
    path: '/api/auth/{action}',
    act: 'public',
    summary: 'Session, token against forged forms, sign-in and sign-out pages',
    response: z.unknown(),
  }),
  endpoint({
    method: 'post',
    path: '/api/auth/{action}',
    act: 'public',
    summary: 'Sign in and out',
    response: z.unknown(),
  }),
]
