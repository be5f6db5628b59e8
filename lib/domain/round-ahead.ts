import {
  nextChangeOn,
  nextDue,
  washDefaults,
  washIntervalDays,
  type SourceClass,
  type WashSettings,
} from './cycle'
import { addDays, dayNumber, dayOfNumber, monthOf } from './day'

/** A kit as the plan ahead sees it. */
export type KitAhead = {
  sourceClass: SourceClass
  wetMonths: readonly number[]
  lastWashOn: string
  nextWashOn: string
  nextFlowCheckOn?: string
  stages: readonly { position: 1 | 2 | 3; fittedOn: string; changeMonths: number }[]
}

/** What falls due on a day. `texts` is what goes out when a household is told all at once. */
export type DayAhead = {
  on: string
  washes: number
  changes: Record<1 | 2 | 3, number>
  flowChecks: number
  texts: number
}

/** Other cycles to try: what is left out stays as it is. */
export type WhatIf = {
  wash?: WashSettings
  changeMonths?: Partial<Record<1 | 2 | 3, number>>
  flowCheckDays?: number
}

/** The days planned for, by their numbers; `months` has the month of each, from the first on. */
type Span = { first: number; last: number; months: readonly number[] }

function spanOf(from: string, days: number): Span {
  const first = dayNumber(from)
  const months = Array.from({ length: days }, (_, ahead) => monthOf(dayOfNumber(first + ahead)))
  return { first, last: first + days - 1, months }
}

function intervalIn(month: number, kit: KitAhead, settings: WashSettings): number {
  const wet = kit.wetMonths.includes(month)
  return washIntervalDays({ sourceClass: kit.sourceClass, wet, settings })
}

function washDays(kit: KitAhead, span: Span, whatIf: WashSettings | undefined): number[] {
  const settings = whatIf ?? washDefaults
  // The day that stands was found with the trend; another cycle starts anew from the last wash.
  const next = whatIf
    ? dayNumber(kit.lastWashOn) + intervalIn(monthOf(kit.lastWashOn), kit, whatIf)
    : dayNumber(kit.nextWashOn)
  const days: number[] = []
  let on = Math.max(next, span.first)
  while (on <= span.last) {
    days.push(on)
    on += intervalIn(span.months[on - span.first] ?? 0, kit, settings)
  }
  return days
}

function changeDays(fittedOn: string, months: number, span: Span): number[] {
  const first = Math.max(dayNumber(nextChangeOn({ fittedOn, changeMonths: months })), span.first)
  const days: number[] = []
  for (let on = first; on <= span.last;) {
    days.push(on)
    on = dayNumber(nextDue({ fittedOn: dayOfNumber(first), months, count: days.length }))
  }
  return days
}

function flowCheckDaysOf(kit: KitAhead, everyDays: number, span: Span): number[] {
  if (kit.nextFlowCheckOn === undefined) return []
  const days: number[] = []
  let on = Math.max(dayNumber(kit.nextFlowCheckOn), span.first)
  for (; on <= span.last; on += everyDays) days.push(on)
  return days
}

/**
 * What falls due on each of the coming days if everything is done on the day it is due: the plan of
 * the rounds page, and with `whatIf` the plan under other cycles. What is overdue falls on the
 * first day. Nothing is bundled across days and no window is looked at: this is the load, not the
 * sending.
 */
export function planAhead({
  kits,
  from,
  days,
  whatIf = {},
}: {
  kits: readonly KitAhead[]
  from: string
  days: number
  whatIf?: WhatIf
}): DayAhead[] {
  refuseStandingStill(kits, whatIf)
  const plan = Array.from({ length: days }, (_, ahead): DayAhead => emptyDay(addDays(from, ahead)))
  const span = spanOf(from, days)
  const dayAt = (on: number) => plan[on - span.first] as DayAhead
  for (const kit of kits) {
    const told = new Set<number>()
    const count = (dueDays: readonly number[], add: (day: DayAhead) => void) => {
      for (const on of dueDays) {
        add(dayAt(on))
        told.add(on)
      }
    }
    count(washDays(kit, span, whatIf.wash), (day) => (day.washes += 1))
    for (const stage of kit.stages) {
      const months = whatIf.changeMonths?.[stage.position] ?? stage.changeMonths
      count(changeDays(stage.fittedOn, months, span), (day) => (day.changes[stage.position] += 1))
    }
    const everyDays = whatIf.flowCheckDays ?? 30
    count(flowCheckDaysOf(kit, everyDays, span), (day) => (day.flowChecks += 1))
    for (const on of told) dayAt(on).texts += 1
  }
  return plan
}

/** A cycle of no length would be due for ever on one day. */
function refuseStandingStill(
  kits: readonly KitAhead[],
  { wash, changeMonths, flowCheckDays }: WhatIf,
) {
  const lengths = [
    ...kits.flatMap(({ stages }) => stages.map((stage) => stage.changeMonths)),
    ...Object.values(changeMonths ?? {}),
    flowCheckDays ?? 1,
    wash?.floorDays ?? 1,
  ]
  if (lengths.some((length) => !(length >= 1))) throw new RangeError('a cycle takes some time')
}

function emptyDay(on: string): DayAhead {
  return { on, washes: 0, changes: { 1: 0, 2: 0, 3: 0 }, flowChecks: 0, texts: 0 }
}

/** Parts a plan asks for, stage by stage. */
export function partsOf(plan: readonly DayAhead[]): Record<1 | 2 | 3, number> {
  const sum = (position: 1 | 2 | 3) =>
    plan.reduce((total, { changes }) => total + changes[position], 0)
  return { 1: sum(1), 2: sum(2), 3: sum(3) }
}

/** How the busiest day compares with an even load: 1 when all days are alike, null for no texts. */
export function peakOf(plan: readonly DayAhead[]): { on: string; times: number } | null {
  const total = plan.reduce((sum, { texts }) => sum + texts, 0)
  const peak = plan.reduce<DayAhead | null>(
    (most, day) => (most === null || day.texts > most.texts ? day : most),
    null,
  )
  if (peak === null || total === 0) return null
  return { on: peak.on, times: peak.texts / (total / plan.length) }
}
