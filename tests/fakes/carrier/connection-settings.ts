/** How a webhook is to be fetched, as its address says in the fragment (`#rc=5&rp=all`). */
export type ConnectionSettings = {
  /** Address without the fragment: what is called, and what is signed. */
  url: string
  connectMilliseconds: number
  readMilliseconds: number
  totalMilliseconds: number
  retries: number
  retryOn: readonly RetryReason[]
  /** The retry policy could not be read (the carrier's 11243). */
  unreadable: boolean
}

export type RetryReason = '4xx' | '5xx' | 'ct' | 'rt'

const everyReason: readonly RetryReason[] = ['4xx', '5xx', 'ct', 'rt']

/** Nothing more is tried 15 seconds after the first attempt began. */
export const ceilingMilliseconds = 15_000

export function readConnectionSettings(address: string): ConnectionSettings {
  const [url = '', fragment = ''] = address.split('#')
  const given = new URLSearchParams(fragment)
  const number = (name: string, range: { low: number; high: number; otherwise: number }) => {
    const text = given.get(name)
    const value = Number(text)
    const inside = text !== null && value >= range.low && value <= range.high
    return inside ? value : range.otherwise
  }
  const policy = readPolicy(given.get('rp') ?? 'ct')
  return {
    url,
    connectMilliseconds: number('ct', { low: 100, high: 10_000, otherwise: 5_000 }),
    readMilliseconds: number('rt', { low: 100, high: 15_000, otherwise: ceilingMilliseconds }),
    totalMilliseconds: number('tt', { low: 100, high: 15_000, otherwise: ceilingMilliseconds }),
    retries: Math.trunc(number('rc', { low: 0, high: 5, otherwise: 1 })),
    retryOn: policy ?? ['ct'],
    unreadable: policy === null,
  }
}

function readPolicy(text: string): readonly RetryReason[] | null {
  const parts = text.split(',')
  if (parts.includes('all')) return everyReason
  const known = everyReason.filter((reason) => parts.includes(reason))
  return known.length === parts.length ? known : null
}
