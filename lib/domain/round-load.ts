/** What falls due in a time, and how many texts ask for what of it. */
export type Load = {
  washes: number
  changes: Record<1 | 2 | 3, number>
  flowChecks: number
  texts: number
  asks: Record<'wash-due' | 'change-due' | 'flow-check', number>
}

type LoadOn = Load & { on: string }

/** Nothing due. */
export function emptyLoad(): Load {
  return {
    washes: 0,
    changes: { 1: 0, 2: 0, 3: 0 },
    flowChecks: 0,
    texts: 0,
    asks: { 'wash-due': 0, 'change-due': 0, 'flow-check': 0 },
  }
}

function sumOf(one: Load, other: Load): Load {
  const changes = (position: 1 | 2 | 3) => one.changes[position] + other.changes[position]
  const asks = (moment: keyof Load['asks']) => one.asks[moment] + other.asks[moment]
  return {
    washes: one.washes + other.washes,
    changes: { 1: changes(1), 2: changes(2), 3: changes(3) },
    flowChecks: one.flowChecks + other.flowChecks,
    texts: one.texts + other.texts,
    asks: {
      'wash-due': asks('wash-due'),
      'change-due': asks('change-due'),
      'flow-check': asks('flow-check'),
    },
  }
}

/** All of it together. */
export function totalOf(loads: readonly Load[]): Load {
  return loads.reduce(sumOf, emptyLoad())
}

/** Two plans of the same days, of other kits, as one. */
export function bothPlans(one: readonly LoadOn[], other: readonly LoadOn[]): LoadOn[] {
  return one.map((day, ahead) => ({ on: day.on, ...sumOf(day, other[ahead] ?? emptyLoad()) }))
}

/** Seven days at a time, from the first on; `on` is the first day of each week. */
export function weeksOf(plan: readonly LoadOn[]): LoadOn[] {
  const first = plan.filter((_, ahead) => ahead % 7 === 0)
  return first.map(({ on }, week) => ({ on, ...totalOf(plan.slice(week * 7, week * 7 + 7)) }))
}

/** Parts a plan asks for, stage by stage: one for each change. */
export function partsOf(plan: readonly Load[]): Record<1 | 2 | 3, number> {
  return totalOf(plan).changes
}

/** How the busiest day compares with an even load: 1 when all days are alike, null for no texts. */
export function peakOf(
  plan: readonly LoadOn[],
): { on: string; texts: number; times: number } | null {
  const total = totalOf(plan).texts
  const peak = plan.reduce<LoadOn | null>(
    (most, day) => (most === null || day.texts > most.texts ? day : most),
    null,
  )
  if (peak === null || total === 0) return null
  return { on: peak.on, texts: peak.texts, times: peak.texts / (total / plan.length) }
}

/**
 * What the texts of a load cost, in the currency of the price: each text takes as many segments as its
 * moment's wordings do on the average.
 */
export function costOfTexts(
  { asks }: Load,
  { segments, pricePerSegment }: { segments: Load['asks']; pricePerSegment: number },
): number {
  const all =
    asks['wash-due'] * segments['wash-due'] +
    asks['change-due'] * segments['change-due'] +
    asks['flow-check'] * segments['flow-check']
  return all * pricePerSegment
}
