import type { Deps } from '@/lib/deps'
import { followSilence } from '@/lib/services/follow-silence'
import { receiveReceipt } from '@/lib/services/receive-receipt'
import { receiveText } from '@/lib/services/receive-text'
import { reconcileAttempts } from '@/lib/services/reconcile-attempts'
import { sendText } from '@/lib/services/send-text'
import { mailCoordinators } from '@/lib/services/tell-coordinator'
import { wakeTexts } from '@/lib/services/wake-texts'
import { runPlanPrompts } from './plan-prompts'
import type { Payload, QueueName } from './queues'

export type Handlers = {
  [N in QueueName]: (deps: Deps, payload: Payload<N>) => Promise<unknown>
}

/** What each queue's jobs do. Each use case is safe to run twice: a job may come again after a crash. */
export const handlers: Handlers = {
  'plan-prompts': runPlanPrompts,
  'wake-texts': wakeTexts,
  'follow-silence': followSilence,
  'reconcile-attempts': reconcileAttempts,
  'keep-house': (deps) => deps.store.keepHouse(),
  'send-text': sendText,
  'receive-text': receiveText,
  'receive-receipt': receiveReceipt,
  'tell-coordinator': mailCoordinators,
}
