const cycles = {
  washClear: ['Wash in clear water', 'days'],
  washCloudy: ['Wash in cloudy water', 'days'],
  washVeryCloudy: ['Wash in very cloudy water', 'days'],
  wetPercent: ['Left of that in a wet month', '%'],
  change1: ['Change of cloth', 'months'],
  change2: ['Change of carbon', 'months'],
  change3: ['Change of fibre', 'months'],
  flowCheckDays: ['Flow check', 'days'],
} as const

/** A cycle as the rounds page tries it, and how long it is; null where kit models differ. */
export type CycleName = keyof typeof cycles
export type CycleLengths = Record<CycleName, number | null>

/** The cycles that are other than they stand, in words: `Wash in clear water: 60 days instead of 30`. */
export function changedCycles(
  standing: CycleLengths,
  tried: Partial<Record<CycleName, number | undefined>>,
): string[] {
  return (Object.keys(cycles) as CycleName[]).flatMap((name) => {
    const [words, unit] = cycles[name]
    const [was, length] = [standing[name], tried[name]]
    if (length === undefined || length === was) return []
    return [`${words}: ${length} ${unit} instead of ${was ?? 'what each kit model has'}`]
  })
}
