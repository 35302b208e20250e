import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  expressMass,
  expressNumber,
  expressQuantity,
  expressUnits,
  expressVolume,
  tryExpressNumber,
} from '../../src/quantity/express.ts'

describe('safe expression', () => {
  it('answers the examples', () => {
    expect(tryExpressNumber(1234.5)).toEqual({ ok: true, value: '1,234.5' })
    expect(expressNumber(0.30000000000000004)).toBe('0.3')
    expect(expressQuantity(290, 'mOsm/kg')).toBe('290 mOsm/kg')
    expect(expressMass(0.00005)).toBe('50 mcg')
    expect(expressVolume(1000)).toBe('1,000 mL')
    expect(expressUnits(10000)).toBe('10,000 units')
    expect(expressUnits(1)).toBe('1 unit')
  })

  it.each([
    [0.5, {}, '0.5'],
    [5, {}, '5'],
    [999, {}, '999'],
    [1000, {}, '1,000'],
    [1000000, {}, '1,000,000'],
    [1e21, {}, '1,000,000,000,000,000,000,000'],
    [1e-7, {}, '0.0000001'],
    [-0, {}, '0'],
    [-0.0004, { decimals: 2 }, '0'],
    [-0.5, {}, '−0.5'],
    [2.345, { decimals: 2 }, '2.35'],
    [-2.345, { decimals: 2 }, '−2.35'],
    [1.005, { decimals: 2 }, '1.01'],
    [290.04, { decimals: 1 }, '290'],
    [999.96, { significant: 4 }, '1,000'],
    [0.00123456, { significant: 3 }, '0.00123'],
    [123456, { significant: 2 }, '120,000'],
    [0.12, { decimals: 3, keepTrailingZeros: true }, '0.120'],
    [12, { decimals: 1, keepTrailingZeros: true }, '12.0'],
    [1234.5, { locale: 'decimal-comma' }, '1\u202F234,5'],
    [0.5, { locale: 'decimal-comma' }, '0,5'],
  ] as const)('%d with %o is %s', (value, format, text) => {
    expect(expressNumber(value, format)).toBe(text)
  })

  it.each([
    [0.2, '200 mg'],
    [1, '1 g'],
    [0.9999999999999, '1 g'],
    [0.0004, '400 mcg'],
    [0.001, '1 mg'],
    [1500, '1,500 g'],
    [5e-8, '0.05 mcg'],
    [0, '0 g'],
    [-0.2, '−200 mg'],
  ])('%d g is %s', (grams, text) => {
    expect(expressMass(grams)).toBe(text)
  })

  it('chooses the unit of a mass after rounding', () => {
    expect(expressMass(0.99996, { significant: 4 })).toBe('1 g')
    expect(expressMass(0.9994, { significant: 4 })).toBe('999.4 mg')
    expect(expressMass(0.0005, { decimals: 0 })).toBe('500 mcg')
  })

  it('says that a number is missing and never NaN', () => {
    for (const value of [null, undefined, Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY]) {
      expect(tryExpressNumber(value)).toMatchObject({ ok: false, refusal: { code: 'number-missing' } })
      expect(expressNumber(value)).toBe('not known')
      expect(expressMass(value)).toBe('not known')
      expect(expressQuantity(value, 'mL')).toBe('not known')
    }
  })

  it('does not take an impossible count of digits', () => {
    expect(() => expressNumber(1, { decimals: 16 })).toThrow(RangeError)
    expect(() => expressNumber(1, { decimals: 0.5 })).toThrow(RangeError)
    expect(() => expressNumber(1, { significant: 0 })).toThrow(RangeError)
  })

  const safe = /^−?(0|[1-9]\d{0,2}(,\d{3})*)(\.\d*[1-9])?$/

  it('holds for any number: leading zero, no trailing zero, no exponent, grouped thousands, no minus zero', () => {
    const format = fc.oneof(
      fc.constant({}),
      fc.record({ decimals: fc.integer({ min: 0, max: 12 }) }),
      fc.record({ significant: fc.integer({ min: 1, max: 15 }) }),
    )
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), format, (value, form) => {
        const text = expressNumber(value, form)
        expect(text).toMatch(safe)
        expect(text).not.toMatch(/^−0$/)
      }),
      { numRuns: 200 },
    )
  })

  it('loses no more than half a unit of the last digit', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -1e6, max: 1e6, noNaN: true }),
        fc.integer({ min: 0, max: 6 }),
        (value, decimals) => {
          const shown = Number(expressNumber(value, { decimals }).replaceAll(',', '').replace('−', '-'))
          expect(Math.abs(shown - value)).toBeLessThanOrEqual(0.5 * 10 ** -decimals * (1 + 1e-9) + 1e-9)
        },
      ),
      { numRuns: 200 },
    )
  })

  it('shows a mass between 1 mcg and 1 kg as a number from 1 to below 1,000', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-6, max: 999, noNaN: true }), (grams) => {
        const [number = ''] = expressMass(grams, { significant: 6 }).split(' ')
        expect(Number(number)).toBeGreaterThanOrEqual(1)
        expect(Number(number)).toBeLessThan(1000)
      }),
      { numRuns: 200 },
    )
  })
})
