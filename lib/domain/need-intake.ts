/** Who drinks, for the sums of a day's intake. */
export type Drinker = 'woman' | 'man' | 'pregnant woman' | 'nursing woman' | 'child of 4 to 8'

/**
 * Adequate total water, litres a day, food's water included. EFSA Journal 2010;8(3):1459.
 * Temperate weather and moderate work: a floor to compare with, not what a hot valley drinks.
 */
const adequateLitres: Record<Drinker, number> = {
  woman: 2.0,
  man: 2.5,
  'pregnant woman': 2.0 + 0.3,
  'nursing woman': 2.0 + 0.7,
  'child of 4 to 8': 1.6,
}

/** Adequate total water of a household, litres a day. */
export function adequateIntake(drinkers: readonly Drinker[]): number {
  return drinkers.reduce((sum, drinker) => sum + adequateLitres[drinker], 0)
}

/** Sphere Handbook, litres a person and day: to survive (drinking and food), and in all. */
const survivalLitres = { low: 2.5, high: 3 }
const basicLitres = { low: 7.5, high: 15 }

/** The Sphere range of litres a day for a household: what it must drink, and basic needs in all. */
export function humanitarianRange(people: number) {
  const forPeople = ({ low, high }: { low: number; high: number }) => ({
    low: low * people,
    high: high * people,
  })
  return { survival: forPeople(survivalLitres), basic: forPeople(basicLitres) }
}
