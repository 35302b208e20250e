import { describe, expect, it } from 'vitest'
import { misread, unitOf } from '../../src/quantity/units.ts'

describe('units', () => {
  it.each([
    ['kg', 'mass', 'kg', 1000],
    ['g', 'mass', 'g', 1],
    ['mg', 'mass', 'mg', 1e-3],
    ['mcg', 'mass', 'mcg', 1e-6],
    ['µg', 'mass', 'mcg', 1e-6],
    ['ng', 'mass', 'ng', 1e-9],
    ['L', 'volume', 'L', 1000],
    ['ml', 'volume', 'mL', 1],
    ['µL', 'volume', 'microL', 1e-3],
    ['mol', 'moles', 'mol', 1000],
    ['mmol', 'moles', 'mmol', 1],
    ['umol', 'moles', 'micromol', 1e-3],
    ['Eq', 'equivalents', 'Eq', 1000],
    ['mEq', 'equivalents', 'mEq', 1],
    ['M', 'molarity', 'mol/L', 1],
    ['mM', 'molarity', 'mmol/L', 1e-3],
    ['µM', 'molarity', 'micromol/L', 1e-6],
    ['units', 'biological', 'units', 1],
  ] as const)('%s is a %s written %s with the exact factor %d', (spelling, dimension, symbol, factor) => {
    expect(unitOf(spelling)).toEqual({ dimension, symbol, factor })
  })

  it('keeps case apart and knows no unit of an object’s own', () => {
    for (const spelling of ['Mg', 'MG', 'KG', 'G', 'toString', '__proto__', ''])
      expect(unitOf(spelling)).toBeUndefined()
  })

  it('names no spelling both a unit and a misreading', () => {
    for (const spelling of misread.keys()) expect(unitOf(spelling), spelling).toBeUndefined()
  })
})
