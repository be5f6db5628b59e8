export const restFaultKinds = [
  'too-many',
  'error-500-before',
  'error-500-after',
  'unavailable-503-before',
  'unavailable-503-after',
  'hang-before',
  'hang-after',
  'reset-before',
  'reset-after',
  'slow',
] as const

export const webhookFaultKinds = [
  'duplicate',
  'reorder',
  'drop',
  'delay',
  'wrong-signature',
  'shared-key',
  'extra-parameter',
  'lower-case-headers',
  'upper-case-headers',
] as const

export type RestFaultKind = (typeof restFaultKinds)[number]
export type WebhookFaultKind = (typeof webhookFaultKinds)[number]
export type FaultKind = RestFaultKind | WebhookFaultKind

export type RestCall = 'create' | 'list' | 'fetch' | 'update' | 'delete'
export type WebhookCall = 'inbound' | 'receipt'

/** Asked for by `POST /practice/faults`: the next `left` calls that fit go wrong in this way. */
export type Fault = {
  kind: FaultKind
  /** Which calls it is for; `any` for all of its side. */
  on: RestCall | WebhookCall | 'any'
  /** Only calls about this phone, when given. */
  phone: string | null
  left: number
  retryAfterSeconds: number
  delayMilliseconds: number
}

/** Not kept over a restart: a fault belongs to the test that asked for it. */
export type FaultList = Fault[]

type Called = { on: RestCall | WebhookCall; phone: string | null }

function fits(fault: Fault, called: Called): boolean {
  if (fault.left <= 0) return false
  if (fault.on !== 'any' && fault.on !== called.on) return false
  return fault.phone === null || fault.phone === called.phone
}

/** The first REST fault that fits, used up by one; null when the call may go right. */
export function takeRestFault(faults: FaultList, called: Called): Fault | null {
  const found = faults.find((fault) => isRestFault(fault) && fits(fault, called))
  if (found) use(faults, found)
  return found ?? null
}

/** Every webhook fault that fits, each used up by one: they can be combined. */
export function takeWebhookFaults(faults: FaultList, called: Called): Fault[] {
  const found = faults.filter((fault) => !isRestFault(fault) && fits(fault, called))
  for (const fault of found) use(faults, fault)
  return found
}

function use(faults: FaultList, fault: Fault): void {
  fault.left -= 1
  if (fault.left <= 0) faults.splice(faults.indexOf(fault), 1)
}

export function isRestFault(fault: { kind: FaultKind }): boolean {
  return restFaultKinds.some((kind) => kind === fault.kind)
}

const everyKind: readonly string[] = [...restFaultKinds, ...webhookFaultKinds]
const everyCall = ['create', 'list', 'fetch', 'update', 'delete', 'inbound', 'receipt', 'any']

/** Reads a fault from JSON, or says in words what is wrong with it. */
export function readFault(given: unknown): Fault | string {
  const value = (given ?? {}) as Record<string, unknown>
  const kind = typeof value.kind === 'string' ? value.kind : ''
  if (!everyKind.includes(kind)) return `kind must be one of ${everyKind.join(', ')}`
  const rest = isRestFault({ kind: kind as FaultKind })
  const on = value.on ?? (rest ? 'create' : 'any')
  if (typeof on !== 'string' || !everyCall.includes(on))
    return `on must be one of ${everyCall.join(', ')}`
  const next = value.next ?? 1
  if (typeof next !== 'number' || next < 1) return 'next must be a number from 1'
  return {
    kind: kind as FaultKind,
    on: on as Fault['on'],
    phone: typeof value.phone === 'string' ? value.phone : null,
    left: Math.trunc(next),
    retryAfterSeconds: Number(value.retryAfterSeconds ?? 1),
    delayMilliseconds: Number(value.delayMilliseconds ?? 1500),
  }
}
