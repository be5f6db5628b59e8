import {
  nextChangeOn,
  nextDue,
  washDefaults,
  washIntervalDays,
  type SourceClass,
  type WashSettings,
} from './cycle'
import { addDays, dayNumber, dayOfNumber, monthOf } from './day'
import { emptyLoad, type Load } from './round-load'

type Position = 1 | 2 | 3

/** A kit as the plan ahead sees it. */
export type KitAhead = {
  sourceClass: SourceClass
  wetMonths: readonly number[]
  /** What the wash interval counts from, the day the calendar gives, and the day that stands. */
  washCountedFrom: string
  calendarWashOn: string
  nextWashOn: string
  nextFlowCheckOn?: string
  stages: readonly { position: Position; fittedOn: string; changeMonths: number }[]
  /** False where no text reaches the household: its kit is cared for all the same. */
  texted?: boolean
}

/** What falls due on a day, and the texts that ask for it. */
export type DayAhead = Load & { on: string }

/** The cycles that stand; the months of a stage's change are each kit's own. */
export type Cycles = { wash: WashSettings; flowCheckDays: number }

/** Other cycles to try: what is left out stays as it is. */
export type WhatIf = {
  wash?: WashSettings
  changeMonths?: Partial<Record<Position, number>>
  flowCheckDays?: number
}

const commonCycles: Cycles = { wash: washDefaults, flowCheckDays: 60 }

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

/**
 * The day that the calendar gives moves by what the interval gains or loses, and the days after it follow
 * the new one. A wash that the trend brought forward is put off by no cycle.
 */
function washDays(kit: KitAhead, span: Span, { today, other }: Record<'today' | 'other', Cycles>) {
  const month = monthOf(kit.washCountedFrom)
  const gained = intervalIn(month, kit, other.wash) - intervalIn(month, kit, today.wash)
  const byCalendar = dayNumber(kit.calendarWashOn) + gained
  const isBrought = kit.nextWashOn < kit.calendarWashOn
  const next = isBrought ? Math.min(byCalendar, dayNumber(kit.nextWashOn)) : byCalendar
  const days: number[] = []
  let on = Math.max(next, span.first)
  while (on <= span.last) {
    days.push(on)
    on += intervalIn(span.months[on - span.first] ?? 0, kit, other.wash)
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

function flowCheckDaysOf(
  { nextFlowCheckOn }: KitAhead,
  span: Span,
  { today, other }: Record<'today' | 'other', Cycles>,
): number[] {
  if (nextFlowCheckOn === undefined) return []
  const gained = other.flowCheckDays - today.flowCheckDays
  const days: number[] = []
  let on = Math.max(dayNumber(nextFlowCheckOn) + gained, span.first)
  for (; on <= span.last; on += other.flowCheckDays) days.push(on)
  return days
}

type Thing = 'wash' | 'flow check' | Position

/** What falls due on one kit, thing by thing, each with its days. */
function dueOf(
  kit: KitAhead,
  span: Span,
  cycles: { today: Cycles; other: Cycles; whatIf: WhatIf },
) {
  const changes = kit.stages.map(({ position, fittedOn, changeMonths }) => {
    const months = cycles.whatIf.changeMonths?.[position] ?? changeMonths
    return [position, changeDays(fittedOn, months, span)] as const
  })
  return [
    ['wash', washDays(kit, span, cycles)],
    ['flow check', flowCheckDaysOf(kit, span, cycles)],
    ...changes,
  ] as readonly (readonly [Thing, number[]])[]
}

function count(day: DayAhead, thing: Thing): void {
  if (thing === 'wash') day.washes += 1
  else if (thing === 'flow check') day.flowChecks += 1
  else day.changes[thing] += 1
}

/** A text asks for one thing, as `textFor` has it: changes go together, a new fibre stage needs no wash. */
function countTexts(day: DayAhead, things: ReadonlySet<Thing>): void {
  const ask = (moment: keyof Load['asks'], isAsked: boolean) => {
    if (!isAsked) return
    day.asks[moment] += 1
    day.texts += 1
  }
  ask('change-due', things.has(1) || things.has(2) || things.has(3))
  ask('wash-due', things.has('wash') && !things.has(3))
  ask('flow-check', things.has('flow check'))
}

/**
 * What falls due on each of the coming days if everything is done on the day it is due, under the cycles
 * that stand, and with `whatIf` under others. What is overdue falls on the first day. Nothing is bundled
 * across days, and neither the window nor the weekly limit is looked at: this is the load, not the sending.
 */
export function planAhead({
  kits,
  from,
  days,
  cycles = commonCycles,
  whatIf = {},
}: {
  kits: readonly KitAhead[]
  from: string
  days: number
  cycles?: Cycles
  whatIf?: WhatIf
}): DayAhead[] {
  refuseStandingStill(kits, { cycles, whatIf })
  const plan = emptyPlan(from, days)
  const span = spanOf(from, days)
  const other = { ...cycles, ...whatIf }
  for (const kit of kits) {
    const byDay = new Map<number, Set<Thing>>()
    for (const [thing, on] of dueOf(kit, span, { today: cycles, other, whatIf })) {
      for (const number of on) {
        count(plan[number - span.first] as DayAhead, thing)
        byDay.set(number, (byDay.get(number) ?? new Set()).add(thing))
      }
    }
    if (kit.texted === false) continue
    for (const [number, things] of byDay) countTexts(plan[number - span.first] as DayAhead, things)
  }
  return plan
}

/** A plan with nothing in it. */
export function emptyPlan(from: string, days: number): DayAhead[] {
  return Array.from({ length: days }, (_, ahead) => ({ on: addDays(from, ahead), ...emptyLoad() }))
}

/** A cycle of no length would be due for ever on one day. */
function refuseStandingStill(
  kits: readonly KitAhead[],
  { cycles, whatIf }: { cycles: Cycles; whatIf: WhatIf },
) {
  const lengths = [
    ...kits.flatMap(({ stages }) => stages.map((stage) => stage.changeMonths)),
    ...Object.values(whatIf.changeMonths ?? {}),
    ...[cycles, whatIf].flatMap(({ wash, flowCheckDays }) => [
      flowCheckDays ?? 1,
      wash?.floorDays ?? 1,
    ]),
  ]
  if (lengths.some((length) => !(length >= 1))) throw new RangeError('a cycle takes some time')
}
