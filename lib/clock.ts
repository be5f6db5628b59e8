import { mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs'
import path from 'node:path'

/** The time, in epoch milliseconds. */
export type Clock = { now(): number }

/** A clock that can be moved forward, in practice only. */
export type PracticeClock = Clock & { advance(milliseconds: number): void }

export const systemClock: Clock = { now: () => Date.now() }

/** A clock that stands where it is put: for tests and for building the demo. */
export function standingClock(at: number): PracticeClock {
  let now = at
  return {
    now: () => now,
    advance: (milliseconds) => {
      now += forward(milliseconds)
    },
  }
}

function forward(milliseconds: number): number {
  if (!(milliseconds >= 0)) throw new Error('The practice clock only moves forward.')
  return milliseconds
}

/**
 * The practice clock: wall time plus an offset kept in a file, so that it outlives the process and the
 * practice carrier can follow it. It is only made where no real carrier can be reached (`lib/env`).
 */
export function practiceClock(file: string): PracticeClock {
  let offset = readOffset(file)
  return {
    now: () => Date.now() + offset,
    advance: (milliseconds) => {
      offset += forward(milliseconds)
      writeOffset(file, offset)
    },
  }
}

function readOffset(file: string): number {
  try {
    const kept = JSON.parse(readFileSync(file, 'utf8')) as { offsetMilliseconds?: unknown }
    return typeof kept.offsetMilliseconds === 'number' ? kept.offsetMilliseconds : 0
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') return 0
    throw new Error(`The practice clock file ${file} cannot be read.`, { cause: error })
  }
}

function writeOffset(file: string, offsetMilliseconds: number): void {
  mkdirSync(path.dirname(file), { recursive: true, mode: 0o700 })
  writeFileSync(`${file}.new`, JSON.stringify({ offsetMilliseconds }))
  renameSync(`${file}.new`, file)
}
