import { describe, expect, it } from 'vitest'
import { washDefaults } from '@/lib/domain/cycle'
import { planAhead, type KitAhead } from '@/lib/domain/round'
import { partsOf, peakOf, totalOf } from '@/lib/domain/round-load'

const kit: KitAhead = {
  sourceClass: 'cloudy',
  wetMonths: [6, 7],
  washCountedFrom: '2025-05-14',
  calendarWashOn: '2025-05-28',
  nextWashOn: '2025-05-28',
  nextFlowCheckOn: '2025-06-10',
  stages: [
    { position: 1, fittedOn: '2025-05-03', changeMonths: 1 },
    { position: 2, fittedOn: '2025-03-31', changeMonths: 3 },
    { position: 3, fittedOn: '2025-01-31', changeMonths: 12 },
  ],
}
const from = '2025-06-01'
const cycles = { wash: washDefaults, flowCheckDays: 30 }

const daysWith = (
  plan: ReturnType<typeof planAhead>,
  has: (day: (typeof plan)[number]) => number,
) => plan.filter((day) => has(day) > 0).map(({ on }) => on)

const noAsks = { 'wash-due': 0, 'change-due': 0, 'flow-check': 0 }

describe('the plan ahead', () => {
  const planned = () => planAhead({ kits: [kit], from, days: 62, cycles })

  it('has every day once, from the first', () => {
    const plan = planned()
    expect(plan).toHaveLength(62)
    expect(plan[0]?.on).toBe('2025-06-01')
    expect(plan.at(-1)?.on).toBe('2025-08-01')
  })

  it('lays the overdue on the first day and goes on from there', () => {
    expect(daysWith(planned(), (day) => day.washes)).toEqual([
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
    const plan = planned()
    expect(daysWith(plan, (day) => day.changes[1])).toEqual(['2025-06-03', '2025-07-03'])
    expect(daysWith(plan, (day) => day.changes[2])).toEqual(['2025-06-30'])
    expect(daysWith(plan, (day) => day.changes[3])).toEqual([])
    expect(partsOf(plan)).toEqual({ 1: 2, 2: 1, 3: 0 })
  })

  it('takes a text for each thing that one text cannot ask', () => {
    const plan = planned()
    const tenth = plan.find(({ on }) => on === '2025-06-10')
    expect(tenth).toMatchObject({ washes: 1, flowChecks: 1, texts: 2 })
    expect(tenth?.asks).toEqual({ 'wash-due': 1, 'change-due': 0, 'flow-check': 1 })
    expect(daysWith(plan, (day) => day.flowChecks)).toEqual(['2025-06-10', '2025-07-10'])
  })

  it('washes oftener in a wet month than in a dry one, by the month of each wash', () => {
    const dry = planAhead({ kits: [{ ...kit, wetMonths: [7] }], from, days: 50 })
    expect(daysWith(dry, (day) => day.washes)).toEqual([
      '2025-06-01',
      '2025-06-15',
      '2025-06-29',
      '2025-07-13',
    ])
  })

  it('reaches to its last day', () => {
    const upTo = (on: string) => planAhead({ kits: [kit], from: on, days: 1 })[0]
    expect(upTo('2025-05-28')?.washes).toBe(1)
    expect(upTo('2025-06-03')?.changes[1]).toBe(1)
    expect(upTo('2025-06-10')?.flowChecks).toBe(1)
    const twoDays = planAhead({ kits: [kit], from: '2025-05-27', days: 2 })
    expect(twoDays.map(({ washes }) => washes)).toEqual([0, 1])
    const changes = planAhead({ kits: [kit], from: '2025-06-02', days: 2 })
    expect(changes.map((day) => day.changes[1])).toEqual([0, 1])
    const checks = planAhead({ kits: [kit], from: '2025-06-09', days: 2 })
    expect(checks.map(({ flowChecks }) => flowChecks)).toEqual([0, 1])
  })

  it('shows what other cycles would do', () => {
    const whatIf = {
      wash: { ...washDefaults, days: { ...washDefaults.days, cloudy: 30 }, wetShare: 1 },
      changeMonths: { 1: 2 },
      flowCheckDays: 5,
    } as const
    const other = planAhead({ kits: [kit], from, days: 62, cycles, whatIf })
    // The wash that stands on 28 May is due 16 days later, as 30 days are 16 more than 14.
    expect(daysWith(other, (day) => day.washes)).toEqual(['2025-06-13', '2025-07-13'])
    expect(daysWith(other, (day) => day.changes[1])).toEqual(['2025-07-03'])
    expect(daysWith(other, (day) => day.changes[2])).toEqual(['2025-06-30'])
    // 25 days earlier is before the first day: so on it, and every fifth from there.
    expect(daysWith(other, (day) => day.flowChecks)).toHaveLength(13)
  })

  it('puts off no wash that the trend brought forward, and brings it further where the cycle does', () => {
    const brought = { ...kit, calendarWashOn: '2025-06-20', nextWashOn: '2025-06-12' }
    const first = (cloudy: number) => {
      const wash = { ...washDefaults, days: { ...washDefaults.days, cloudy } }
      const plan = planAhead({ kits: [brought], from, days: 62, cycles, whatIf: { wash } })
      return daysWith(plan, (day) => day.washes)[0]
    }
    expect([14, 30, 10, 5].map(first)).toEqual([
      '2025-06-12',
      '2025-06-12',
      '2025-06-12',
      '2025-06-11',
    ])
  })

  it('adds up over kits, and finds the wave', () => {
    const kits = [kit, kit, { ...kit, stages: [] }]
    const many = planAhead({ kits, from, days: 10, cycles })
    expect(many[0]).toEqual({
      on: from,
      washes: 3,
      changes: { 1: 0, 2: 0, 3: 0 },
      flowChecks: 0,
      texts: 3,
      asks: { 'wash-due': 3, 'change-due': 0, 'flow-check': 0 },
    })
    // Three texts on the first day, two changes on the third, three washes and three checks on the tenth.
    expect(peakOf(many)).toEqual({ on: '2025-06-10', texts: 6, times: 6 / 1.1 })
  })

  it.each([
    { changeMonths: { 1: 0 } },
    { flowCheckDays: 0 },
    { changeMonths: { 2: Number.NaN } },
    { wash: { ...washDefaults, floorDays: 0 } },
  ])('refuses a cycle of no length rather than turn for ever: %o', (whatIf) => {
    expect(() => planAhead({ kits: [kit], from, days: 5, whatIf })).toThrow(
      new RangeError('a cycle takes some time'),
    )
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

  it('cares for a kit that no text reaches, without a text', () => {
    const silent = planAhead({ kits: [{ ...kit, texted: false }], from, days: 62, cycles })
    expect(totalOf(silent)).toEqual({ ...totalOf(planned()), texts: 0, asks: noAsks })
  })
})
