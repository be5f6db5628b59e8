/** What a filter takes out, as log reductions: bacteria, viruses, protozoa. */
export type LogReductions = { bacteria: number; viruses: number; protozoa: number }

/** Log reduction of a removal told in per cent: 99.9 is 3. */
export function logReduction(removedPercent: number): number {
  return -Math.log10(1 - removedPercent / 100)
}

/** Log reduction from counts before and after, as a laboratory reports it. */
export function logReductionOfCounts({ before, after }: { before: number; after: number }) {
  const exact = Math.log10(before / after)
  return { exact, removedPercent: (1 - after / before) * 100, reported: Math.floor(exact) }
}

const threeStar: LogReductions = { bacteria: 4, viruses: 5, protozoa: 4 }
const twoStar: LogReductions = { bacteria: 2, viruses: 3, protozoa: 2 }
const classes = ['bacteria', 'viruses', 'protozoa'] as const

/**
 * Stars of the WHO scheme for household treatment (2011). Each class must pass by itself: six logs
 * of bacteria never make up for a virus that goes through. One star passes the two-star value in
 * two classes.
 */
export function performanceStars(reductions: LogReductions): 0 | 1 | 2 | 3 {
  const passes = (target: LogReductions) =>
    classes.filter((name) => reductions[name] >= target[name]).length
  if (passes(threeStar) === classes.length) return 3
  const passed = passes(twoStar)
  if (passed === classes.length) return 2
  return passed === 2 ? 1 : 0
}

/**
 * Log reduction of all the water a household drinks when only a share of it goes through the
 * filter. The untreated tenth is what counts: no filter does better than -log10 of it.
 */
export function effectiveLogReduction({
  logReduction: treated,
  treatedShare,
}: {
  logReduction: number
  treatedShare: number
}): number {
  return -Math.log10(1 - treatedShare + treatedShare * 10 ** -treated)
}
