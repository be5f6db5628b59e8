import { eq } from 'drizzle-orm'
import { texts } from '@/db/schema/text'
import type { Deps } from '@/lib/deps'
import type { Language } from '@/lib/domain/language'
import type { ReplyKind } from '@/lib/domain/reply'
import type { Actor } from '@/lib/domain/role'
import { readAs } from '@/lib/services/read-as'

type OddWords = { day: number; language: Language; body: string; kind: ReplyKind }

/** Words that no list of the desk has, what the agent takes them for, and on which day of the history. */
const oddWords: readonly OddWords[] = [
  { day: 17, language: 'es', body: 'sale de a chirris', kind: 'slow' },
  { day: 20, language: 'en', body: 'our bucket is all gammy', kind: 'broken' },
  { day: 23, language: 'en', body: 'water only dawdles', kind: 'slow' },
  { day: 25, language: 'es', body: 'un chirris nada mas', kind: 'slow' },
]

/** Those of one day. */
export function oddWordsOf(day: number): readonly OddWords[] {
  return oddWords.filter((words) => words.day === day)
}

/** The agent sets right what the desk took a text for. */
export async function setRight(
  deps: Deps,
  agent: Actor,
  { sid, kind }: { sid: string; kind: ReplyKind },
): Promise<void> {
  const [text] = await deps.store.db.select().from(texts).where(eq(texts.sid, sid))
  if (!text) throw new Error('The text that was to be set right did not come in.')
  const read = await readAs(deps, agent, { textId: text.id, kind })
  if (!read.ok) throw new Error(read.reason)
}
