import { waterDensity, waterViscosity } from './flow-water'

/*
 * Water through a filter by its own weight, in SI units. Used to simulate a season, and to show
 * that the rules of thumb elsewhere are the physics.
 */

const gravity = 9.80665 // m/s², standard

/** Pressure at the foot of a column of water, Pa. */
export function headPressure({ headMetres, celsius }: { headMetres: number; celsius: number }) {
  return waterDensity(celsius) * gravity * headMetres
}

/** A filter's resistance in 1/m³, from one reading: pressure over viscosity times flow (Darcy). */
export function resistanceOf({
  litres,
  seconds,
  headMetres,
  celsius,
}: {
  litres: number
  seconds: number
  headMetres: number
  celsius: number
}): number {
  const cubicMetresPerSecond = litres / 1000 / seconds
  return headPressure({ headMetres, celsius }) / (waterViscosity(celsius) * cubicMetresPerSecond)
}

/** Flow in m³/s that a head drives through a resistance of 1/m³. */
export function gravityFlow({
  resistance,
  headMetres,
  celsius,
}: {
  resistance: number
  headMetres: number
  celsius: number
}): number {
  return headPressure({ headMetres, celsius }) / (waterViscosity(celsius) * resistance)
}

/** A container of straight walls that empties through a filter. */
export type Container = { squareMetres: number; resistance: number; celsius: number }

/** Seconds in which the head falls to 1/e of itself: A·µ·R / (ρ·g). */
function emptyingSeconds({ squareMetres, resistance, celsius }: Container): number {
  return (squareMetres * waterViscosity(celsius) * resistance) / (waterDensity(celsius) * gravity)
}

/** Seconds in which the head falls from one height to another. */
export function fallingHeadSeconds(
  container: Container,
  { fromMetres, toMetres }: { fromMetres: number; toMetres: number },
): number {
  return emptyingSeconds(container) * Math.log(fromMetres / toMetres)
}

/** The head left after some seconds. */
export function headAfter(
  container: Container,
  { fromMetres, seconds }: { fromMetres: number; seconds: number },
): number {
  return fromMetres * Math.exp(-seconds / emptyingSeconds(container))
}

/** Mean flow over a fall of the head, from the flows at its ends: their logarithmic mean. */
export function meanFlow(first: number, last: number): number {
  return first === last ? first : (first - last) / Math.log(first / last)
}

/** Hydraulic conductivity from a falling-head test, in the unit of length over the unit of time. */
export function fallingHeadConductivity({
  standpipeArea,
  sampleArea,
  sampleLength,
  fromHead,
  toHead,
  time,
}: {
  standpipeArea: number
  sampleArea: number
  sampleLength: number
  fromHead: number
  toHead: number
  time: number
}): number {
  return ((standpipeArea * sampleLength) / (sampleArea * time)) * Math.log(fromHead / toHead)
}

/**
 * Cake filtration at constant pressure: the straight line of t/V over V by least squares gives the
 * specific cake resistance (m/kg) and the resistance of the medium (1/m).
 */
export function fitCake(
  run: readonly { cubicMetres: number; seconds: number }[],
  conditions: {
    pascals: number
    squareMetres: number
    solidsPerCubicMetre: number
    viscosity: number
  },
): { cakeResistance: number; mediumResistance: number } {
  const points = run.map(({ cubicMetres, seconds }) => ({
    x: cubicMetres,
    y: seconds / cubicMetres,
  }))
  const meanX = points.reduce((sum, { x }) => sum + x, 0) / points.length
  const meanY = points.reduce((sum, { y }) => sum + y, 0) / points.length
  const sxx = points.reduce((sum, { x }) => sum + (x - meanX) ** 2, 0)
  const sxy = points.reduce((sum, { x, y }) => sum + (x - meanX) * (y - meanY), 0)
  const slope = sxy / sxx
  const intercept = meanY - slope * meanX
  const { pascals, squareMetres, solidsPerCubicMetre, viscosity } = conditions
  return {
    cakeResistance: (2 * slope * squareMetres ** 2 * pascals) / (viscosity * solidsPerCubicMetre),
    mediumResistance: (intercept * squareMetres * pascals) / viscosity,
  }
}

export type FoulingLaw = 'complete' | 'standard' | 'intermediate' | 'cake'

/**
 * Flow left after fouling for `time` under one of Hermia's four laws (1982), from `first` at a
 * `rate` per unit of that time.
 */
export function fouledFlow({
  law,
  first,
  rate,
  time,
}: {
  law: FoulingLaw
  first: number
  rate: number
  time: number
}): number {
  const done = rate * time
  switch (law) {
    case 'complete':
      return first * Math.exp(-done)
    case 'standard':
      return first / (1 + done / 2) ** 2
    case 'intermediate':
      return first / (1 + done)
    case 'cake':
      return first / Math.sqrt(1 + 2 * done)
  }
}

const surfaceTension = 0.07275 // N/m, water against air at 20 °C

/**
 * Pressure in Pa that pushes air through a wetted pore (Young and Laplace, 20 °C, fully wetted).
 * Far above what a hand can do for a sound fibre: steady bubbles at hand pressure mean a hole.
 * No bubbles prove nothing.
 */
export function bubblePoint(poreMicrometres: number): number {
  return (4 * surfaceTension) / (poreMicrometres * 1e-6)
}
