import { getDeps } from '@/lib/deps'
import { checkEnvironment, env } from '@/lib/env'
import { faultWords, log } from '@/lib/log'
import { prepareDesk } from '@/lib/services/prepare-desk'
import { runJobs } from './run'

function stopWith(lines: readonly string[]): never {
  for (const line of lines) process.stderr.write(`${line}\n`)
  process.exit(1)
}

/**
 * Checks the settings, opens everything and works the jobs, unless they run elsewhere. On a signal the
 * running jobs end first, then the database is closed.
 */
export async function startDesk(): Promise<void> {
  const settings = checkEnvironment()
  if (!settings.ok) stopWith(settings.problems)
  try {
    const deps = await getDeps()
    await prepareDesk(deps)
    if (env().jobs) await runJobs(deps)
    const stop = () => {
      deps.close().then(
        () => process.exit(0),
        (error: unknown) => stopWith([`The desk did not close cleanly: ${faultWords(error)}`]),
      )
    }
    process.once('SIGTERM', stop)
    process.once('SIGINT', stop)
    log.info({ database: deps.store.kind, jobs: env().jobs }, 'the desk is open')
  } catch (error) {
    stopWith([`The desk could not open: ${faultWords(error)}`])
  }
}
