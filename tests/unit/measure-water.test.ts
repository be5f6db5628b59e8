import { describe, expect, it } from 'vitest'
import { personDays, withoutWater, type DrySpell } from '@/lib/domain/measure-water'

const day = 86_400_000
const spell = (rest: Partial<DrySpell>): DrySpell => ({
  householdId: 'a',
  people: 6,
  from: 10 * day,
  to: null,
  ...rest,
})

describe('people without safe water', () => {
  const count = (spells: DrySpell[], silent = [{ householdId: 's', people: 4 }]) =>
    withoutWater({ spells, silent, n: 100, cutOffAt: 20 * day })

  it('are those of the spells that last, the silent beside them and not among them', () => {
    expect(
      count([
        spell({}),
        spell({ householdId: 'b', people: 3, to: 20 * day + 1 }),
        spell({ householdId: 'c', to: 20 * day }),
        spell({ householdId: 'd', from: 20 * day + 1 }),
      ]),
    ).toEqual({
      households: 2,
      people: 9,
      silentHouseholds: 1,
      silentPeople: 4,
      low: 9,
      high: 13,
      n: 100,
      cutOffAt: 20 * day,
    })
  })

  it('are counted once, also if their house is silent or its spells overlap', () => {
    const found = count([
      spell({ householdId: 's', people: 4 }),
      spell({ householdId: 's', people: 4 }),
    ])
    expect(found).toMatchObject({ households: 1, people: 4, silentHouseholds: 0, high: 4 })
  })
})

describe('person-days without safe water', () => {
  const july = { from: 10 * day, to: 40 * day }

  it('are people times days, cut at both ends', () => {
    expect(personDays([spell({ to: 12 * day })], july)).toBe(12)
    expect(personDays([spell({ from: 0, to: 12 * day })], july)).toBe(12)
    expect(personDays([spell({ from: 39.5 * day, to: 90 * day })], july)).toBe(3)
    expect(personDays([spell({ from: 39 * day })], july)).toBe(6)
    expect(personDays([spell({ from: 0, to: 9 * day })], july)).toBe(0)
    expect(personDays([spell({ from: 50 * day })], july)).toBe(0)
    expect(personDays([], july)).toBe(0)
  })

  it('count an hour of a household once, however many troubles it had', () => {
    const both = [
      spell({ from: 12 * day, to: 16 * day }),
      spell({ to: 14 * day }),
      spell({ from: 13 * day, to: 15 * day }),
    ]
    expect(personDays(both, july)).toBe(36)
    const others = [spell({ to: 12 * day }), spell({ householdId: 'b', to: 12 * day })]
    expect(personDays(others, july)).toBe(24)
  })
})
