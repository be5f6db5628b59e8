import 'server-only'
import type { z } from 'zod'
import { currentActor } from './auth'
import { getDeps, type Deps } from './deps'
import { may, NotAllowedError, type Actor } from './domain/role'
import { faultWords, log } from './log'
import type { BodyOf, Endpoint, QueryOf, Refusal, ResponseOf } from './schemas/endpoint'

type Context<E extends Endpoint> = {
  deps: Deps
  actor: Actor
  params: Record<string, string>
  body: BodyOf<E>
  query: QueryOf<E>
}

type RouteContext = { params: Promise<Record<string, string>> }

const BODY_LIMIT_CHARACTERS = 100_000

function answer(status: number, body: unknown): Response {
  return Response.json(body, { status, headers: { 'cache-control': 'no-store' } })
}

/** A browser sends its origin with every change: one from elsewhere is not ours. */
function fromElsewhere(request: Request): boolean {
  const origin = request.headers.get('origin')
  const host = request.headers.get('host')
  if (origin === null) return request.headers.get('sec-fetch-site') === 'cross-site'
  return !URL.canParse(origin) || new URL(origin).host !== host
}

function problemsOf(error: z.ZodError) {
  return error.issues.map((issue) => ({ field: issue.path.join('.'), message: issue.message }))
}

async function readBody(request: Request): Promise<unknown> {
  const text = await request.text()
  if (text.length > BODY_LIMIT_CHARACTERS) return undefined
  try {
    return text === '' ? {} : (JSON.parse(text) as unknown)
  } catch {
    return undefined
  }
}

async function readInput(definition: Endpoint, request: Request) {
  const query = Object.fromEntries(new URL(request.url).searchParams)
  const parsedQuery = definition.query?.safeParse(query)
  if (parsedQuery?.error) return { problems: problemsOf(parsedQuery.error) }
  const parsedBody = definition.body?.safeParse(await readBody(request))
  if (parsedBody?.error) return { problems: problemsOf(parsedBody.error) }
  return { body: parsedBody?.data, query: parsedQuery?.data }
}

function isRefusal(result: unknown): result is Refusal {
  return typeof result === 'object' && result !== null && 'ok' in result && result.ok === false
}

async function respond<E extends Endpoint>(
  definition: E,
  run: (context: Context<E>) => Promise<ResponseOf<E> | Refusal>,
  { request, route }: { request: Request; route: RouteContext },
): Promise<Response> {
  if (definition.method !== 'get' && fromElsewhere(request)) {
    return answer(403, { reason: 'This request came from another site.' })
  }
  const actor = await currentActor()
  if (!actor) return answer(401, { reason: 'Please sign in.' })
  if (definition.act !== 'public' && !may(actor.role, definition.act)) {
    return answer(403, { reason: 'Your role may not do this.' })
  }
  const input = await readInput(definition, request)
  if ('problems' in input)
    return answer(422, { reason: 'Some fields need mending.', problems: input.problems })
  const result = await run({
    deps: await getDeps(),
    actor,
    params: await route.params,
    body: input.body as BodyOf<E>,
    query: input.query as QueryOf<E>,
  })
  if (isRefusal(result))
    return answer(result.reason === 'not found' ? 404 : 409, { reason: result.reason })
  return answer(200, result)
}

/** A route handler from an endpoint and what it does: session, role, origin, input and errors in one place. */
export function handle<E extends Endpoint>(
  definition: E,
  run: (context: Context<E>) => Promise<ResponseOf<E> | Refusal>,
) {
  return async (request: Request, route: RouteContext): Promise<Response> => {
    try {
      return await respond(definition, run, { request, route })
    } catch (error) {
      if (error instanceof NotAllowedError) return answer(403, { reason: error.message })
      log.error({ path: definition.path, cause: faultWords(error) }, 'a route failed')
      return answer(500, { reason: 'Something went wrong on our side. Nothing was changed.' })
    }
  }
}
