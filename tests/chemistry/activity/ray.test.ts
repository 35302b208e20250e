import { describe, expect, it } from 'vitest'
import { compileActivityModel } from '../../../src/chemistry/activity/model.ts'
import { curveOf } from '../../../src/chemistry/curve/tabulated.ts'
import { loadLibrary } from '../../../src/library/library.ts'

const { species, electrolytes } = loadLibrary()
const molalities = {
  'Na+': 0.14,
  'K+': 0.005,
  'Mg+2': 0.02,
  'Ca+2': 0.01,
  'Cl-': 0.1,
  'SO4-2': 0.03,
  'HCO3-': 0.045,
  CO2: 0.002,
}

describe('osmolality along a ray of composition', () => {
  const records = Object.keys(molalities).flatMap((id) => species.get(id) ?? [])
  const m = Float64Array.from(records, ({ id }) => molalities[id as keyof typeof molalities])

  it('is that of the model at the scaled molalities, from nothing to strong', () => {
    for (const celsius of [0, 25, 37]) {
      const model = compileActivityModel(records, electrolytes, celsius)
      const ray = model.ray(m)
      for (const factor of [1e-9, 0.01, 0.3, 1, 2.5, 20]) {
        const whole = model.osmolality(m.map((value) => value * factor))
        expect(Math.abs(ray.osmolality(factor) / whole - 1)).toBeLessThan(1e-13)
      }
    }
  })
})

describe('a curve that bends strongly', () => {
  it('is inverted to the last digits', () => {
    const table = {
      points: [{ ln: -5.16, count: 12.68, relativeUncertainty: 0.2 }],
      shape: { strengthPerMolal: 15, chargeProduct: 4 },
    }
    const curve = curveOf(table, 0.3914)
    for (const osmolality of [0.01, 0.1, 0.28, 0.3]) {
      const back = curve.osmolalityAt(curve.molalityAt(osmolality))
      expect(Math.abs(back / osmolality - 1)).toBeLessThan(1e-13)
    }
  })
})
