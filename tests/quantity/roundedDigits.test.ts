import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  multiply,
  powerOfTen,
  rationalOfNumber,
  roundedDecimal,
  roundedToDigits,
  roundedToPlace,
  roundToStep,
  shifted,
  terminatingDecimal,
  toNumber,
} from '../../src/quantity/rational.ts'

const exact = (value: number, place: number) => roundToStep(rationalOfNumber(value), powerOfTen(place))

/** Numbers with few digits, so that halves are met, and with many. */
const numbers = fc.oneof(
  fc.double({ noNaN: true, noDefaultInfinity: true, min: -1e18, max: 1e18 }),
  fc
    .tuple(fc.integer({ min: -100_000, max: 100_000 }), fc.integer({ min: -9, max: 9 }))
    .map(([digits, power]) => Number(`${digits}e${power}`)),
)
const places = fc.integer({ min: -15, max: 6 })

describe('rounding by digits', () => {
  it('is that of the exact fraction, for every number and place', () => {
    fc.assert(
      fc.property(numbers, places, (value, place) => {
        expect(roundedToPlace(value, place)).toBe(toNumber(exact(value, place)))
        expect(roundedDecimal(value, place)).toBe(terminatingDecimal(exact(value, place)))
      }),
      { numRuns: 4000 },
    )
  })

  it('counts from the first digit that is not zero', () => {
    fc.assert(
      fc.property(numbers, fc.integer({ min: 1, max: 15 }), (value, count) => {
        fc.pre(value !== 0)
        const place = Number(value.toExponential().split('e')[1]) - count + 1
        expect(roundedToDigits(value, count)).toBe(toNumber(exact(value, place)))
      }),
      { numRuns: 4000 },
    )
  })

  it('moves the point as the exact product does', () => {
    fc.assert(
      fc.property(numbers, fc.integer({ min: -12, max: 12 }), (value, power) => {
        fc.pre(value !== 0)
        const product = multiply(rationalOfNumber(value), powerOfTen(power))
        expect(shifted(value, power)).toBe(toNumber(product))
      }),
      { numRuns: 4000 },
    )
    expect(shifted(0.07, 3)).toBe(70)
  })

  it('worked: 2.675 to two decimals, 0.0123456 to three digits, 1234.5 whole', () => {
    expect(roundedToPlace(2.675, -2)).toBe(2.68)
    expect(roundedToDigits(0.0123456, 3)).toBe(0.0123)
    expect(roundedDecimal(1234.5, 0)).toBe('1235')
  })
})
