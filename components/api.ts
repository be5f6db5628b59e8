type Problem = { field: string; message: string }

/** A refusal of the API in words for staff, with what is wrong field by field when it was the input. */
export class ApiError extends Error {
  readonly status: number
  readonly problems: readonly Problem[]

  constructor(status: number, reason: string, problems: readonly Problem[] = []) {
    super(reason)
    this.name = 'ApiError'
    this.status = status
    this.problems = problems
  }

  /** The message for one field, as `TextField` wants it. */
  field(name: string): string | undefined {
    return this.problems.find((problem) => problem.field === name)?.message
  }
}

const NO_ANSWER = 'The desk did not answer. Check the connection and try again.'

async function call<T>(path: string, options: RequestInit): Promise<T> {
  const response = await fetch(path, options).catch(() => {
    throw new ApiError(0, NO_ANSWER)
  })
  const body = (await response.json().catch(() => null)) as unknown
  if (response.ok && body !== null) return body as T
  const refusal = (body ?? {}) as { reason?: string; problems?: Problem[] }
  throw new ApiError(response.status, refusal.reason ?? NO_ANSWER, refusal.problems)
}

/** Reads from the API. `T` is the view type of the endpoint (`lib/schemas`). Throws `ApiError`. */
export function getJson<T>(path: string): Promise<T> {
  return call<T>(path, { headers: { accept: 'application/json' } })
}

/** Sends a change to the API. Throws `ApiError`. */
export function sendJson<T>(
  method: 'post' | 'put' | 'delete',
  path: string,
  body: unknown = {},
): Promise<T> {
  return call<T>(path, {
    method: method.toUpperCase(),
    headers: { 'content-type': 'application/json', accept: 'application/json' },
    body: JSON.stringify(body),
  })
}
