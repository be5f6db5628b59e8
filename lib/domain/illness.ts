const DAY = 86_400_000

/** Two houses of one area ill within this many days is something the coordinator must hear of. */
const togetherDays = 7

/**
 * True if another house of the area fell ill within seven days before now. Instants in epoch milliseconds.
 * It names no cause: the local authority looks into that.
 */
export function fellIllTogether(otherHouses: readonly number[], now: number): boolean {
  return otherHouses.some((at) => at <= now && now - at <= togetherDays * DAY)
}
