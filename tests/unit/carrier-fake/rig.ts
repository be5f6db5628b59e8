import { createServer, type IncomingHttpHeaders } from 'node:http'
import type { AddressInfo } from 'node:net'
import { readSettings, type Settings } from '@/tests/fakes/carrier/settings'
import { startCarrier, type RunningCarrier } from '@/tests/fakes/carrier/start'

export const accountSid = `AC${'a1'.repeat(16)}`
export const authToken = 'a-token-for-tests'
export const sender = '+15005550006'
export const phone = '+12125550123'
export const serviceSid = `MG${'b2'.repeat(16)}`

/** A clock that only moves when told to. Starts at 2026-03-02T06:00:00Z. */
export function handClock(at = Date.UTC(2026, 2, 2, 6)) {
  let now = at
  return {
    now: () => now,
    forward(milliseconds: number) {
      now += milliseconds
    },
  }
}

export type Heard = {
  path: string
  method: string
  headers: IncomingHttpHeaders
  rawHeaders: string[]
  parameters: Record<string, string>
  at: number
}

type DeskAnswer = { status?: number; type?: string; body?: string; hang?: boolean }

/** A desk that writes down what it is called with and answers as it is told. */
export async function startDesk(answer: (heard: Heard, count: number) => DeskAnswer = () => ({})) {
  const heard: Heard[] = []
  const server = createServer((request, response) => {
    let body = ''
    request.on('data', (chunk) => (body += chunk))
    request.on('end', () => {
      const call: Heard = {
        path: request.url ?? '',
        method: request.method ?? '',
        headers: request.headers,
        rawHeaders: request.rawHeaders.filter((_text, index) => index % 2 === 0),
        parameters: Object.fromEntries(new URLSearchParams(body)),
        at: Date.now(),
      }
      heard.push(call)
      const told = answer(call, heard.length)
      if (told.hang) return
      response.writeHead(told.status ?? 200, { 'Content-Type': told.type ?? 'text/xml' })
      response.end(told.body ?? '<Response/>')
    })
  })
  await new Promise<void>((resolve) => {
    server.listen(0, '127.0.0.1', () => resolve())
  })
  const origin = `http://127.0.0.1:${(server.address() as AddressInfo).port}`
  return {
    heard,
    origin,
    close: () =>
      new Promise<void>((resolve) => {
        server.close(() => resolve())
        server.closeAllConnections()
      }),
  }
}

export type Rig = Awaited<ReturnType<typeof startRig>>

/** A carrier on a free port with a hand clock: one segment a second, as a plain long number has. */
export async function startRig(changes: Partial<Settings> = {}) {
  const clock = handClock()
  const settings: Settings = {
    ...readSettings({}),
    port: 0,
    accountSid,
    authToken,
    senders: [sender],
    messagingServiceSid: serviceSid,
    segmentsPerSecond: 1,
    inboundUrl: 'http://127.0.0.1:9/nobody#rc=0',
    ...changes,
  }
  const running = await startCarrier(settings, clock)
  return { clock, running, ...calls(running), forward: forward(running, clock) }
}

function forward(running: RunningCarrier, clock: ReturnType<typeof handClock>) {
  return async (milliseconds: number) => {
    clock.forward(milliseconds)
    running.tick()
    await running.settled()
  }
}

export type Json = Record<string, unknown>
/** An answer about a message; what it says beyond its sid is looked at by the test. */
export type Named = Json & { sid: string }

function calls(running: RunningCarrier) {
  const authorization = `Basic ${Buffer.from(`${accountSid}:${authToken}`).toString('base64')}`
  const rest = async (method: string, path: string, form?: Record<string, string>) => {
    const response = await fetch(`${running.origin}/2010-04-01/Accounts/${accountSid}${path}`, {
      method,
      headers: { authorization },
      redirect: 'manual',
      ...(form ? { body: new URLSearchParams(form) } : {}),
    })
    const text = await response.text()
    return { response, body: (text.startsWith('{') ? JSON.parse(text) : {}) as Named }
  }
  const practice = async (method: string, path: string, value?: unknown) => {
    const response = await fetch(`${running.origin}/practice${path}`, {
      method,
      ...(value === undefined ? {} : { body: JSON.stringify(value) }),
    })
    const text = await response.text()
    return { response, body: (text === '' ? {} : JSON.parse(text)) as Named }
  }
  const send = async (form: Record<string, string> = {}) => {
    const sent = { To: phone, From: sender, Body: 'Wash the filter today.', ...form }
    return (await rest('POST', '/Messages.json', sent)).body
  }
  const fetchMessage = async (sid: string) => (await rest('GET', `/Messages/${sid}.json`)).body
  return { rest, practice, send, fetchMessage, close: () => running.close() }
}
