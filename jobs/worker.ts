import { getDeps } from '@/lib/deps'
import { env } from '@/lib/env'
import { faultWords, log } from '@/lib/log'
import { runJobs } from './run'

/** A process that only works jobs, beside any number of web processes. Needs a database that many may open. */
async function main(): Promise<void> {
  if (!env().databaseUrl) {
    throw new Error(
      'A separate worker needs DATABASE_URL: the embedded database has one process only.',
    )
  }
  const deps = await getDeps()
  await runJobs(deps)
  log.info({}, 'working jobs')
  const stop = () => {
    deps.close().then(
      () => process.exit(0),
      () => process.exit(1),
    )
  }
  process.once('SIGTERM', stop)
  process.once('SIGINT', stop)
}

main().catch((error: unknown) => {
  log.error({ cause: faultWords(error) }, 'the worker could not start')
  process.exit(1)
})
