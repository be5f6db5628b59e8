/** A request as the routes see it, and what they answer. */
export type Asked = {
  method: string
  path: string
  query: URLSearchParams
  /** The body read as a form; empty for other content types. */
  form: URLSearchParams
  text: string
  headers: Record<string, string | string[] | undefined>
}

export type Answer = {
  status: number
  headers?: Record<string, string>
  body: string | Buffer
}

/** `hang` never answers, `reset` breaks the connection. */
export type Outcome = Answer | 'hang' | 'reset'

export function json(status: number, value: unknown, headers: Record<string, string> = {}): Answer {
  return {
    status,
    headers: { 'Content-Type': 'application/json; charset=utf-8', ...headers },
    body: JSON.stringify(value),
  }
}

export function html(body: string): Answer {
  return { status: 200, headers: { 'Content-Type': 'text/html; charset=utf-8' }, body }
}

export function empty(status: number, headers: Record<string, string> = {}): Answer {
  return { status, headers, body: '' }
}

export function parseJson(text: string): unknown {
  try {
    return JSON.parse(text)
  } catch {
    return null
  }
}
