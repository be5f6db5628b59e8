import type { Deps } from '@/lib/deps'
import { handlers } from './handlers'
import { queues, type QueueName } from './queues'

/**
 * Starts working every queue in this process, and wakes each sweep once: a desk that was down misses
 * nothing, since what is due stands in our own rows.
 */
export async function runJobs(deps: Deps): Promise<void> {
  for (const name of Object.keys(queues) as QueueName[]) {
    const handler = handlers[name] as (deps: Deps, payload: unknown) => Promise<unknown>
    await deps.queue.work(name, async (payload) => {
      await handler(deps, payload)
    })
    if ('repeat' in queues[name] && name !== 'keep-house') await deps.queue.wake(name)
  }
}
