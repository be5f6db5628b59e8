import type { z } from 'zod'
import type { Act } from '@/lib/domain/role'

/** One route of the API: its address, who may call it, what it takes and what it answers. */
export type Endpoint = {
  method: 'get' | 'post' | 'put' | 'delete'
  /** As OpenAPI writes it: `/api/tickets/{id}/take`. */
  path: string
  /** `public` routes check by other means (a signature) or give nothing away. */
  act: Act | 'public'
  summary: string
  query?: z.ZodType
  body?: z.ZodType
  response: z.ZodType
}

/** Gives an endpoint its exact type, so that a handler's input follows from it. */
export function endpoint<const E extends Endpoint>(definition: E): E {
  return definition
}

export type BodyOf<E extends Endpoint> = E['body'] extends z.ZodType
  ? z.output<E['body']>
  : undefined
export type QueryOf<E extends Endpoint> = E['query'] extends z.ZodType
  ? z.output<E['query']>
  : undefined
export type ResponseOf<E extends Endpoint> = z.input<E['response']>

/** A refusal the caller can act on: the state of things does not allow what was asked. */
export type Refusal = { ok: false; reason: string }
