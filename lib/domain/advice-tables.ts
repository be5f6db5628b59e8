/*
 * Published tables of what to drink while a filter is out of service, copied as printed. Nothing
 * in them is computed and no two are mixed: a programme chooses one and its source is shown.
 */

type Published = {
  id: string
  name: string
  /** Who published it and where, as shown to staff. */
  source: string
}

/** Minutes at a rolling boil; the row with the highest `aboveMetres` that is passed counts. */
export type BoilTable = Published & {
  kind: 'boil'
  rows: readonly { aboveMetres: number; minutes: number }[]
}

/** One printed line: drops of household bleach of a strength, for one measure of water. */
export type DropRow = {
  measure: string
  litres: number
  fromPercent: number
  toPercent: number
  clearDrops: number
  cloudyDrops: number
}

export type BleachTable = Published & {
  kind: 'bleach'
  waitMinutes: number
  rows: readonly DropRow[]
}

/** A programme's own chlorine doses, for those who are given a measured solution. */
export type DoseTable = Published & {
  kind: 'dose'
  clear: { milligramsPerLitre: number; useWithinHours: number }
  cloudy: { milligramsPerLitre: number; useWithinHours: number }
}

export type AdviceTable = BoilTable | BleachTable | DoseTable

const metresPerFoot = 0.3048
const litresPerGallon = 3.785411784

const gallon = { measure: '1 US gallon', litres: litresPerGallon }
const quart = { measure: '1 litre or quart', litres: 1 }
const weak = { fromPercent: 6, toPercent: 6 }
const strong = { fromPercent: 8.25, toPercent: 8.25 }

export const adviceTables: readonly AdviceTable[] = [
  {
    kind: 'boil',
    id: 'boil-who',
    name: 'Boiling, any altitude',
    source: 'WHO, Boil Water (WHO/FWC/WSH/15.02), 2015',
    rows: [{ aboveMetres: -Infinity, minutes: 0 }], // reaching the boil is enough
  },
  {
    kind: 'boil',
    id: 'boil-cdc',
    name: 'Boiling, 1 or 3 minutes',
    source: 'CDC, Making Water Safe in an Emergency',
    rows: [
      { aboveMetres: -Infinity, minutes: 1 },
      { aboveMetres: 6500 * metresPerFoot, minutes: 3 },
    ],
  },
  {
    kind: 'boil',
    id: 'boil-epa',
    name: 'Boiling, 1 minute or 3 above 1,000 m',
    // Printed as "5,000 feet (1,000 meters)", which do not agree; the safer of the two is kept.
    source: 'EPA, Emergency Disinfection of Drinking Water',
    rows: [
      { aboveMetres: -Infinity, minutes: 1 },
      { aboveMetres: 1000, minutes: 3 },
    ],
  },
  {
    kind: 'bleach',
    id: 'bleach-cdc',
    name: 'Household bleach by the gallon',
    source: 'CDC, Making Water Safe in an Emergency',
    waitMinutes: 30,
    rows: [
      { ...gallon, fromPercent: 5, toPercent: 6, clearDrops: 8, cloudyDrops: 16 },
      { ...gallon, ...strong, clearDrops: 6, cloudyDrops: 12 },
    ],
  },
  {
    kind: 'bleach',
    id: 'bleach-epa',
    name: 'Household bleach by the litre or gallon',
    source: 'EPA, Emergency Disinfection of Drinking Water',
    waitMinutes: 30,
    rows: [
      { ...quart, ...weak, clearDrops: 2, cloudyDrops: 4 },
      { ...quart, ...strong, clearDrops: 2, cloudyDrops: 4 },
      { ...gallon, ...weak, clearDrops: 8, cloudyDrops: 16 },
      { ...gallon, ...strong, clearDrops: 6, cloudyDrops: 12 },
    ],
  },
  {
    kind: 'dose',
    id: 'dose-wilhelm',
    name: 'Measured chlorine doses',
    source: 'Wilhelm et al. 2017, Journal of Water and Health 16:112',
    clear: { milligramsPerLitre: 1.88, useWithinHours: 24 },
    cloudy: { milligramsPerLitre: 3.75, useWithinHours: 8 },
  },
]
