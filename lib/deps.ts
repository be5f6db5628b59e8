import path from 'node:path'
import { openPglite, openPostgres, type Store } from '@/db/client'
import { lockDataFolder } from '@/db/lock'
import { startQueue, type Queue } from '@/jobs/boss'
import { practiceClock, systemClock, type Clock, type PracticeClock } from './clock'
import { env, isBuilding } from './env'
import { hostedCarrier, type Carrier } from './gateways/carrier'
import { noMail, smtpMail, type Mail } from './gateways/mail'
import { log } from './log'
import type { Environment } from './schemas/environment'

/** What a use case needs from outside, made once a process. */
export type Deps = {
  store: Store
  queue: Queue
  carrier: Carrier
  mail: Mail
  /** Whether letters really leave. */
  mailSet: boolean
  clock: Clock
  /** Null where a real carrier can be reached. */
  practice: PracticeClock | null
  /** Where the practice phones are; null where the clock cannot be moved. */
  practicePhonesUrl: string | null
  /** Keys the hashes of numbers that opted out. */
  suppressionKey: string
  /** Under which the carrier calls us, without a slash at the end. */
  publicBaseUrl: string
  log: Pick<typeof log, 'info' | 'warn' | 'error'>
  close(): Promise<void>
}

async function openStore(settings: Environment): Promise<{ store: Store; unlock: () => void }> {
  if (settings.databaseUrl) {
    const store = openPostgres(settings.databaseUrl, (error) =>
      log.warn({ cause: error.message }, 'the database dropped an idle connection'),
    )
    return { store, unlock: () => undefined }
  }
  const folder = path.resolve(/*turbopackIgnore: true*/ settings.dataDir)
  const unlock = await lockDataFolder(folder)
  return { store: await openPglite(path.join(folder, 'db')), unlock }
}

/** Opens everything for one process: database, migrations, queue, carrier, mail, clock. */
async function open(): Promise<Deps> {
  if (isBuilding()) throw new Error('A page asked for the database while the desk was being built.')
  const settings = env()
  const { store, unlock } = await openStore(settings)
  await store.migrate()
  const queue = await startQueue(store, log, settings.jobs)
  const practice = settings.practiceClock
    ? practiceClock(path.resolve(/*turbopackIgnore: true*/ settings.dataDir, 'practice-clock.json'))
    : null
  return {
    store,
    queue,
    carrier: hostedCarrier(settings.carrier),
    mail: settings.mail
      ? smtpMail(settings.mail)
      : noMail((subject) => log.warn({ subject }, 'no mail is set up: a letter was not sent')),
    mailSet: settings.mail !== null,
    clock: practice ?? systemClock,
    practice,
    practicePhonesUrl: practice ? settings.carrier.apiBaseUrl : null,
    suppressionKey: settings.suppressionKey,
    publicBaseUrl: settings.publicBaseUrl,
    log,
    async close() {
      await queue.stop()
      await store.close()
      unlock()
    },
  }
}

// Pages, routes and jobs are bundled apart but share one process: the one instance hangs on the process.
const shared = globalThis as typeof globalThis & { rillpostDeps?: Promise<Deps> }

/** The one set of dependencies of this process. */
export function getDeps(): Promise<Deps> {
  shared.rillpostDeps ??= open().catch((error: unknown) => {
    shared.rillpostDeps = undefined
    throw error
  })
  return shared.rillpostDeps
}
