import type { Transaction } from '@/db/client'
import { insertAddedWord } from '@/db/queries/added-word'
import { findProposal, insertSettledProposal } from '@/db/queries/proposal'
import { insertAudit } from '@/db/queries/staff'
import type { Deps } from '@/lib/deps'
import type { AddedWord } from '@/lib/domain/reply-added'
import { addedRefusalWords, isPhraseOf } from '@/lib/domain/reply-may-add'
import { allow, type Actor } from '@/lib/domain/role'
import type { Refusal } from '@/lib/schemas/endpoint'
import type { AddWords } from '@/lib/schemas/reply-words'
import { addedWordsInForce } from './added-words'
import { checkNewWords } from './check-new-words'

/** Undoes the transaction: some of the words were not to be added, so none is. */
class NotAdded extends Error {}

/** Somebody else was first. */
export const overtaken: Refusal = {
  ok: false,
  reason: 'This proposal was settled, or the text read anew, in the meantime.',
}

/**
 * Gives words a meaning from the next text on, all or none, and settles the proposal they come from.
 * What was read before stays as it was read.
 */
export async function addWords(
  deps: Deps,
  actor: Actor,
  input: AddWords,
): Promise<{ ok: true; added: number } | Refusal> {
  allow(actor, 'set reply words')
  try {
    return await deps.store.transaction((tx) => add(tx, { deps, actor, input }))
  } catch (error) {
    if (error instanceof NotAdded) return { ok: false, reason: error.message }
    throw error
  }
}

type Adding = { deps: Deps; actor: Actor; input: AddWords }

async function add(
  tx: Transaction,
  { deps, actor, input }: Adding,
): Promise<{ ok: true; added: number } | Refusal> {
  const at = deps.clock.now()
  const from = input.proposal ? await findProposal(tx, input.proposal.textId) : null
  if (input.proposal && from?.person.n !== input.proposal.readingN) return overtaken
  const language = from?.text.language ?? input.language
  const { allowed, refused } = checkNewWords(
    { language, words: input.words },
    await addedWordsInForce(tx),
  )
  const [first] = refused
  if (first) return { ok: false, reason: `“${first.phrase}”: ${addedRefusalWords(first.refusal)}` }
  const stray = from && allowed.find(({ phrase }) => !isPhraseOf(phrase, from.text.body))
  if (stray) return { ok: false, reason: `“${stray.phrase}” does not stand in the text.` }
  for (const word of allowed) await keep(tx, word, { actor, at, textId: from?.text.id })
  if (from) {
    const isFirst = await insertSettledProposal(tx, {
      readingN: from.person.n,
      outcome: 'words added',
      settledBy: actor.staffId,
      settledAt: at,
    })
    if (!isFirst) throw new NotAdded(overtaken.reason)
  }
  return { ok: true, added: allowed.length }
}

async function keep(
  tx: Transaction,
  { language, concept, phrase }: AddedWord,
  { actor, at, textId }: { actor: Actor; at: number; textId: string | undefined },
): Promise<void> {
  const made = await insertAddedWord(tx, {
    language,
    concept,
    phrase,
    textId,
    addedBy: actor.staffId,
    addedAt: at,
  })
  if (!made) throw new NotAdded(`“${phrase}” was given a meaning in the meantime.`)
  await insertAudit(tx, {
    staffId: actor.staffId,
    act: 'add a reply word',
    subject: 'reply word',
    subjectId: made.id,
    detail: { language, concept, phrase },
    at,
  })
}
