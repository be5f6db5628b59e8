import { listDue, type DueRow } from '@/db/queries/prompt'
import type { AreaRow } from '@/db/queries/area'
import { listKitPlaces, listNudgesAhead, listQueuedTexts, type KitPlace } from '@/db/queries/round'
import { listPromptHours } from '@/db/queries/text'
import type { Deps } from '@/lib/deps'
import { addDays } from '@/lib/domain/day'
import { momentInfo } from '@/lib/domain/moments'
import { goingOut, type KitDue } from '@/lib/domain/round-going'
import { localDay, nextInsideWindow, type Window } from '@/lib/domain/round-window'
import { dueWords, listWords } from '@/lib/domain/round-words'
import type { Settings } from '@/lib/domain/settings'
import type { Going, RoundKind } from '@/lib/schemas/rounds'
import { asDue } from './as-due'

/** One text that is going to leave, as far as is known now. */
export type Expected = {
  on: string
  at: number
  householdId: string
  house: string
  area: AreaRow
  kinds: RoundKind[]
  what: string
  state: Going['state']
}

type Horizon = {
  now: number
  today: string
  days: number
  windows: ReadonlyMap<string, Window>
  settings: Settings
}

const weight: readonly RoundKind[] = ['welcome', 'change', 'wash', 'flow check']
const LIMIT = 10_000
const day = 86_400_000

/** Texts written and waiting, texts that planning will write, and nudges to who stays silent. */
export async function expectedTexts(deps: Deps, horizon: Horizon) {
  const until = horizon.now + horizon.days * day
  const lastDueOn = addDays(horizon.today, horizon.days + horizon.settings.sending.bundleDays)
  const due = await listDue(deps.store.db, lastDueOn, LIMIT)
  const queued = await listQueuedTexts(deps.store.db, until, LIMIT)
  const nudges = await listNudgesAhead(deps.store.db, until, LIMIT)
  return {
    expected: [
      ...queued.map(fromQueued),
      ...(await fromDue(deps, due, horizon)),
      ...fromNudges(nudges, horizon.windows),
    ],
    cut: [due, queued, nudges].some(({ length }) => length === LIMIT),
  }
}

function groupedBy<T, K>(items: readonly T[], keyOf: (item: T) => K): Map<K, T[]> {
  const groups = new Map<K, T[]>()
  for (const item of items) {
    const key = keyOf(item)
    groups.set(key, [...(groups.get(key) ?? []), item])
  }
  return groups
}

/** The weightiest first: it is what the text asks for. */
function inOrder<T extends { kind: RoundKind }>(things: readonly T[]): T[] {
  const place = ({ kind }: T) => weight.indexOf(kind)
  return [...things].sort((one, other) => place(one) - place(other))
}

type Queued = Awaited<ReturnType<typeof listQueuedTexts>>[number]

function fromQueued({ at, area, householdId, house, prompts, moment, purpose }: Queued): Expected {
  const isNudge = purpose.startsWith('nudge:')
  const info = moment === null ? undefined : momentInfo(moment)
  const about = inOrder(prompts).map(dueWords)
  return {
    on: localDay(at ?? 0, area.timeZone),
    at: at ?? 0,
    householdId: householdId ?? '',
    house,
    area,
    kinds: isNudge ? ['nudge'] : prompts.length > 0 ? prompts.map(({ kind }) => kind) : ['other'],
    what: about.length > 0 && !isNudge ? listWords(about) : (info?.name.toLowerCase() ?? 'text'),
    state: 'queued',
  }
}

async function kitsDue(deps: Deps, due: readonly DueRow[], places: Map<string, KitPlace>) {
  const householdIds = [...new Set([...places.values()].map(({ householdId }) => householdId))]
  const since = deps.clock.now() - 7 * day
  const hours = await listPromptHours(deps.store.db, householdIds, since)
  const sentTo = groupedBy(hours, ({ householdId }) => householdId)
  return [...groupedBy(due, ({ kitId }) => kitId)].flatMap(([kitId, rows]): KitDue[] => {
    const place = places.get(kitId)
    if (!place) return []
    const { householdId, area } = place
    const sentAt = (sentTo.get(householdId) ?? []).map(({ at }) => at)
    return [{ kitId, householdId, areaId: area.id, due: rows.map(asDue), sentAt }]
  })
}

async function fromDue(deps: Deps, due: readonly DueRow[], horizon: Horizon): Promise<Expected[]> {
  const found = await listKitPlaces(deps.store.db, [...new Set(due.map(({ kitId }) => kitId))])
  const places = new Map(found.map((place) => [place.kitId, place]))
  const kits = await kitsDue(deps, due, places)
  const { programme, sending } = horizon.settings
  const perMinute = programme.textsPerMinute
  return goingOut({ ...horizon, kits, perMinute, settings: sending }).flatMap(
    ({ kitId, on, at, due: about }): Expected[] => {
      const place = places.get(kitId)
      if (!place) return []
      const positions = about.flatMap(({ stagePosition }) => stagePosition ?? [])
      return [
        {
          on,
          at,
          householdId: place.householdId,
          house: place.house,
          area: place.area,
          kinds: about.map(({ kind }) => kind),
          what: listWords(inOrder(about).map(({ kind }) => dueWords({ kind, positions }))),
          state: 'planned',
        },
      ]
    },
  )
}

type Nudge = Awaited<ReturnType<typeof listNudgesAhead>>[number]

/** One nudge for all that one text asked: such prompts share their hour. */
function fromNudges(nudges: readonly Nudge[], windows: Horizon['windows']): Expected[] {
  const together = groupedBy(nudges, ({ householdId, at }) => `${householdId} ${at}`)
  return [...together.values()].flatMap((ofText): Expected[] => {
    const [first] = ofText
    const window = first && windows.get(first.area.id)
    if (!first || !window || first.at === null) return []
    const at = nextInsideWindow(first.at, window)
    const { householdId, house, area } = first
    return [
      {
        on: localDay(at, area.timeZone),
        at,
        householdId,
        house,
        area,
        kinds: ['nudge'],
        what: `nudge: ${listWords(inOrder(ofText).map(dueWords))}`,
        state: 'if silent',
      },
    ]
  })
}
