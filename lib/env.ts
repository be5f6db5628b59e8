import {
  readEnvironment,
  type Environment,
  type EnvironmentReading,
} from '@/lib/schemas/environment'

let known: Environment | undefined

/** The settings of this process, or what is wrong with them. The only reader of the process environment. */
export function checkEnvironment(): EnvironmentReading {
  return readEnvironment(process.env)
}

/**
 * The settings of this process. The start-up check has refused wrong ones already; a process that skipped it
 * (a command-line entry, a script) gets the same lines as an error.
 */
export function env(): Environment {
  if (known) return known
  const reading = checkEnvironment()
  if (!reading.ok) throw new Error(`The settings are wrong.\n${reading.problems.join('\n')}`)
  known = reading.env
  return known
}

/** True while `next build` collects pages: nothing may open the database then. */
export function isBuilding(): boolean {
  return process.env.NEXT_PHASE === 'phase-production-build'
}

export function isDevelopment(): boolean {
  return process.env.NODE_ENV === 'development'
}
