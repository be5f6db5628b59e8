import type { IncomingMessage, RequestListener, ServerResponse } from 'node:http'
import type { Asked, Outcome } from './exchange'

const longestBodyBytes = 12 * 1024 * 1024

/** Turns a route function into a node request listener. */
export function serve(answer: (asked: Asked) => Outcome | Promise<Outcome>): RequestListener {
  return (request, response) => {
    handle(request, response, answer).catch((error: unknown) => {
      console.error(error)
      if (!response.headersSent) response.writeHead(500)
      response.end()
    })
  }
}

async function handle(
  request: IncomingMessage,
  response: ServerResponse,
  answer: (asked: Asked) => Outcome | Promise<Outcome>,
): Promise<void> {
  const text = await readBody(request)
  if (text === null) {
    response.writeHead(413).end()
    return
  }
  const url = new URL(request.url ?? '/', 'http://127.0.0.1')
  const isForm = request.headers['content-type']?.startsWith('application/x-www-form-urlencoded')
  const outcome = await answer({
    method: request.method ?? 'GET',
    path: decodePath(url.pathname),
    query: url.searchParams,
    form: new URLSearchParams(isForm ? text : ''),
    text,
    headers: request.headers,
  })
  if (outcome === 'hang') return
  if (outcome === 'reset') {
    request.socket.destroy()
    return
  }
  response.writeHead(outcome.status, outcome.headers)
  response.end(request.method === 'HEAD' ? undefined : outcome.body)
}

function decodePath(path: string): string {
  try {
    return decodeURIComponent(path)
  } catch {
    return path
  }
}

async function readBody(request: IncomingMessage): Promise<string | null> {
  const chunks: Buffer[] = []
  let size = 0
  for await (const chunk of request as AsyncIterable<Buffer>) {
    size += chunk.length
    if (size > longestBodyBytes) return null
    chunks.push(chunk)
  }
  return Buffer.concat(chunks).toString('utf8')
}
