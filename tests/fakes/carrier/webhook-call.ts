import { request as requestHttp, type IncomingMessage } from 'node:http'
import { isLoopback } from './loopback'

export type CallOutcome =
  | { kind: 'answered'; status: number; contentType: string; body: string }
  | { kind: 'ct' | 'rt'; detail: string }

export type WebhookCallInput = {
  url: string
  method: 'POST' | 'GET'
  headers: Record<string, string>
  body: string
  connectMilliseconds: number
  readMilliseconds: number
}

const longestAnswerBytes = 64 * 1024

/** One attempt at a webhook. The fake only ever calls this machine: any other host counts as unreachable. */
export function callWebhook(input: WebhookCallInput): Promise<CallOutcome> {
  const target = URL.canParse(input.url) ? new URL(input.url) : null
  if (!target || target.protocol !== 'http:' || !isLoopback(target.hostname)) {
    return Promise.resolve({ kind: 'ct', detail: `not an http address on loopback: ${input.url}` })
  }
  return new Promise((resolve) => {
    let connected = false
    let settled = false
    const request = requestHttp(input.url, { method: input.method, headers: input.headers })
    const settle = (outcome: CallOutcome) => {
      if (settled) return
      settled = true
      clearTimeout(connectTimer)
      clearTimeout(readTimer)
      resolve(outcome)
      request.destroy()
    }
    const connectTimer = setTimeout(() => {
      if (!connected) settle({ kind: 'ct', detail: 'no connection in time' })
    }, input.connectMilliseconds)
    let readTimer = setTimeout(() => {}, 0)
    request.on('socket', (socket) => {
      const onConnect = () => {
        connected = true
        clearTimeout(connectTimer)
        readTimer = setTimeout(
          () => settle({ kind: 'rt', detail: 'no answer in time' }),
          input.readMilliseconds,
        )
      }
      if (socket.connecting) socket.once('connect', onConnect)
      else onConnect()
    })
    request.on('response', (response) => {
      readAnswer(response).then(settle, () => settle({ kind: 'rt', detail: 'answer broke off' }))
    })
    request.on('error', (error) => settle({ kind: connected ? 'rt' : 'ct', detail: error.message }))
    request.end(input.body)
  })
}

async function readAnswer(response: IncomingMessage): Promise<CallOutcome> {
  const chunks: Buffer[] = []
  let size = 0
  for await (const chunk of response as AsyncIterable<Buffer>) {
    size += chunk.length
    if (size > longestAnswerBytes) break
    chunks.push(chunk)
  }
  return {
    kind: 'answered',
    status: response.statusCode ?? 0,
    contentType: response.headers['content-type'] ?? '',
    body: Buffer.concat(chunks).toString('utf8'),
  }
}
