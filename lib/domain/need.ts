/** Who drinks from the filter. */
export type House = {
  people: number
  infant: boolean
  pregnant: boolean
  elderly: boolean
  ill: boolean
}

/** Drinking and food of a grown person, litres a day (WHO, Domestic water quantity, 2nd ed. 2020). */
export const designLitresPerPersonDay = 5.3

/** What a coordinator may set about the water a house needs. */
export type NeedSettings = {
  litresPerPersonDay: number
  /** The day's water comes in so many hours of running at most: enough. */
  enoughHours: number
  /** It comes in so many hours at most: slow; later: short. */
  slowHours: number
}

/** The hours: common practice, no source. */
export const needDefaults: NeedSettings = {
  litresPerPersonDay: designLitresPerPersonDay,
  enoughHours: 8,
  slowHours: 24,
}

/** Survival intake (Sphere Handbook); no setting may go below it. */
export const floorLitresPerPersonDay = 3

/**
 * Litres a day that the filter must give this house. `seasonExtraLitres` is what the hot season
 * adds, per person and day.
 */
export function dailyNeed({
  people,
  litresPerPersonDay = designLitresPerPersonDay,
  seasonExtraLitres = 0,
}: {
  people: number
  litresPerPersonDay?: number
  seasonExtraLitres?: number
}): number {
  const perPerson = Math.max(floorLitresPerPersonDay, litresPerPersonDay)
  return people * (perPerson + Math.max(0, seasonExtraLitres))
}

/** The flow in L/h that gives the house its day's water in the hours that are enough. */
export function neededLitresPerHour({
  litresPerDay,
  enoughHours = needDefaults.enoughHours,
}: {
  litresPerDay: number
  enoughHours?: number
}): number {
  return litresPerDay / enoughHours
}

export type Enough = { kind: 'enough' | 'slow' | 'short'; hours: number }

/**
 * Whether a flow gives the house its day's water: enough within `enoughHours` of running, slow
 * within `slowHours`, short if that is not long enough. `hours` is Infinity when nothing flows.
 */
export function enough({
  litresPerHour,
  litresPerDay,
  enoughHours = needDefaults.enoughHours,
  slowHours = needDefaults.slowHours,
}: {
  litresPerHour: number
  litresPerDay: number
  enoughHours?: number
  slowHours?: number
}): Enough {
  const hours = litresPerHour > 0 ? litresPerDay / litresPerHour : Infinity
  if (hours <= enoughHours) return { kind: 'enough', hours }
  return { kind: hours <= slowHours ? 'slow' : 'short', hours }
}
