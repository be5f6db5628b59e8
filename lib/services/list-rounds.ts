import { listAreaRows } from '@/db/queries/area'
import type { Deps } from '@/lib/deps'
import { addDays } from '@/lib/domain/day'
import { daysOffOn } from '@/lib/domain/holiday'
import { allow, type Actor } from '@/lib/domain/role'
import { openingsAhead } from '@/lib/domain/round-going'
import { localDay } from '@/lib/domain/round-window'
import { clockWords } from '@/lib/domain/stamp'
import type { Going, RoundDay, RoundKind, Rounds } from '@/lib/schemas/rounds'
import { mostCarriedADay, windowOf } from './area-window'
import { dayNames } from './day-names'
import { expectedTexts, type Expected } from './expected-texts'
import { settingsNow } from './settings-now'

const DAYS = 14
const LISTED_A_DAY = 60
const day = 86_400_000

/** What goes out in the next fourteen days, by the local day of each household's area. */
export async function listRounds(deps: Deps, actor: Actor): Promise<Rounds> {
  allow(actor, 'see rounds')
  const now = deps.clock.now()
  const settings = await settingsNow(deps.store.db)
  const rows = await listAreaRows(deps.store.db)
  const windows = new Map(rows.map(({ area }) => [area.id, windowOf(area)]))
  const zones = [...windows.values()].map(({ timeZone }) => timeZone)
  const today = zones.map((zone) => localDay(now, zone)).sort()[0] ?? localDay(now, 'UTC')
  const { expected, cut } = await expectedTexts(deps, {
    now,
    today,
    days: DAYS,
    windows,
    settings,
  })
  const open = new Set(
    [...windows.values()].flatMap((window) =>
      openingsAhead(window, now, now + DAYS * day).map(({ on }) => on),
    ),
  )
  const days = Array.from({ length: DAYS }, (_, ahead) => {
    const on = addDays(today, ahead)
    const ofDay = expected.filter((text) => text.on === on || (ahead === 0 && text.on < on))
    return {
      ...dayOf(on, ofDay),
      off: windows.size > 0 && !open.has(on),
      daysOff: daysOffOn(
        on,
        rows.map(({ area }) => area),
      ),
    }
  })
  return {
    days,
    texts: days.reduce((sum, { texts }) => sum + texts, 0),
    carriesADay: mostCarriedADay(
      rows.map(({ area }) => area),
      settings.programme.textsPerMinute,
    ),
    textsPerMinute: settings.programme.textsPerMinute,
    cut,
  }
}

function dayOf(on: string, expected: readonly Expected[]): Omit<RoundDay, 'off' | 'daysOff'> {
  const inOrder = [...expected].sort((one, other) => one.at - other.at)
  const count = (kind: RoundKind) => expected.filter(({ kinds }) => kinds.includes(kind)).length
  return {
    on,
    ...dayNames(on),
    texts: expected.length,
    counts: {
      wash: count('wash'),
      change: count('change'),
      'flow check': count('flow check'),
      welcome: count('welcome'),
      nudge: count('nudge'),
      other: count('other'),
    },
    going: inOrder.slice(0, LISTED_A_DAY).map(goingOf),
    more: Math.max(0, expected.length - LISTED_A_DAY),
  }
}

function goingOf({ at, area, householdId, house, what, state }: Expected): Going {
  return { householdId, house, area: area.name, hour: clockWords(at, area.timeZone), what, state }
}
