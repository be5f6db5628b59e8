import type { Deps } from '@/lib/deps'
import { planPrompts } from '@/lib/services/plan-prompts'
import { wakeTexts } from '@/lib/services/wake-texts'

/** Plans what is due, and sends on what may go at once. */
export async function runPlanPrompts(deps: Deps): Promise<void> {
  const { planned } = await planPrompts(deps)
  if (planned === 0) return
  deps.log.info({ planned }, 'prompts planned')
  await wakeTexts(deps)
}
