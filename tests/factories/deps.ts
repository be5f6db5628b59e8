import { sql } from 'drizzle-orm'
import type { Store } from '@/db/client'
import { startQueue, type Queue } from '@/jobs/boss'
import { standingClock, type PracticeClock } from '@/lib/clock'
import type { Deps } from '@/lib/deps'
import { recordingCarrier, type RecordingCarrier } from './carrier'
import { emptyStore } from './store'

type Letter = { to: string; subject: string; body: string; messageId: string }

export type TestDeps = Deps & {
  carrier: RecordingCarrier
  clock: PracticeClock
  letters: Letter[]
  /** What waits in the queue, oldest first: rows of the real queue, so what was rolled back is not there. */
  jobs(): Promise<{ name: string; payload: unknown }[]>
}

const silent = { info: () => undefined, warn: () => undefined, error: () => undefined }

const shared = globalThis as typeof globalThis & { rillpostTestQueue?: Promise<Queue> }

async function waitingJobs(store: Store) {
  const { rows } = await store.db.execute<{ name: string; payload: unknown }>(
    sql`select name, data as payload from pgboss.job where state = 'created' order by created_on, id`,
  )
  return rows
}

/**
 * What the services want, on a real, empty database and a real queue, with a clock that stands at `at` and
 * a carrier that keeps what it is given. One test at a time: each call empties the worker's database.
 */
export async function testDeps({ at }: { at: number | string }): Promise<TestDeps> {
  const store = await emptyStore()
  shared.rillpostTestQueue ??= startQueue(store, silent, false)
  return depsOn(store, await shared.rillpostTestQueue, at)
}

/** The same on a store and a queue of one's own. */
export function depsOn(store: Store, queue: Queue, at: number | string): TestDeps {
  const clock = standingClock(typeof at === 'number' ? at : Date.parse(at))
  const letters: Letter[] = []
  return {
    store,
    queue,
    carrier: recordingCarrier(),
    mail: {
      send: (letter) => {
        letters.push(letter)
        return Promise.resolve()
      },
    },
    mailSet: true,
    letters,
    clock,
    practice: clock,
    practicePhonesUrl: 'http://127.0.0.1:4010',
    suppressionKey: 'a key that only the tests know, of any length',
    publicBaseUrl: 'http://127.0.0.1:3000',
    log: silent,
    jobs: () => waitingJobs(store),
    close: () => Promise.resolve(),
  }
}
