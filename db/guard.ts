import { AsyncLocalStorage } from 'node:async_hooks'

const inside = new AsyncLocalStorage<true>()

/** Thrown where code inside a transaction reaches past its own handle. */
export class OutsideTransactionError extends Error {
  constructor() {
    super(
      'Inside a transaction only its own handle may be used: on PGlite anything else waits for ever.',
    )
    this.name = 'OutsideTransactionError'
  }
}

/** Runs `work` as the inside of a transaction; everything it awaits is inside too. */
export function insideTransaction<T>(work: () => Promise<T>): Promise<T> {
  // A query starts when it is awaited: one that `work` only returns is awaited here, still inside.
  return inside.run(true, async () => await work())
}

/** Throws when called from inside a transaction. */
export function assertOutside(): void {
  if (inside.getStore()) throw new OutsideTransactionError()
}

/** The client with `methods` refused inside a transaction, so that a wait for ever becomes an error. */
export function guarded<T extends object>(client: T, methods: readonly string[]): T {
  return new Proxy(client, {
    get(target, name) {
      const value: unknown = Reflect.get(target, name, target)
      if (typeof value !== 'function') return value
      const bound = value.bind(target) as (...input: unknown[]) => unknown
      if (!methods.includes(String(name))) return bound
      return (...input: unknown[]) => {
        assertOutside()
        return bound(...input)
      }
    },
  })
}
