import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { washDefaults } from '@/lib/domain/cycle'
import { addDays } from '@/lib/domain/day'
import { planAhead, type Due, type KitAhead } from '@/lib/domain/round'
import { textFor } from '@/lib/domain/round-text'
import { bothPlans, costOfTexts, totalOf, weeksOf } from '@/lib/domain/round-load'

const from = '2025-06-01'
const cycles = { wash: washDefaults, flowCheckDays: 30 }

const day = fc.integer({ min: -40, max: 80 }).map((ahead) => addDays(from, ahead))
const anyKit: fc.Arbitrary<KitAhead> = fc
  .record({
    sourceClass: fc.constantFrom('clear', 'cloudy', 'very cloudy'),
    wetMonths: fc.constantFrom([], [6], [5, 6, 7, 8]),
    washCountedFrom: fc.integer({ min: -40, max: 0 }).map((ahead) => addDays(from, ahead)),
    calendarWashOn: day,
    broughtDays: fc.constantFrom(0, 0, 5),
    nextFlowCheckOn: day,
    fitted: fc.tuple(day, day, day),
  })
  .map(({ fitted, broughtDays, ...rest }) => ({
    ...rest,
    nextWashOn: addDays(rest.calendarWashOn, -broughtDays),
    stages: fitted.map((fittedOn, index) => ({
      position: (index + 1) as 1 | 2 | 3,
      fittedOn: addDays(fittedOn, -100),
      changeMonths: [1, 3, 12][index] as number,
    })),
  }))
const anyKits = fc.array(anyKit, { minLength: 1, maxLength: 4 })

describe('any plan ahead', () => {
  it('under the same cycles, named, is the plan itself', () => {
    fc.assert(
      fc.property(anyKits, (kits) => {
        const plan = planAhead({ kits, from, days: 91, cycles })
        const same = { ...cycles, changeMonths: { 1: 1, 2: 3, 3: 12 } }
        expect(planAhead({ kits, from, days: 91, cycles, whatIf: same })).toEqual(plan)
      }),
    )
  })

  it('adds up: of pages of kits, and week by week', () => {
    fc.assert(
      fc.property(anyKits, anyKits, (some, others) => {
        const planOf = (kits: KitAhead[]) => planAhead({ kits, from, days: 91, cycles })
        const all = planOf([...some, ...others])
        expect(bothPlans(planOf(some), planOf(others))).toEqual(all)
        expect(weeksOf(all).map(({ on }) => on)).toEqual(
          Array.from({ length: 13 }, (_, week) => addDays(from, week * 7)),
        )
        expect(totalOf(weeksOf(all))).toEqual(totalOf(all))
      }),
    )
  })

  it('takes the texts that the rule of one thing a text takes, were all days their own', () => {
    fc.assert(
      fc.property(anyKit, (one) => {
        for (const on of planAhead({ kits: [one], from, days: 60, cycles })) {
          let left: Due[] = [
            ...(on.washes > 0 ? [{ kind: 'wash' as const, dueOn: on.on }] : []),
            ...(on.flowChecks > 0 ? [{ kind: 'flow check' as const, dueOn: on.on }] : []),
            ...([1, 2, 3] as const)
              .filter((position) => on.changes[position] > 0)
              .map((stagePosition) => ({ kind: 'change' as const, dueOn: on.on, stagePosition })),
          ]
          const moments: string[] = []
          for (let text = textFor(left, on.on); text !== null; text = textFor(left, on.on)) {
            const said = text.due
            moments.push(text.moment)
            left = left.filter((due) => !said.includes(due))
          }
          expect(moments).toHaveLength(on.texts)
          for (const [moment, asked] of Object.entries(on.asks))
            expect(moments.filter((one) => one === moment)).toHaveLength(asked)
        }
      }),
    )
  })

  it('halves the washes of a doubled interval, give or take one a kit', () => {
    const wash = { ...washDefaults, days: { clear: 60, cloudy: 28, 'very cloudy': 14 } }
    fc.assert(
      fc.property(anyKits, (kits) => {
        const dry = kits.map((one) => ({
          ...one,
          wetMonths: [],
          calendarWashOn: from,
          nextWashOn: from,
        }))
        const now = totalOf(planAhead({ kits: dry, from, days: 364, cycles })).washes
        const other = totalOf(planAhead({ kits: dry, from, days: 364, cycles, whatIf: { wash } }))
        expect(Math.abs(other.washes - now / 2)).toBeLessThanOrEqual(kits.length)
      }),
    )
  })

  it('costs the segments that its moments take on the average', () => {
    const asks = { 'wash-due': 10, 'change-due': 4, 'flow-check': 2 }
    const segments = { 'wash-due': 1, 'change-due': 2.5, 'flow-check': 3 }
    const load = { ...totalOf([]), asks, texts: 16 }
    expect(costOfTexts(load, { segments, pricePerSegment: 0.02 })).toBeCloseTo(0.52, 12)
  })
})
