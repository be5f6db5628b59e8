import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  asAtReference,
  flowDefaults,
  flowErrorShare,
  isSpent,
  litresPerHour,
  normalisedFlow,
  recovery,
  type Recovery,
} from '@/lib/domain/flow'

const full = { litres: 1, seconds: 600, celsius: 20, headRatio: 1 }

describe('a flow reading', () => {
  it('turns a bottle and a time into litres an hour', () => {
    expect(litresPerHour({ litres: 1, seconds: 240 })).toBe(15)
    expect(litresPerHour({ litres: 1.5, seconds: 3600 })).toBe(1.5)
    expect(litresPerHour({ litres: 1, seconds: 0 })).toBe(0)
    expect(litresPerHour({ litres: 0, seconds: 60 })).toBe(0)
    expect(litresPerHour({ litres: 0.5, seconds: 1 })).toBe(1800)
    expect(litresPerHour({ litres: -1, seconds: -1 })).toBe(0)
  })

  it('at 20 °C and full head is its own normalised flow', () => {
    expect(normalisedFlow(full)).toBeCloseTo(6, 12)
  })

  it('goes up when cold water or a low container explain the slowness', () => {
    expect(normalisedFlow({ ...full, celsius: 10 })).toBeGreaterThan(6)
    expect(normalisedFlow({ ...full, celsius: 30 })).toBeLessThan(6)
    expect(normalisedFlow({ ...full, headRatio: 0.5 })).toBeCloseTo(12, 12)
  })

  it('cannot be normalised with an empty container', () => {
    expect(() => normalisedFlow({ ...full, headRatio: 0 })).toThrow(
      new RangeError('head ratio must be above 0'),
    )
  })

  it('errs by time and bottle together', () => {
    expect(flowErrorShare(flowDefaults)).toBeCloseTo(0.111803, 6)
  })
})

describe('a flow that is wanted', () => {
  it('is told at 20 °C as the readings are: more where the water is cold, less where it is warm', () => {
    expect(asAtReference(4, 20)).toBeCloseTo(4, 12)
    // 1305.90 and 797.21 to 1001.57 µPa·s (IAPWS SR6-08).
    expect(asAtReference(4, 10)).toBeCloseTo(5.215, 3)
    expect(asAtReference(4, 30)).toBeCloseTo(3.184, 3)
  })

  it('is just met by a reading that gives it', () => {
    const seconds = 3600 / 4
    expect(normalisedFlow({ litres: 1, seconds, celsius: 10, headRatio: 1 })).toBeCloseTo(
      asAtReference(4, 10),
      9,
    )
  })
})

describe('the recovery after a wash', () => {
  it.each([
    [15, 'restored'],
    [10.5, 'restored'],
    [10.49, 'partly'],
    [6, 'partly'],
    [5.99, 'not'],
    [0, 'not'],
    [19.5, 'restored'],
    [19.51, 'too-fast'],
  ])('with %d of 15 L/h is %s', (flow, kind) => {
    const found = recovery({ flow, first: 15, nominal: 99 })
    expect(found.kind).toBe(kind)
    expect(found.share).toBeCloseTo(flow / 15, 12)
    expect(found.against).toBe('first reading')
  })

  it('carries the error of both readings', () => {
    const { lowShare, highShare } = recovery({ flow: 5, first: 10, nominal: 99 })
    expect(lowShare).toBeCloseTo(0.5 * (1 - 0.158114), 6)
    expect(highShare).toBeCloseTo(0.5 * (1 + 0.158114), 6)
  })

  it.each([undefined, null, 0])(
    'stands against the nominal flow, and says so: first %s',
    (first) => {
      const found = recovery({ flow: 5, first, nominal: 10 })
      expect(found.against).toBe('nominal')
      expect(found.share).toBe(0.5)
      expect(found.highShare).toBeCloseTo(0.5 * (1 + 0.111803), 6)
    },
  )

  it('refuses to judge against nothing', () => {
    expect(() => recovery({ flow: 5, nominal: 0 })).toThrow(
      new RangeError('nothing to set the flow against'),
    )
  })

  it('is the same whatever the unit of flow', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.1, max: 50, noNaN: true }),
        fc.double({ min: 0.1, max: 50, noNaN: true }),
        (flow, first) => {
          const inLitres = recovery({ flow, first, nominal: 1 })
          const inMillilitres = recovery({ flow: flow * 1024, first: first * 1024, nominal: 1 })
          expect(inMillilitres).toEqual(inLitres)
        },
      ),
      { seed: 3 },
    )
  })
})

describe('a spent stage', () => {
  const wash = (share: number): Recovery => recovery({ flow: share, first: 1, nominal: 1 })

  it('has failed two washes in a row, error bars and all', () => {
    expect(isSpent([wash(0.3), wash(0.34)])).toBe('spent')
    expect(isSpent([wash(0.9), wash(0.3), wash(0.3)])).toBe('spent')
  })

  it('is not called on one wash, nor on two with a better one between', () => {
    expect(isSpent([])).toBe('no')
    expect(isSpent([wash(0.1)])).toBe('no')
    expect(isSpent([wash(0.1), wash(0.5)])).toBe('no')
    expect(isSpent([wash(0.1), wash(0.5), wash(0.1)])).toBe('no')
    expect(isSpent([wash(0.1), wash(0.1), wash(1.4)])).toBe('no')
  })

  it('is asked about again when a bar straddles the line', () => {
    expect(isSpent([wash(0.3), wash(0.38)])).toBe('ask again')
    expect(isSpent([wash(0.38), wash(0.3)])).toBe('ask again')
  })

  it('is not called while a bar still touches the line', () => {
    const touching = { ...wash(0.3), highShare: flowDefaults.partlyShare }
    expect(isSpent([wash(0.3), touching])).toBe('ask again')
  })

  it('goes by the line that was set', () => {
    expect(isSpent([wash(0.3), wash(0.3)], { partlyShare: 0.3 })).toBe('ask again')
  })

  it('is judged by the line of each reading’s own day, kept with it', () => {
    const under = (partlyShare: number) =>
      recovery({ flow: 0.5, first: 1, nominal: 1, settings: { ...flowDefaults, partlyShare } })
    expect(isSpent([under(0.6), under(0.6)])).toBe('spent')
    expect(isSpent([under(0.6), under(0.55)])).toBe('ask again')
    const { partlyShare: _line, ...old } = wash(0.3)
    expect(isSpent([old, old])).toBe('spent')
  })
})
