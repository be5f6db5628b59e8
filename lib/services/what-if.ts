import { listAreaRows } from '@/db/queries/area'
import { listLivingWordings } from '@/db/queries/wording'
import type { Deps } from '@/lib/deps'
import { changedCycles } from '@/lib/domain/cycle-words'
import { addDays } from '@/lib/domain/day'
import { languages, type Language } from '@/lib/domain/language'
import { allow, type Actor } from '@/lib/domain/role'
import type { Cycles, DayAhead, WhatIf } from '@/lib/domain/round-ahead'
import { costOfTexts, partsOf, peakOf, totalOf, weeksOf, type Load } from '@/lib/domain/round-load'
import { localDay } from '@/lib/domain/round-window'
import { dayWords, shortDayWords } from '@/lib/domain/stamp'
import { partsOf as segmentsOfWording } from '@/lib/domain/wording-examples'
import type { Refusal } from '@/lib/schemas/endpoint'
import type { WhatIfAnswer, WhatIfFigures, WhatIfQuery } from '@/lib/schemas/what-if'
import { mostCarriedADay } from './area-window'
import { cyclesOf, cyclesStanding } from './cycles-standing'
import { dayNames } from './day-names'
import { plansAhead } from './plans-ahead'
import { settingsNow } from './settings-now'

/** What the query leaves out stays as it is. */
function whatIfOf(query: WhatIfQuery, { wash, flowCheckDays }: Cycles): WhatIf {
  const months = { 1: query.change1, 2: query.change2, 3: query.change3 }
  const tried = Object.entries(months).filter(([, length]) => length !== undefined)
  return {
    wash: {
      ...wash,
      days: {
        clear: query.washClear ?? wash.days.clear,
        cloudy: query.washCloudy ?? wash.days.cloudy,
        'very cloudy': query.washVeryCloudy ?? wash.days['very cloudy'],
      },
      wetShare: query.wetPercent === undefined ? wash.wetShare : query.wetPercent / 100,
    },
    changeMonths: Object.fromEntries(tried),
    flowCheckDays: query.flowCheckDays ?? flowCheckDays,
  }
}

/** Segments that a text of each moment takes on the average, by the wordings in use and who reads them. */
async function meanSegments(deps: Deps, readers: Map<Language, number>, programme: string) {
  const living = await listLivingWordings(deps.store.db)
  const inUse = living.map(({ wording }) => wording).filter(({ state }) => state === 'in use')
  const all = [...readers.values()].reduce((sum, count) => sum + count, 0)
  const meanOf = (moment: string) => {
    const here = inUse.filter((wording) => wording.moment === moment)
    const sum = [...readers].reduce((segments, [language, count]) => {
      const wording =
        here.find((one) => one.language === language) ??
        here.find((one) => one.language === languages[0])
      if (!wording) return segments
      return segments + count * segmentsOfWording(wording.body, wording.language, { programme })
    }, 0)
    return all === 0 ? 0 : sum / all
  }
  return {
    'wash-due': meanOf('wash-due'),
    'change-due': meanOf('change-due'),
    'flow-check': meanOf('flow-check'),
  }
}

type Price = Parameters<typeof costOfTexts>[1]

function figuresOf(plan: readonly DayAhead[], price: Price): WhatIfFigures {
  const total = totalOf(plan)
  const changes = partsOf(plan)
  const busiest = peakOf(plan)
  return {
    texts: total.texts,
    washes: total.washes,
    changes: [changes[1], changes[2], changes[3]],
    flowChecks: total.flowChecks,
    cost: costOfTexts(total, price),
    busiest: busiest && {
      day: `${dayNames(busiest.on).weekday} ${shortDayWords(busiest.on)}`,
      texts: busiest.texts,
    },
  }
}

function weekOf({ texts, changes }: Load) {
  return { texts, parts: changes[1] + changes[2] + changes[3] }
}

function byWeek(today: readonly DayAhead[], other: readonly DayAhead[]) {
  const others = weeksOf(other)
  return weeksOf(today).map((week, index) => ({
    from: shortDayWords(week.on),
    today: weekOf(week),
    other: weekOf(others[index] ?? week),
  }))
}

/** The rules plan no wash sooner than the floor: to try one would show what never happens. */
function underFloor(query: WhatIfQuery, { wash: { floorDays } }: Cycles): Refusal | null {
  const washDays = [query.washClear, query.washCloudy, query.washVeryCloudy]
  const isUnder = washDays.some((tried) => tried !== undefined && tried < floorDays)
  return isUnder
    ? { ok: false, reason: `The settings keep washes at least ${floorDays} days apart.` }
    : null
}

/**
 * What other cycles would bring in the weeks ahead, beside those that stand. It is the load by due dates
 * if all is done when it is due (`planAhead`); nothing is kept.
 */
export async function whatIf(
  deps: Deps,
  actor: Actor,
  query: WhatIfQuery,
): Promise<WhatIfAnswer | Refusal> {
  allow(actor, 'see rounds')
  const settings = await settingsNow(deps.store.db)
  const { programme } = settings
  const areas = (await listAreaRows(deps.store.db)).map(({ area }) => area)
  const now = deps.clock.now()
  const from =
    areas.map(({ timeZone }) => localDay(now, timeZone)).sort()[0] ?? localDay(now, 'UTC')
  const days = Number(query.weeks) * 7
  const cycles = cyclesOf(settings)
  const refused = underFloor(query, cycles)
  if (refused) return refused
  const plans = await plansAhead(deps, { from, days, cycles, whatIf: whatIfOf(query, cycles) })
  const segments = await meanSegments(deps, plans.readers, programme.name)
  const price = { segments, pricePerSegment: programme.pricePerSegment }
  const reached = [...plans.readers.values()].reduce((sum, count) => sum + count, 0)
  return {
    weeks: Number(query.weeks),
    from: dayWords(from),
    until: dayWords(addDays(from, days - 1)),
    kits: plans.kits,
    unreached: plans.kits - reached,
    cut: plans.cut,
    changed: changedCycles(await cyclesStanding(deps, actor), query),
    today: figuresOf(plans.today, price),
    other: figuresOf(plans.other, price),
    byWeek: byWeek(plans.today, plans.other),
    carriesADay: mostCarriedADay(areas, programme.textsPerMinute),
    currency: programme.currency,
    pricePerSegment: programme.pricePerSegment,
    segmentsOfText: {
      wash: segments['wash-due'],
      change: segments['change-due'],
      flowCheck: segments['flow-check'],
    },
  }
}
