import { lintTable } from './advice-lint'
import {
  adviceTables,
  type AdviceTable,
  type BleachTable,
  type BoilTable,
  type DoseTable,
} from './advice-tables'

export { lintTable } from './advice-lint'
export { adviceTables, type AdviceTable } from './advice-tables'

/** What must go with an advice, whatever its wording. */
export type Caution =
  'after the filter' | 'never mix' | 'scald' | 'cool covered' | 'not for fuel or chemicals'

export type Drink =
  | { method: 'boil'; minutes: number }
  | {
      method: 'bleach'
      waitMinutes: number
      doses: readonly { measure: string; litres: number; drops: number }[]
    }
  | { method: 'dose'; milligramsPerLitre: number; useWithinHours: number }

export type DrinkAdvice =
  | { ok: true; drink: Drink; text: string; cautions: readonly Caution[]; source: string }
  | {
      ok: false
      reason:
        | 'no such table'
        | 'table is faulty'
        | 'strength not told'
        | 'strength not in the table'
        | 'scented'
    }

export type DrinkQuestion = {
  tableId: string
  altitudeMetres: number
  cloudy: boolean
  /** Strength on the bleach's label; needed by bleach tables only. */
  bleachPercent?: number
  scented?: boolean
  /** The tables to choose from; the published ones unless a programme has its own. */
  tables?: readonly AdviceTable[]
}

/**
 * What a household without a working filter may drink, read from the table the programme chose.
 * What the table does not print is refused, never worked out. `text` is plain English for staff;
 * households get the approved wording.
 */
export function drinkAdvice(question: DrinkQuestion): DrinkAdvice {
  const table = (question.tables ?? adviceTables).find(({ id }) => id === question.tableId)
  if (table === undefined) return { ok: false, reason: 'no such table' }
  if (lintTable(table).length > 0) return { ok: false, reason: 'table is faulty' }
  switch (table.kind) {
    case 'boil':
      return boilAdvice(table, question.altitudeMetres)
    case 'bleach':
      return bleachAdvice(table, question)
    case 'dose':
      return doseAdvice(table, question.cloudy)
  }
}

function boilAdvice({ rows, source }: BoilTable, altitudeMetres: number): DrinkAdvice {
  // Written so that an altitude nobody knows (NaN) gets the longest boil.
  const passed = rows.filter(({ aboveMetres }) => !(altitudeMetres <= aboveMetres))
  const minutes = Math.max(...passed.map((row) => row.minutes))
  const held =
    minutes === 0
      ? 'Bring the water to a rolling boil.'
      : `Keep the water at a rolling boil for ${minutes} ${minutes === 1 ? 'minute' : 'minutes'}.`
  return {
    ok: true,
    drink: { method: 'boil', minutes },
    text: `${held} Let it cool with a lid on. Hot water scalds: keep children away. Boiling does not remove fuel or chemicals.`,
    cautions: ['scald', 'cool covered', 'not for fuel or chemicals'],
    source,
  }
}

const chlorineCautions = ['after the filter', 'never mix', 'not for fuel or chemicals'] as const
const chlorineText =
  'Put it into the clean vessel, after the filter. Never mix bleach with acid, ammonia or other cleaners. Chlorine does not remove fuel or chemicals.'

function bleachAdvice(table: BleachTable, question: DrinkQuestion): DrinkAdvice {
  const { bleachPercent: percent, cloudy, scented } = question
  if (scented) return { ok: false, reason: 'scented' }
  if (percent === undefined) return { ok: false, reason: 'strength not told' }
  const rows = table.rows.filter((row) => percent >= row.fromPercent && percent <= row.toPercent)
  if (rows.length === 0) return { ok: false, reason: 'strength not in the table' }
  const doses = rows.map(({ measure, litres, clearDrops, cloudyDrops }) => ({
    measure,
    litres,
    drops: cloudy ? cloudyDrops : clearDrops,
  }))
  const told = doses.map(({ measure, drops }) => `${drops} drops to ${measure}`).join(', or ')
  return {
    ok: true,
    drink: { method: 'bleach', waitMinutes: table.waitMinutes, doses },
    text: `Unscented bleach of ${percent} %: ${told}. Stir and wait ${table.waitMinutes} minutes. ${chlorineText}`,
    cautions: chlorineCautions,
    source: table.source,
  }
}

function doseAdvice(table: DoseTable, cloudy: boolean): DrinkAdvice {
  const dose = cloudy ? table.cloudy : table.clear
  return {
    ok: true,
    drink: { method: 'dose', ...dose },
    text: `Chlorine of ${dose.milligramsPerLitre} mg a litre; use within ${dose.useWithinHours} hours. ${chlorineText}`,
    cautions: chlorineCautions,
    source: table.source,
  }
}
