/*
 * CHECKS section 2: flow through a filter.
 * [C] read in a copy of the source · [D] by arithmetic.
 */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { normalisedFlow } from '@/lib/domain/flow'
import {
  bubblePoint,
  fallingHeadConductivity,
  fallingHeadSeconds,
  fitCake,
  fouledFlow,
  gravityFlow,
  headAfter,
  headPressure,
  meanFlow,
  resistanceOf,
} from '@/lib/domain/flow-physics'

// Darcy's law with IAPWS viscosity and density [D]
describe('water driven by its own weight', () => {
  const reading = { litres: 1, seconds: 60, headMetres: 0.6, celsius: 20 }
  const resistance = resistanceOf(reading)

  it('presses with 4894.5 Pa under half a metre', () => {
    expect(headPressure({ headMetres: 0.5, celsius: 20 })).toBeCloseTo(4894.5, 1)
  })

  it('meets a resistance of 3.5185e11 when a litre takes a minute under 0.6 m', () => {
    expect(resistance / 1e11).toBeCloseTo(3.5185, 4)
    const back = gravityFlow({ resistance, headMetres: 0.6, celsius: 20 })
    expect(back).toBeCloseTo(1e-3 / 60, 12)
  })

  it('empties 0.05 m² from 0.6 to 0.3 m, 15 L, in 1247.66 s', () => {
    const container = { squareMetres: 0.05, resistance, celsius: 20 }
    const seconds = fallingHeadSeconds(container, { fromMetres: 0.6, toMetres: 0.3 })
    expect(seconds).toBeCloseTo(1247.66, 1)
    expect(headAfter(container, { fromMetres: 0.6, seconds })).toBeCloseTo(0.3, 12)
  })

  it('takes 78.1 to 78.2 s for that litre at 10 °C, and normalises back to the minute', () => {
    const seconds = 1e-3 / gravityFlow({ resistance, headMetres: 0.6, celsius: 10 })
    expect(seconds).toBeGreaterThan(78.1)
    expect(seconds).toBeLessThan(78.25)
    const cold = normalisedFlow({ litres: 1, seconds, celsius: 10, headRatio: 1 })
    const warm = normalisedFlow({ litres: 1, seconds: 60, celsius: 20, headRatio: 1 })
    expect(cold / warm).toBeCloseTo(1, 2) // density is left out of a reading: 0.15 %
  })

  it('normalises a half-full container back to a full one', () => {
    const half = gravityFlow({ resistance, headMetres: 0.3, celsius: 20 })
    const seconds = 1e-3 / half
    const flow = normalisedFlow({ litres: 1, seconds, celsius: 20, headRatio: 0.5 })
    expect(flow).toBeCloseTo(60, 9)
  })

  // Identity of a falling head [D]: what ran out over the time is the logarithmic mean
  it('runs on the mean at the logarithmic mean of its end flows', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.05, max: 1, noNaN: true }),
        fc.double({ min: 0.05, max: 0.99, noNaN: true }),
        fc.integer({ min: 1, max: 40 }),
        (fromMetres, share, celsius) => {
          const container = { squareMetres: 0.05, resistance, celsius }
          const toMetres = fromMetres * share
          const seconds = fallingHeadSeconds(container, { fromMetres, toMetres })
          const ranOut = 0.05 * (fromMetres - toMetres)
          const ends = [fromMetres, toMetres].map((headMetres) =>
            gravityFlow({ resistance, headMetres, celsius }),
          )
          const mean = meanFlow(ends[0] ?? NaN, ends[1] ?? NaN)
          expect(mean / (ranOut / seconds)).toBeCloseTo(1, 9)
        },
      ),
      { seed: 21 },
    )
    expect(meanFlow(3, 3)).toBe(3)
  })
})

// Das, Principles of Geotechnical Engineering, problem 7.9 [C statement, D result]
describe('the falling-head permeameter', () => {
  const test = { standpipeArea: 95.03, sampleArea: 7854, sampleLength: 400 } // mm², mm

  it('gives the printed conductivity', () => {
    const perSecond = fallingHeadConductivity({ ...test, fromHead: 450, toHead: 200, time: 480 })
    expect(perSecond / 10).toBeCloseTo(8.177e-4, 7) // cm/s
  })

  it('stands at 300 mm half-way', () => {
    const k = fallingHeadConductivity({ ...test, fromHead: 450, toHead: 200, time: 480 })
    const half = fallingHeadConductivity({ ...test, fromHead: 450, toHead: 300, time: 240 })
    expect(half).toBeCloseTo(k, 9)
  })
})

// Geankoplis, Transport Processes and Unit Operations, problem 14.2-1 [C], ±0.5 %
describe('the fit of cake filtration', () => {
  it('finds the printed resistances', () => {
    const litres = [0.5, 1, 1.5, 2, 2.5, 3]
    const seconds = [17.3, 41.3, 72.0, 108.3, 152.0, 201.7]
    const run = litres.map((value, index) => ({
      cubicMetres: value / 1000,
      seconds: seconds[index] ?? NaN,
    }))
    const { cakeResistance, mediumResistance } = fitCake(run, {
      pascals: 46_200,
      squareMetres: 0.0439,
      solidsPerCubicMetre: 23.47,
      viscosity: 8.937e-4,
    })
    expect(Math.abs(cakeResistance / 1.106e11 - 1)).toBeLessThan(0.005)
    expect(Math.abs(mediumResistance / 6.4e10 - 1)).toBeLessThan(0.005)
  })
})

// Hermia 1982, constant pressure blocking laws with J0 = 1, k = 0.1, t = 10 [D], ±1e-6
describe('fouling', () => {
  it.each([
    ['complete', 0.367879],
    ['standard', 0.444444],
    ['intermediate', 0.5],
    ['cake', 0.57735],
  ] as const)('by the %s law leaves %d of the flow', (law, left) => {
    expect(fouledFlow({ law, first: 1, rate: 0.1, time: 10 })).toBeCloseTo(left, 6)
    expect(fouledFlow({ law, first: 7, rate: 0.1, time: 0 })).toBe(7)
  })
})

// Young and Laplace, 72.75 mN/m [D]
describe('the bubble point', () => {
  it('of a fibre is far above what a hand can press, of a tear is not', () => {
    expect(bubblePoint(0.1) / 1000).toBeCloseTo(2910, 6)
    expect(bubblePoint(3) / 1000).toBeCloseTo(97, 6)
  })
})
