import type { Handle } from '@/db/client'
import { findHousehold } from '@/db/queries/household'
import { listReadingsOfTexts, listSlipTexts } from '@/db/queries/slip'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import { localDay } from '@/lib/domain/round'
import { readingWords, receiptOf } from '@/lib/domain/slip-words'
import { clockWords, dayWords, momentWords } from '@/lib/domain/stamp'
import type { SlipPage, SlipView } from '@/lib/schemas/slip'

const PAGE = 50

type TextRow = Awaited<ReturnType<typeof listSlipTexts>>[number]
type ReadingRow = Awaited<ReturnType<typeof listReadingsOfTexts>>[number]

function slipOf(text: TextRow, reading: ReadingRow | undefined, timeZone: string): SlipView {
  const at = text.sentAt ?? text.createdAt
  const going = text.sendAfter === null ? '' : momentWords(text.sendAfter, timeZone)
  return {
    n: text.n,
    textId: text.id,
    direction: text.direction,
    body: text.body,
    language: text.language,
    at: new Date(at).toISOString(),
    day: dayWords(localDay(at, timeZone)),
    time: clockWords(at, timeZone),
    ...receiptOf(text.state, { why: text.stateWhy, going }),
    under: reading ? readWords(reading) : text.staffBody,
  }
}

/** `read as: slow water`; a person's reading says that it is one. */
function readWords(reading: ReadingRow): string {
  return `${readingWords(reading)}${reading.readBy === 'desk' ? '' : ' (a person read it)'}`
}

/** The last texts with a household, or those before `before`; hours in the area's zone. */
export async function slipPage(
  db: Handle,
  {
    householdId,
    timeZone,
    before,
  }: { householdId: string; timeZone: string; before: number | null },
): Promise<SlipPage> {
  const rows = await listSlipTexts(db, { householdId, before, limit: PAGE + 1 })
  const page = rows.slice(0, PAGE).toReversed()
  const readings = await listReadingsOfTexts(
    db,
    page.filter(({ direction }) => direction === 'in').map(({ id }) => id),
  )
  const slips = page.map((text) =>
    slipOf(
      text,
      readings.findLast((reading) => reading.textId === text.id),
      timeZone,
    ),
  )
  return { slips, before: rows.length > PAGE ? (page[0]?.n ?? null) : null }
}

/** An earlier page of the texts with a household. */
export async function householdTexts(
  deps: Deps,
  actor: Actor,
  { householdId, before }: { householdId: string; before: number | null },
): Promise<SlipPage | { ok: false; reason: string }> {
  allow(actor, 'see households')
  const { db } = deps.store
  const found = await findHousehold(db, householdId)
  if (!found) return { ok: false, reason: 'not found' }
  return slipPage(db, { householdId, timeZone: found.area.timeZone, before })
}
