import { describe, expect, it } from 'vitest'
import { washDefaults } from '@/lib/domain/cycle'
import { planAhead, type KitAhead } from '@/lib/domain/round'
import { partsOf, peakOf } from '@/lib/domain/round-ahead'

const kit: KitAhead = {
  sourceClass: 'cloudy',
  wetMonths: [6, 7],
  lastWashOn: '2025-05-20',
  nextWashOn: '2025-05-28',
  nextFlowCheckOn: '2025-06-10',
  stages: [
    { position: 1, fittedOn: '2025-05-03', changeMonths: 1 },
    { position: 2, fittedOn: '2025-03-31', changeMonths: 3 },
    { position: 3, fittedOn: '2025-01-31', changeMonths: 12 },
  ],
}
const from = '2025-06-01'

const daysWith = (
  plan: ReturnType<typeof planAhead>,
  has: (day: (typeof plan)[number]) => number,
) => plan.filter((day) => has(day) > 0).map(({ on }) => on)

describe('the plan ahead', () => {
  const plan = planAhead({ kits: [kit], from, days: 62 })

  it('has every day once, from the first', () => {
    expect(plan).toHaveLength(62)
    expect(plan[0]?.on).toBe('2025-06-01')
    expect(plan.at(-1)?.on).toBe('2025-08-01')
  })

  it('lays the overdue on the first day and goes on from there', () => {
    expect(daysWith(plan, (day) => day.washes)).toEqual([
      '2025-06-01',
      '2025-06-10',
      '2025-06-19',
      '2025-06-28',
      '2025-07-07',
      '2025-07-16',
      '2025-07-25',
    ])
  })

  it('changes stages by their own months, clamped', () => {
    expect(daysWith(plan, (day) => day.changes[1])).toEqual(['2025-06-03', '2025-07-03'])
    expect(daysWith(plan, (day) => day.changes[2])).toEqual(['2025-06-30'])
    expect(daysWith(plan, (day) => day.changes[3])).toEqual([])
    expect(partsOf(plan)).toEqual({ 1: 2, 2: 1, 3: 0 })
  })

  it('tells a household once a day', () => {
    const tenth = plan.find(({ on }) => on === '2025-06-10')
    expect(tenth).toMatchObject({ washes: 1, flowChecks: 1, texts: 1 })
    expect(daysWith(plan, (day) => day.flowChecks)).toEqual(['2025-06-10', '2025-07-10'])
  })

  it('shows what other cycles would do', () => {
    const whatIf = {
      wash: { ...washDefaults, days: { ...washDefaults.days, cloudy: 30 }, wetShare: 1 },
      changeMonths: { 1: 2 },
      flowCheckDays: 5,
    } as const
    const other = planAhead({ kits: [kit], from, days: 62, whatIf })
    expect(daysWith(other, (day) => day.washes)).toEqual(['2025-06-19', '2025-07-19'])
    expect(daysWith(other, (day) => day.changes[1])).toEqual(['2025-07-03'])
    expect(daysWith(other, (day) => day.changes[2])).toEqual(['2025-06-30'])
    expect(daysWith(other, (day) => day.flowChecks)).toHaveLength(11)
  })

  it('adds up over kits, and finds the wave', () => {
    const many = planAhead({ kits: [kit, kit, { ...kit, stages: [] }], from, days: 10 })
    expect(many[0]).toEqual({
      on: from,
      washes: 3,
      changes: { 1: 0, 2: 0, 3: 0 },
      flowChecks: 0,
      texts: 3,
    })
    // Three texts on the first day, two changes on the third, three washes and checks on the tenth.
    expect(peakOf(many)).toEqual({ on: from, times: 3 / 0.8 })
  })

  it.each([
    { changeMonths: { 1: 0 } },
    { flowCheckDays: 0 },
    { wash: { ...washDefaults, floorDays: 0 } },
  ])('refuses a cycle of no length rather than turn for ever: %o', (whatIf) => {
    expect(() => planAhead({ kits: [kit], from, days: 5, whatIf })).toThrow(RangeError)
  })

  it('takes a kit’s own cycle to task as well', () => {
    const stages = [{ position: 1, fittedOn: from, changeMonths: 0 }] as const
    expect(() => planAhead({ kits: [{ ...kit, stages }], from, days: 5 })).toThrow(RangeError)
  })

  it('has no peak with nothing to do, and no flow check where none is due', () => {
    expect(peakOf(planAhead({ kits: [], from, days: 3 }))).toBeNull()
    expect(peakOf([])).toBeNull()
    const { nextFlowCheckOn: _, ...unchecked } = kit
    const unasked = planAhead({ kits: [unchecked], from, days: 62 })
    expect(daysWith(unasked, (day) => day.flowChecks)).toEqual([])
  })
})
