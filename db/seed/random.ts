/** Seeded randomness: the same seed makes the same world. */
export type Random = {
  /** From 0 up to 1. */
  next(): number
  /** A whole number from `low` to `high`, both included. */
  whole(low: number, high: number): number
  chance(share: number): boolean
  pick<T>(from: readonly T[]): T
}

/** Mulberry32: small, fast, good enough to spread invented lives; not for secrets. */
export function random(seed: number): Random {
  let state = seed >>> 0
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state)
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296
  }
  const whole = (low: number, high: number) => low + Math.floor(next() * (high - low + 1))
  return {
    next,
    whole,
    chance: (share) => next() < share,
    pick: (from) => {
      const one = from[whole(0, from.length - 1)]
      if (one === undefined) throw new Error('Nothing to pick from.')
      return one
    },
  }
}
