import type { AdviceTable, BleachTable, BoilTable } from './advice-tables'

const doseSpread = 0.4
const cloudyRatio = { low: 1.8, high: 2.2 }

/**
 * What is wrong with a table; empty when it may be used. A printed table can carry a slip of the
 * pen, and a slip here is a dose somebody drinks.
 */
export function lintTable(table: AdviceTable): string[] {
  const faults = table.source.trim() === '' ? ['has no source'] : []
  switch (table.kind) {
    case 'boil':
      return [...faults, ...boilFaults(table)]
    case 'bleach':
      return [...faults, ...bleachFaults(table)]
    case 'dose': {
      const { clear, cloudy } = table
      return [
        ...faults,
        ...ratioFaults('the dose', clear.milligramsPerLitre, cloudy.milligramsPerLitre),
      ]
    }
  }
}

function boilFaults({ rows }: BoilTable): string[] {
  if (rows.length === 0) return ['has no rows']
  const faults = rows.some(({ aboveMetres }) => aboveMetres === -Infinity)
    ? []
    : ['does not say what holds at sea level']
  const byHeight = [...rows].sort((one, other) => one.aboveMetres - other.aboveMetres)
  const falls = byHeight.some(({ minutes }, index) => minutes < (byHeight[index - 1]?.minutes ?? 0))
  return falls ? [...faults, 'asks for less boiling higher up'] : faults
}

function bleachFaults({ rows, waitMinutes }: BleachTable): string[] {
  if (rows.length === 0) return ['has no rows']
  const faults = waitMinutes >= 30 ? [] : ['waits less than 30 minutes']
  for (const column of ['clearDrops', 'cloudyDrops'] as const) {
    // Drops of stronger bleach carry more: what is drunk goes with drops times strength.
    const doses = rows.map(
      (row) => (row[column] * (row.fromPercent + row.toPercent)) / 2 / row.litres,
    )
    const mean = doses.reduce((sum, dose) => sum + dose, 0) / doses.length
    if (!doses.every((dose) => Math.abs(dose - mean) <= doseSpread * mean)) {
      faults.push(
        `${column === 'clearDrops' ? 'clear' : 'cloudy'} doses a litre differ by more than 40 %`,
      )
    }
  }
  const ratios = rows.flatMap(({ measure, clearDrops, cloudyDrops }) =>
    ratioFaults(measure, clearDrops, cloudyDrops),
  )
  return [...faults, ...ratios]
}

function ratioFaults(what: string, clear: number, cloudy: number): string[] {
  const ratio = cloudy / clear
  if (ratio >= cloudyRatio.low && ratio <= cloudyRatio.high) return []
  return [`${what}: cloudy is not about twice clear`]
}
