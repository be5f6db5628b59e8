import type { Queue } from '@/jobs/boss'
import { handlers } from '@/jobs/handlers'
import { queues, type QueueName } from '@/jobs/queues'
import type { Deps } from '@/lib/deps'

export type BuildQueue = Queue & { drain(deps: Deps): Promise<void> }

/** A queue in memory that is worked when told to: in the demo's past no job waits for a worker. */
export function buildQueue(): BuildQueue {
  const waiting: { name: QueueName; payload: unknown }[] = []
  return {
    add: (_tx, name, payload) => {
      waiting.push({ name, payload })
      return Promise.resolve()
    },
    wake: () => Promise.resolve(),
    work: () => Promise.resolve(),
    depth: () =>
      Promise.resolve(
        Object.fromEntries(Object.keys(queues).map((name) => [name, 0])) as Record<
          QueueName,
          number
        >,
      ),
    stop: () => Promise.resolve(),
    async drain(deps) {
      for (let job = waiting.shift(); job; job = waiting.shift()) {
        const handler = handlers[job.name] as (deps: Deps, payload: unknown) => Promise<unknown>
        await handler(deps, job.payload)
      }
    },
  }
}
