/*
 * CHECKS section 15: the ladder, effective use, and what people say.
 * [C] read in a copy of the source · [D] by definition.
 */
import { describe, expect, it } from 'vitest'
import { kitsFlowing, type Evidence } from '@/lib/domain/measure-kits'
import {
  effectiveUse,
  serviceLevel,
  type TargetedHouse,
  type WaterSource,
} from '@/lib/domain/measure-ladder'

// WHO/UNICEF Joint Monitoring Programme, drinking-water ladder [C]
describe('the ladder', () => {
  const tap: WaterSource = {
    kind: 'improved',
    onPremises: true,
    availableWhenNeeded: true,
    freeOfContamination: true,
    roundTripMinutes: 0,
  }

  it.each([
    [tap, 'safely managed'],
    [{ ...tap, availableWhenNeeded: false }, 'basic'],
    [{ ...tap, freeOfContamination: false }, 'basic'],
    [{ ...tap, onPremises: false, roundTripMinutes: 30 }, 'basic'],
    [{ ...tap, onPremises: false, roundTripMinutes: 31 }, 'limited'],
    [{ ...tap, kind: 'unimproved' }, 'unimproved'],
    [{ ...tap, kind: 'surface water' }, 'surface water'],
  ] as const)('%o stands on %s', (source, rung) => {
    expect(serviceLevel(source)).toBe(rung)
  })

  it('has no rung for a filter at home: the source alone decides', () => {
    const well: WaterSource = { ...tap, onPremises: false, roundTripMinutes: 45 }
    const withFilter = { ...well, filter: 'flowing' }
    expect(serviceLevel(withFilter)).toBe(serviceLevel(well))
  })
})

// Lantagne and Clasen 2012, effective use [D by definition]
describe('effective use', () => {
  const house = (rest: Partial<TargetedHouse>): TargetedHouse => ({
    sourceCount: 0,
    treats: false,
    treatedCount: null,
    ...rest,
  })
  const times = (count: number, made: TargetedHouse) => Array.from({ length: count }, () => made)

  it('is of everybody targeted: 30 of 100', () => {
    const targeted = [
      ...times(30, house({ sourceCount: 12, treats: true, treatedCount: 0 })),
      ...times(5, house({ sourceCount: 12, treats: true, treatedCount: 3 })),
      ...times(25, house({ sourceCount: 12 })),
      ...times(5, house({ treats: true, treatedCount: 0 })), // treats what was clean already
      ...times(35, house({})),
    ]
    const contaminated = targeted.filter(({ sourceCount }) => (sourceCount ?? 0) >= 1)
    expect([targeted.length, contaminated.length]).toEqual([100, 60])
    expect(targeted.filter(({ treats }) => treats)).toHaveLength(40)
    expect(effectiveUse(targeted)).toMatchObject({ count: 30, n: 100, share: 0.3 })
  })

  it('is not granted to what nobody tested, nor at 1 CFU', () => {
    const untested = [
      house({ sourceCount: null, treats: true, treatedCount: 0 }),
      house({ sourceCount: 12, treats: true, treatedCount: null }),
      house({ sourceCount: 1, treats: true, treatedCount: 1 }),
      house({ sourceCount: 1, treats: false, treatedCount: 0 }),
    ]
    expect(effectiveUse(untested).count).toBe(0)
  })
})

// Rwanda at 30 months, PLOS Water 2023: 84.3 % said they used it, 59.4 % were seen to [C]
describe('what is said and what is seen', () => {
  it('stand in two columns and are never added up', () => {
    const kitIds = Array.from({ length: 1000 }, (_, index) => `kit-${index}`)
    const word = (known: Evidence['known'], working: number) =>
      kitIds.map((kitId, index): Evidence => ({
        kitId,
        known,
        flowing: index < working,
        on: '2023-06-01',
      }))
    const { columns, silent } = kitsFlowing({
      kitIds,
      evidence: [...word('said', 843), ...word('seen', 594)],
      cutOffOn: '2023-06-30',
    })
    expect(columns.said.flowing.share).toBe(0.843)
    expect(columns.seen.flowing.share).toBe(0.594)
    expect(columns.measured).toMatchObject({ unknown: 1000, flowing: { count: 0 } })
    expect(columns.said.flowing.low).toBeGreaterThan(columns.seen.flowing.high)
    expect(silent.count).toBe(0)
  })
})
