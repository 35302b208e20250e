import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { contains, intervalAround, scaleInterval } from '../../src/quantity/interval.ts'
import { plainDecimal, rationalOf, terminatingDecimal, toNumber } from '../../src/quantity/rational.ts'
import { roundToReadability } from '../../src/quantity/readability.ts'

describe('exact decimals', () => {
  it('writes a double in plain digits that read back', () => {
    expect(plainDecimal(5e-7)).toBe('0.0000005')
    expect(plainDecimal(-1.5e22)).toBe('-15000000000000000000000')
    expect(terminatingDecimal(rationalOf('1.50'))).toBe('1.5')
    expect(terminatingDecimal({ numerator: 1n, denominator: 3n })).toBeUndefined()
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
        expect(Number(plainDecimal(value))).toBe(value === 0 ? 0 : value)
        expect(toNumber(rationalOf(plainDecimal(value)))).toBe(value === 0 ? 0 : value)
      }),
      { numRuns: 200 },
    )
  })
})

describe('rounding to the balance', () => {
  it.each([
    [0.29996, 0.001, 0.3],
    [0.1 + 0.2, 0.1, 0.3],
    [0.0005, 0.001, 0.001],
    [-0.0005, 0.001, -0.001],
    [1.005, 0.01, 1.01],
    [0.12286, 0.001, 0.123],
    [0.0123, 0.005, 0.01],
    [0.0125, 0.005, 0.015],
    [7, 0.002, 7],
    [0.0004, 0.001, 0],
  ])('%d g at %d g is %d g', (grams, readability, expected) => {
    expect(roundToReadability(grams, readability)).toBe(expected)
  })

  it('gives the shortest decimal of a whole number of steps, and keeps it', () => {
    const steps = fc.constantFrom(1, 0.1, 0.01, 0.001, 0.0001, 0.00001, 0.005, 0.0002)
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1e4, noNaN: true }), steps, (grams, step) => {
        const rounded = roundToReadability(grams, step)
        expect(Math.abs(rounded - grams)).toBeLessThanOrEqual((step / 2) * (1 + 1e-9) + 1e-11)
        expect(String(rounded).replace(/^\d+\.?/, '').length).toBeLessThanOrEqual(5)
        expect(roundToReadability(rounded, step)).toBe(rounded)
      }),
      { numRuns: 200 },
    )
  })

  it('does not round what is not a mass, or to no step', () => {
    expect(() => roundToReadability(Number.NaN, 0.001)).toThrow(RangeError)
    for (const step of [0, -0.001, Number.NaN]) expect(() => roundToReadability(1, step)).toThrow(RangeError)
  })
})

describe('interval', () => {
  it('reaches 1.96 standard uncertainties to each side', () => {
    const { low, high, ...rest } = intervalAround(290, 2.5)
    expect(rest).toEqual({ value: 290, standardUncertainty: 2.5 })
    expect(low).toBeCloseTo(285.10009, 10)
    expect(high).toBeCloseTo(294.89991, 10)
  })

  it('changes its unit and knows what lies in it', () => {
    const interval = { value: 2, low: 1, high: 3, standardUncertainty: 0.5 }
    expect(scaleInterval(interval, 10)).toEqual({ value: 20, low: 10, high: 30, standardUncertainty: 5 })
    expect(contains(interval, 3)).toBe(true)
    expect(contains(interval, 3.0001)).toBe(false)
    expect(contains(interval, 0.9999)).toBe(false)
  })

  it('takes no uncertainty below zero and no number that is not one', () => {
    for (const bad of [-1, Number.NaN, Number.POSITIVE_INFINITY])
      expect(() => intervalAround(290, bad)).toThrow(RangeError)
    expect(() => intervalAround(Number.NaN, 1)).toThrow(RangeError)
  })
})
