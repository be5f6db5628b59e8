import type { Transaction } from '@/db/client'
import { listPromptsOfText, updatePrompts } from '@/db/queries/prompt'
import { updateText, type TextRow } from '@/db/queries/text'
import type { Deps } from '@/lib/deps'

/** Gives up a text that never left. Its prompts are planned anew when they can go again. */
export async function dropText(
  tx: Transaction,
  deps: Deps,
  { text, why }: { text: TextRow; why: string },
): Promise<void> {
  await updateText(tx, text.id, { state: 'dropped', stateWhy: why })
  const prompts = await listPromptsOfText(tx, text.id)
  await updatePrompts(
    tx,
    prompts.filter((prompt) => prompt.state === 'planned').map((prompt) => prompt.id),
    { state: 'dropped' },
  )
  deps.log.info({ textId: text.id, why }, 'a text was dropped')
}
