import { randomUUID } from 'node:crypto'
import type { Carrier } from './carrier'
import { readConnectionSettings, type ConnectionSettings } from './connection-settings'
import { logProblem } from './debugger-log'
import { takeWebhookFaults, type Fault, type WebhookCall } from './faults'
import { callWebhook, type CallOutcome } from './webhook-call'
import { webhookHeaders } from './webhook-headers'

export type Webhook = {
  on: WebhookCall
  address: string
  method?: 'POST' | 'GET'
  parameters: [string, string][]
  /** The phone it is about, for faults asked for one phone. */
  phone: string
  sid: string
}

/** Pause before each retry, doubled every time; the carrier does not publish its own. */
const firstPauseMilliseconds = 100

/** Calls a webhook as its address asks, with every fault that was ordered for it; null when it was dropped. */
export function deliverWebhook(carrier: Carrier, webhook: Webhook): Promise<CallOutcome | null> {
  const faults = takeWebhookFaults(carrier.faults, { on: webhook.on, phone: webhook.phone })
  const delivery = deliver(carrier, webhook, faults)
  carrier.underWay.add(delivery)
  void delivery.finally(() => carrier.underWay.delete(delivery))
  return delivery
}

async function deliver(
  carrier: Carrier,
  webhook: Webhook,
  faults: Fault[],
): Promise<CallOutcome | null> {
  const found = (kind: Fault['kind']) => faults.find((fault) => fault.kind === kind)
  if (found('drop')) return null
  // Held back long enough for the next receipt of the same message to overtake it.
  const wait = found('delay') ?? found('reorder')
  if (wait) await pause(wait.delayMilliseconds)
  const connection = readConnectionSettings(webhook.address)
  if (connection.unreadable) {
    logProblem(carrier, { code: 11243, sid: webhook.sid, detail: webhook.address })
  }
  const token = randomUUID()
  const outcome = await attempt(carrier, { webhook, faults, connection, token })
  if (found('duplicate')) await attempt(carrier, { webhook, faults, connection, token })
  if (!succeeded(outcome)) {
    logProblem(carrier, {
      code: 11200,
      sid: webhook.sid,
      detail: `${connection.url}: ${describe(outcome)}`,
    })
  }
  return outcome
}

type Attempted = {
  webhook: Webhook
  faults: Fault[]
  connection: ConnectionSettings
  /** The same over all retries of one webhook. */
  token: string
}

async function attempt(carrier: Carrier, attempted: Attempted): Promise<CallOutcome> {
  const { webhook, faults, connection, token } = attempted
  const method = webhook.method ?? 'POST'
  const parameters = [...webhook.parameters]
  if (faults.some((fault) => fault.kind === 'extra-parameter')) {
    parameters.push(['PracticeExtra', 'a parameter nobody announced'])
  }
  const body = new URLSearchParams(parameters).toString()
  const separator = connection.url.includes('?') ? '&' : '?'
  const url = method === 'GET' ? `${connection.url}${separator}${body}` : connection.url
  const signed = { url, parameters: method === 'GET' ? [] : parameters }
  const headers = webhookHeaders(carrier.settings, { signed, faults, token })
  const startedAt = Date.now()
  let pauseMilliseconds = firstPauseMilliseconds
  for (let tries = 0; ; tries++) {
    const left = connection.totalMilliseconds - (Date.now() - startedAt)
    const outcome = await callWebhook({
      url,
      method,
      headers,
      body: method === 'GET' ? '' : body,
      connectMilliseconds: Math.min(connection.connectMilliseconds, left),
      readMilliseconds: Math.min(connection.readMilliseconds, left),
    })
    const after = Date.now() - startedAt + pauseMilliseconds
    const over = tries >= connection.retries || after >= connection.totalMilliseconds
    if (succeeded(outcome) || over || !wantsRetry(connection, outcome)) return outcome
    await pause(pauseMilliseconds)
    pauseMilliseconds *= 2
  }
}

function wantsRetry(connection: ConnectionSettings, outcome: CallOutcome): boolean {
  if (outcome.kind !== 'answered') return connection.retryOn.includes(outcome.kind)
  if (outcome.status >= 500) return connection.retryOn.includes('5xx')
  return outcome.status >= 400 && connection.retryOn.includes('4xx')
}

function succeeded(outcome: CallOutcome): boolean {
  return outcome.kind === 'answered' && outcome.status >= 200 && outcome.status < 300
}

function describe(outcome: CallOutcome): string {
  return outcome.kind === 'answered' ? `answered ${outcome.status}` : outcome.detail
}

function pause(milliseconds: number): Promise<void> {
  return new Promise((resolve) => {
    setTimeout(resolve, milliseconds)
  })
}

/** Resolves when no webhook is under way any more. */
export async function webhooksSettled(carrier: Carrier): Promise<void> {
  while (carrier.underWay.size > 0) await Promise.allSettled(carrier.underWay)
}
