import { createHmac } from 'node:crypto'

export type SignatureAlgorithm = 'sha1' | 'sha256'

/**
 * The carrier's webhook signature: the address as called (without its fragment), then every parameter name with its
 * values, names in code-unit order, no delimiters, keyed hash, base64. Repeated values of a name are de-duplicated and
 * sorted. Own implementation on purpose, so that the desk's validation is not checked against itself.
 */
export function signWebhook(signed: {
  secret: string
  url: string
  parameters: Iterable<readonly [string, string]>
  algorithm?: SignatureAlgorithm
}): string {
  const values = new Map<string, Set<string>>()
  for (const [name, value] of signed.parameters) {
    const known = values.get(name)
    if (known) known.add(value)
    else values.set(name, new Set([value]))
  }
  let text = signed.url.split('#')[0] ?? ''
  for (const name of [...values.keys()].sort(byCodeUnit)) {
    for (const value of [...(values.get(name) ?? [])].sort(byCodeUnit)) text += name + value
  }
  return createHmac(signed.algorithm ?? 'sha1', signed.secret)
    .update(text, 'utf8')
    .digest('base64')
}

function byCodeUnit(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0
}
