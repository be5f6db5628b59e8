/** A time in which a household had no safe water; `to` is null while it lasts. */
export type DrySpell = { householdId: string; people: number; from: number; to: number | null }

/** A household nobody has heard from, with its people: it may be dry and none would know. */
export type SilentHouse = { householdId: string; people: number }

/**
 * A count of people. `low` is what is known; `high` adds everybody in the silent houses, of whom
 * nothing is known: a bound, not a statistical interval.
 */
export type PeopleCount = {
  households: number
  people: number
  silentHouseholds: number
  silentPeople: number
  low: number
  high: number
  n: number
  cutOffAt: number
}

const day = 86_400_000

/** People without safe water at the cut-off, of `n` households; the silent as a row of their own. */
export function withoutWater({
  spells,
  silent,
  n,
  cutOffAt,
}: {
  spells: readonly DrySpell[]
  silent: readonly SilentHouse[]
  n: number
  cutOffAt: number
}): PeopleCount {
  const dry = new Map<string, number>()
  for (const { householdId, people, from, to } of spells) {
    if (from <= cutOffAt && (to === null || to > cutOffAt)) dry.set(householdId, people)
  }
  const quiet = new Map(silent.map(({ householdId, people }) => [householdId, people]))
  for (const householdId of dry.keys()) quiet.delete(householdId)
  const people = sum([...dry.values()])
  const silentPeople = sum([...quiet.values()])
  return {
    households: dry.size,
    people,
    silentHouseholds: quiet.size,
    silentPeople,
    low: people,
    high: people + silentPeople,
    n,
    cutOffAt,
  }
}

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0)
}

/**
 * Person-days without safe water between two instants: people times days, spells cut at both ends,
 * what overlaps within one household counted once.
 */
export function personDays(
  spells: readonly DrySpell[],
  { from, to }: { from: number; to: number },
): number {
  const inOrder = spells
    .map((spell) => ({
      ...spell,
      from: Math.max(spell.from, from),
      to: Math.min(spell.to ?? to, to),
    }))
    .filter((spell) => spell.to > spell.from)
    .sort((one, other) => one.from - other.from)
  const countedTo = new Map<string, number>()
  let total = 0
  for (const spell of inOrder) {
    const start = Math.max(spell.from, countedTo.get(spell.householdId) ?? from)
    if (spell.to <= start) continue
    total += (spell.people * (spell.to - start)) / day
    countedTo.set(spell.householdId, spell.to)
  }
  return total
}
