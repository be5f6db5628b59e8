import PgBoss from 'pg-boss'
import { queueSqlOf, type Store, type Transaction } from '@/db/client'
import { faultWords } from '@/lib/log'
import { queues, type Payload, type QueueName } from './queues'

/** Enqueueing inside the transaction that made the work necessary: both are kept or neither. */
export type Queue = {
  add<N extends QueueName>(tx: Transaction, name: N, payload: Payload<N>): Promise<void>
  /** Wakes a sweep outside any transaction. */
  wake(name: QueueName): Promise<void>
  work<N extends QueueName>(name: N, handler: (payload: Payload<N>) => Promise<void>): Promise<void>
  /** Jobs that are waiting or under way, by queue. */
  depth(): Promise<Record<QueueName, number>>
  stop(): Promise<void>
}

type Log = { error(detail: Record<string, unknown>, message: string): void }

const names = Object.keys(queues) as QueueName[]

async function createQueues(boss: PgBoss): Promise<void> {
  for (const name of names) {
    const { attempts, backoffSeconds, expireSeconds } = queues[name]
    await boss.createQueue(name, {
      name,
      policy: 'standard',
      retryLimit: attempts - 1,
      retryDelay: backoffSeconds,
      retryBackoff: true,
      expireInSeconds: expireSeconds,
    })
  }
}

/** Starts the queue in the store. With `worker` it also keeps its own tables and rings the repeats. */
export async function startQueue(store: Store, log: Log, worker: boolean): Promise<Queue> {
  const boss = new PgBoss({
    db: store.queueSql,
    schema: 'pgboss',
    supervise: worker,
    schedule: worker,
    migrate: true,
  })
  boss.on('error', (error) =>
    log.error({ cause: faultWords(error) }, 'the queue reported an error'),
  )
  await boss.start()
  await createQueues(boss)
  const workers = new Map<QueueName, string>()

  return {
    async add(tx, name, payload) {
      const id = await boss.send(name, payload as object, { db: queueSqlOf(tx) })
      if (id === null) throw new Error(`The queue ${name} did not take a job.`)
      const worker = workers.get(name)
      if (worker) setTimeout(() => boss.notifyWorker(worker), 5).unref()
    },
    async wake(name) {
      await boss.send(name, {})
      const worker = workers.get(name)
      if (worker) boss.notifyWorker(worker)
    },
    async work(name, handler) {
      const { batch, payload: schema } = queues[name]
      const repeat = 'repeat' in queues[name] ? queues[name].repeat : null
      if (repeat) await boss.schedule(name, repeat, {}, { tz: 'UTC' })
      const workerId = await boss.work(
        name,
        { batchSize: batch, pollingIntervalSeconds: 1 },
        async (jobs) => {
          // Each job settles by itself: a throw here would have the whole batch done again.
          for (const job of jobs) {
            try {
              await handler(schema.parse(job.data) as never)
              await boss.complete(name, job.id)
            } catch (error) {
              log.error({ queue: name, job: job.id, cause: faultWords(error) }, 'a job failed')
              await boss.fail(name, job.id, { message: faultWords(error) })
            }
          }
          if (jobs.length === batch) boss.notifyWorker(workerId)
        },
      )
      workers.set(name, workerId)
    },
    async depth() {
      const sizes = {} as Record<QueueName, number>
      for (const name of names) sizes[name] = await boss.getQueueSize(name, { before: 'completed' })
      return sizes
    },
    stop: () => boss.stop({ graceful: true, timeout: 10_000 }),
  }
}
