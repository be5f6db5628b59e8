/**
 * Dynamic viscosity of liquid water at 0.1 MPa in Pa·s.
 * IAPWS SR6-08(2011), equation 7; valid from -20 °C to 110 °C.
 */
export function waterViscosity(celsius: number): number {
  const reduced = (celsius + 273.15) / 300
  return (
    1e-6 *
    (280.68 * reduced ** -1.9 +
      511.45 * reduced ** -7.7 +
      61.131 * reduced ** -19.6 +
      0.45903 * reduced ** -40)
  )
}

/* Coefficients and exponents of the specific volume, SR6-08(2011), table 1, equation 2. */
const constantTerm = 1.93763157e-2
const warmTerms = [
  [6.74458446e3, 4],
  [-2.22521604e5, 5],
  [1.00231247e8, 7],
  [-1.63552118e9, 8],
  [8.32299658e9, 9],
] as const
const coldTerms = [
  [5.78545292e-3, 1],
  [-1.53195665e-2, 2],
  [3.11337859e-2, 3],
  [-4.23546241e-2, 4],
  [3.38713507e-2, 5],
  [-1.19946761e-2, 6],
] as const

const gasConstant = 461.51805 // J/(kg K), specific for water
const pressure = 1e5 // Pa

/** Density of liquid water at 0.1 MPa in kg/m³. IAPWS SR6-08(2011), equation 2. */
export function waterDensity(celsius: number): number {
  const kelvin = celsius + 273.15
  const warm = 10 / (593 - kelvin)
  const cold = 10 / (kelvin - 232)
  let sum: number = constantTerm
  for (const [factor, power] of warmTerms) sum += factor * warm ** power
  for (const [factor, power] of coldTerms) sum += factor * cold ** power
  return 1 / (((gasConstant * 10) / pressure) * sum)
}
