/*
 * CHECKS section 1: viscosity and density of water.
 * [C] read in a copy of the source · [M] from memory of a published source · [D] by arithmetic.
 */
import { describe, expect, it } from 'vitest'
import { normalisedFlow, waterDensity, waterViscosity } from '@/lib/domain/flow'

const micropascals = (celsius: number) => waterViscosity(celsius) * 1e6
const offBy = (value: number, expected: number) => Math.abs(value / expected - 1)

describe('the viscosity of water', () => {
  // IAPWS SR6-08(2011), check values of equation 7 at 0.1 MPa [C]
  it.each([
    [298.15, 889.996774],
    [260, 3058.36075],
  ])('at %d K is the published check value', (kelvin, expected) => {
    expect(micropascals(kelvin - 273.15)).toBeCloseTo(expected, 5)
  })

  // IAPWS SR6-08(2011), equation 7, worked out to a table [D], ±0.01 %
  it.each([
    [0, 1791.78],
    [5, 1518.2],
    [10, 1305.9],
    [15, 1137.55],
    [20, 1001.57],
    [25, 890.0],
    [30, 797.21],
    [35, 719.12],
    [40, 652.73],
  ])('at %d °C is the table’s', (celsius, expected) => {
    expect(offBy(micropascals(celsius), expected)).toBeLessThanOrEqual(1e-4)
  })

  // Perry's Chemical Engineers' Handbook, 9th ed., table 2-135, saturated liquid [C], ±0.2 %
  it.each([
    [280, 1433.7],
    [290, 1084.0],
    [300, 853.84],
    [310, 693.54],
    [320, 577.02],
  ])('at %d K agrees with another table', (kelvin, expected) => {
    expect(offBy(micropascals(kelvin - 273.15), expected)).toBeLessThanOrEqual(2e-3)
  })

  // ISO/TR 3666:1998 [M]: the viscosity that viscometers are calibrated by
  it('at 20 °C is 1.0016 mPa·s', () => {
    expect(waterViscosity(20) * 1000).toBeCloseTo(1.0016, 4)
  })

  // EPA 815-R-06-009 (2005), cubic in °C [C formula]: good for cold water only
  it('agrees with a cubic for cold water to 1 %, and is right to leave it when warm', () => {
    const cubic = (t: number) => 1.784 - 0.0575 * t + 0.0011 * t ** 2 - 1e-5 * t ** 3
    for (let celsius = 0; celsius <= 20; celsius += 1) {
      expect(offBy(cubic(celsius), waterViscosity(celsius) * 1000)).toBeLessThanOrEqual(0.01)
    }
    expect(cubic(40) / (waterViscosity(40) * 1000)).toBeCloseTo(0.93, 2)
  })
})

describe('the density of water', () => {
  // IAPWS SR6-08(2011), check values at 0.1 MPa [C]
  it.each([
    [298.15, 997.047013],
    [260, 997.06836],
  ])('at %d K is the published check value', (kelvin, expected) => {
    expect(waterDensity(kelvin - 273.15)).toBeCloseTo(expected, 6)
  })
})

describe('one clean filter at one head', () => {
  // Ratio of viscosities from equation 7 [D]
  it.each([
    [30, 10, 1.6381],
    [25, 15, 1.2781],
  ])('at %d °C runs against %d °C as %d', (warm, cold, ratio) => {
    // The same time for a litre means a better filter in the cold by that ratio.
    const reading = { litres: 1, seconds: 300, headRatio: 1 }
    const inCold = normalisedFlow({ ...reading, celsius: cold })
    const inWarm = normalisedFlow({ ...reading, celsius: warm })
    expect(inCold / inWarm).toBeCloseTo(ratio, 4)
  })
})
