import { readFileSync, statSync } from 'node:fs'

export type CarrierClock = { now(): number }

/**
 * Wall time plus the offset kept in a small file, `{ "offsetMilliseconds": n }`.
 * The file is read again whenever it changed; a missing or half-written one leaves the last offset standing.
 */
export function createClock(file: string): CarrierClock {
  let offset = 0
  let seen = ''
  function refresh(): void {
    if (file === '') return
    const stat = statSync(file, { throwIfNoEntry: false })
    const mark = stat ? `${stat.ino}:${stat.mtimeMs}:${stat.size}` : 'none'
    if (mark === seen) return
    if (!stat) {
      offset = 0
      seen = mark
      return
    }
    const read = readOffset(file)
    if (read === null) return
    offset = read
    seen = mark
  }
  return {
    now() {
      refresh()
      return Date.now() + offset
    },
  }
}

function readOffset(file: string): number | null {
  try {
    const parsed: unknown = JSON.parse(readFileSync(file, 'utf8'))
    const value = (parsed as { offsetMilliseconds?: unknown } | null)?.offsetMilliseconds
    return typeof value === 'number' && Number.isFinite(value) ? value : null
  } catch {
    return null
  }
}
