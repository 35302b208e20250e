import { describe, expect, it } from 'vitest'
import {
  lnConventionalChloride,
  lnHydrogenActivityOf,
  pHOf,
  scaleShift,
} from '../../../src/chemistry/speciation/ph.ts'
import { lnShift, pKaAt } from '../../../src/chemistry/speciation/thermal.ts'
import { equilibria } from './parts.ts'

const stepOf = (component: string, index: number) => {
  const step = equilibria.acids.find((family) => family.component === component)?.steps[index]
  if (!step) throw new Error(component)
  return step
}

describe('constants with temperature', () => {
  it('shifts ln K as worked', () => {
    expect(lnShift(47.45, -59, 37)).toBeCloseTo(0.7351, 4)
    expect(lnShift(47.45, -59, 25)).toBeCloseTo(0, 15)
  })

  it('gives tromethamine 7.753 at 37 °C', () => {
    expect(pKaAt(stepOf('tromethamine', 0), 37)).toBeCloseTo(7.753, 3)
  })

  /* Temperature forms of other laboratories, recalled: A/T + B + C·T. */
  it.each([
    ['phosphate', 1, 2073.0, -5.9884, 0.020912],
    ['borate', 0, 2237.94, -3.305, 0.016883],
    ['carbonate', 1, 2902.39, -6.498, 0.02379],
    ['tromethamine', 0, 2981.4, -3.5888, 0.005571],
  ])('%s agrees with an independent form within 0.011 from 0 to 40 °C', (component, index, a, b, c) => {
    for (const celsius of [0, 5, 25, 37, 40]) {
      const kelvin = celsius + 273.15
      const other = a / kelvin + b + c * kelvin
      expect(Math.abs(pKaAt(stepOf(component, index), celsius) - other)).toBeLessThanOrEqual(0.011)
    }
  })
})

describe('scale of pH', () => {
  it('has the conventional activity of chloride', () => {
    expect(lnConventionalChloride(0.1, 0.3915)).toBeCloseTo(-0.2519, 4)
  })

  it('converts as worked and back without loss', () => {
    expect(pHOf(-16.118, 0)).toBeCloseTo(7.0, 3)
    expect(lnHydrogenActivityOf(7, 0)).toBeCloseTo(-16.118, 3)
    const shift = scaleShift(-0.26, 0.15, 0.3915)
    expect(pHOf(lnHydrogenActivityOf(6.543, shift), shift)).toBeCloseTo(6.543, 14)
  })
})
