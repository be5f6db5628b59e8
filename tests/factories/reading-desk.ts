import { desc } from 'drizzle-orm'
import { replyReadings } from '@/db/schema/text'
import type { ReplyKind } from '@/lib/domain/reply'
import type { Actor } from '@/lib/domain/role'
import { wordProposal } from '@/lib/services/list-proposals'
import { readAs } from '@/lib/services/read-as'
import type { TestDeps } from './deps'
import { actorOf, houseIn, say, world } from './world'

const NUMBER = '+12025550101'

/** The newest reading there is. */
async function lastReading(deps: TestDeps) {
  const [row] = await deps.store.db
    .select()
    .from(replyReadings)
    .orderBy(desc(replyReadings.n))
    .limit(1)
  if (!row) throw new Error('Nothing was read.')
  return row
}

/** A desk with a Spanish-speaking household, its coordinator Tomas and its agent Ana. */
export async function readingDesk(deps: TestDeps) {
  const place = await world(deps)
  const tomas: Actor = place.coordinator
  const ana = await actorOf(deps, 'agent', { name: 'Ana Belmar' })
  await houseIn(deps, place, { number: NUMBER, handedOverOn: '2026-03-01' })
  return {
    place,
    tomas,
    ana,
    /** The household writes: what the desk takes it for. */
    async deskReads(body: string): Promise<ReplyKind> {
      await say(deps, NUMBER, body)
      return (await lastReading(deps)).kind
    },
    /** The household writes and Ana reads it anew: the text. */
    async corrected(body: string, kind: ReplyKind): Promise<string> {
      await say(deps, NUMBER, body)
      const { textId } = await lastReading(deps)
      const read = await readAs(deps, ana, { textId, kind })
      if (!read.ok) throw new Error(read.reason)
      return textId
    },
    /** The open proposal that a text makes. */
    async proposalOf(textId: string) {
      const proposal = await wordProposal(deps, tomas, textId)
      if (!proposal) throw new Error('There is no such proposal.')
      return proposal
    },
  }
}

export type ReadingDesk = Awaited<ReturnType<typeof readingDesk>>
