import { findProposal, listProposals, type ProposalRow } from '@/db/queries/proposal'
import { listTimeZones } from '@/db/queries/time-zone'
import type { Deps } from '@/lib/deps'
import { readReply, type ReplyKind } from '@/lib/domain/reply'
import type { AddedWord } from '@/lib/domain/reply-added'
import { meaningWords, sureWords } from '@/lib/domain/reply-meaning-words'
import { allow, type Actor } from '@/lib/domain/role'
import { localDay } from '@/lib/domain/round-window'
import { shortDayWords } from '@/lib/domain/stamp'
import type { Proposal, ProposalPage } from '@/lib/schemas/reply-words'
import { addedWordsInForce } from './added-words'

const PAGE = 20

/** Texts that a person read otherwise than the desk, newest first: what the word lists may lack. */
export async function listWordProposals(
  deps: Deps,
  actor: Actor,
  { before }: { before?: number | undefined },
): Promise<ProposalPage> {
  allow(actor, 'set reply words')
  const { db } = deps.store
  const rows = await listProposals(db, { before: before ?? null, limit: PAGE + 1 })
  const page = rows.slice(0, PAGE)
  const view = await viewer(deps)
  return {
    rows: page.map(view),
    before: rows.length > PAGE ? (page.at(-1)?.person.n ?? null) : null,
  }
}

/** One of them; null when it has been settled or the desk and the person agree. */
export async function wordProposal(
  deps: Deps,
  actor: Actor,
  textId: string,
): Promise<Proposal | null> {
  allow(actor, 'set reply words')
  const row = await findProposal(deps.store.db, textId)
  return row && (await viewer(deps))(row)
}

async function viewer({ store }: Deps) {
  const added = await addedWordsInForce(store.db)
  const timeZone = (await listTimeZones(store.db))[0] ?? 'UTC'
  return (row: ProposalRow): Proposal => viewOf(row, added, timeZone)
}

function viewOf(
  { text, person, desk, by }: ProposalRow,
  added: readonly AddedWord[],
  timeZone: string,
): Proposal {
  const now = readReply({ text: text.body, language: text.language, asked: desk.asked, added })
  const readOn = localDay(person.at, timeZone)
  return {
    textId: text.id,
    readingN: person.n,
    body: text.body,
    language: text.language,
    asked: desk.asked,
    day: shortDayWords(readOn),
    year: readOn.slice(0, 4),
    desk: { meaning: meaningWords(desk), sure: sureWords(desk.sure) },
    person: { meaning: meaningWords(person), by: by ?? 'somebody' },
    settledByNow: isSame(now, person),
  }
}

type Read = { kind: ReplyKind; minutes?: number | null }

function isSame(one: Read, other: Read): boolean {
  return one.kind === other.kind && (one.kind !== 'flow-figure' || one.minutes === other.minutes)
}
