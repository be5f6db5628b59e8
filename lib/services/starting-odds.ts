import type { Handle, Transaction } from '@/db/client'
import { countClosedCauses } from '@/db/queries/cause'
import type { KitFacts } from '@/db/queries/kit-facts'
import { causeWords } from '@/lib/domain/end-causes'
import { localDay } from '@/lib/domain/round'
import type { Settings } from '@/lib/domain/settings'
import type { TicketEvent } from '@/lib/domain/ticket-types'
import type { Trouble } from '@/lib/domain/trouble'
import { defaultPriors } from '@/lib/domain/walk'
import {
  byOdds,
  countedOdds,
  countedTroubles,
  historyDays,
  seasonOf,
  type CountedTrouble,
} from '@/lib/domain/walk-history'
import type { StartingOdds } from '@/lib/schemas/settings'
import { settingsNow } from './settings-now'

const day = 86_400_000

type Counted = Pick<Extract<TicketEvent, { kind: 'opened' }>, 'odds' | 'oddsOrigin'>

/**
 * The odds that a ticket of this area starts from when it opens now, and where they were counted. Nothing
 * where that is switched off, and where no ticket tells of a cause: then the catalogue's stand.
 */
export async function oddsAtOpening(
  tx: Transaction,
  { area, trouble, now }: { area: KitFacts['area']; trouble: Trouble; now: number },
): Promise<Counted> {
  const counted = countedTroubles.find((one) => one === trouble)
  const { fromClosedTickets, priorTickets } = (await settingsNow(tx)).walks
  if (!counted || !fromClosedTickets) return {}
  const season = seasonOf(localDay(now, area.timeZone), area.wetMonths)
  const causes = await countClosedCauses(tx, {
    since: now - historyDays * day,
    troubles: [counted],
    areaId: area.id,
    wet: season === 'wet',
  })
  const found = countedOdds(causes, { trouble: counted, priorTickets })
  if (!found) return {}
  const { odds, tickets } = found
  return { odds, oddsOrigin: { area: area.name, season, tickets, priorTickets } }
}

type Row = Awaited<ReturnType<typeof countClosedCauses>>[number]

/** So many suspects are shown, the likeliest. */
const SHOWN = 3

function rowOf(rows: readonly Row[], priorTickets: number): StartingOdds[number] | null {
  const [first] = rows
  if (!first) return null
  const trouble = first.trouble as CountedTrouble
  const found = countedOdds(rows, { trouble, priorTickets })
  if (!found) return null
  const catalogue = defaultPriors[trouble]
  const named = rows.filter(({ cause }) => cause in catalogue)
  const most = named.reduce(
    (best, row) => (row.tickets > best.tickets ? row : best),
    named[0] ?? first,
  )
  return {
    areaId: first.areaId,
    area: first.area,
    season: first.wet ? 'wet' : 'dry',
    trouble,
    tickets: found.tickets,
    likely: { words: causeWords(most.cause), tickets: most.tickets },
    odds: byOdds(found.odds)
      .slice(0, SHOWN)
      .map((id) => ({ words: causeWords(id), used: found.odds[id], catalogue: catalogue[id] })),
  }
}

/** What closed tickets say of the causes, by area, season and trouble, with the odds that this gives. */
export async function startingOdds(
  db: Handle,
  { now, settings }: { now: number; settings: Settings },
): Promise<StartingOdds> {
  const since = now - historyDays * day
  const rows = await countClosedCauses(db, { since, troubles: countedTroubles })
  const groups = new Map<string, Row[]>()
  for (const row of rows) {
    const key = `${row.areaId} ${row.wet} ${row.trouble}`
    groups.set(key, [...(groups.get(key) ?? []), row])
  }
  return [...groups.values()]
    .map((group) => rowOf(group, settings.walks.priorTickets))
    .filter((row) => row !== null)
}
