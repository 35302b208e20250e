import { describe, expect, it } from 'vitest'
import { compile } from '../../../src/chemistry/activity/compiled.ts'
import {
  debyeHueckelSlope,
  permittivity,
  waterDensity,
} from '../../../src/chemistry/activity/debye-hueckel.ts'
import { mixingIntegral } from '../../../src/chemistry/activity/electrostatic.ts'
import {
  deepestDepression,
  freezingDepression,
  osmolalityAtDepression,
  osmolalityAtOwnFreezing,
} from '../../../src/chemistry/activity/freezing.ts'
import { sodiumChlorideOsmolality } from '../../../src/chemistry/activity/sodium-chloride.ts'
import { atCelsius } from '../../../src/chemistry/activity/temperature.ts'
import { library, modelOf, speciesOf } from './support.ts'

describe('Debye–Hückel slope', () => {
  it('is as worked', () => {
    expect(waterDensity(25)).toBeCloseTo(997.045, 3)
    expect(permittivity(25)).toBeCloseTo(78.38, 2)
    expect(debyeHueckelSlope(25)).toBeCloseTo(0.3914, 4)
  })

  /* Malmberg and Maryott 1956, measured, recalled: ε = 87.740 − 0.40008 t + 9.398·10⁻⁴ t² − 1.410·10⁻⁶ t³. */
  it.each([0, 5, 25, 37, 45])('rests on a permittivity within 0.15 %% of measurement at %d °C', (t) => {
    const measured = 87.74 - 0.40008 * t + 9.398e-4 * t ** 2 - 1.41e-6 * t ** 3
    expect(Math.abs(permittivity(t) / measured - 1)).toBeLessThan(0.0015)
  })

  it.each([
    [0, 0.3767],
    [25, 0.3915],
  ])('at %d °C is the published %d', (celsius, published) => {
    expect(debyeHueckelSlope(celsius)).toBeCloseTo(published, 3)
  })
})

describe('unsymmetrical mixing', () => {
  const out = new Float64Array(2)

  /** J and J′ by another rule over another variable: trapezoids over ln y. */
  function reference(x: number): readonly [number, number] {
    const [from, to, steps] = [Math.log(1e-9), Math.log(80), 20000]
    const width = (to - from) / steps
    let [value, slope] = [0, 0]
    for (let index = 0; index <= steps; index += 1) {
      const y = Math.exp(from + index * width)
      const q = -(x / y) * Math.exp(-y)
      const series = Math.abs(q) < 1e-3
      const core = series ? (-(q ** 3) / 6) * (1 + q / 4 + (q * q) / 20) : q + (q * q) / 2 - Math.expm1(q)
      const inner = series ? (-(q ** 3) / 2) * (1 + q / 3 + (q * q) / 12) : q * (q - Math.expm1(q))
      value += core * y ** 3 * width
      slope += inner * y ** 3 * width
    }
    return [value / x, (slope - value) / (x * x)]
  }

  it.each([0.01, 0.05, 0.3, 1, 2.7, 6, 12.3, 40, 110, 143.9, 180])('J and its slope at %d', (x) => {
    const [value, slope] = reference(x)
    mixingIntegral(x, out)
    expect(Math.abs((out[0] ?? 0) / value - 1)).toBeLessThan(5e-5)
    expect(Math.abs((out[1] ?? 0) / slope - 1)).toBeLessThan(1e-4)
  })

  it('is as worked, and nothing at nothing', () => {
    mixingIntegral(1, out)
    expect(out[0]).toBeCloseTo(0.116437, 6)
    expect(out[1]).toBeCloseTo(0.160527, 6)
    mixingIntegral(0, out)
    expect([...out]).toEqual([0, 0])
  })

  it('matters: leaving it out moves a mixture of sodium and magnesium chloride', () => {
    const ions = speciesOf(['Na+', 'Mg+2', 'Cl-'])
    expect(compile(ions, library.electrolytes, 25).likes[0]?.charges).toEqual([1, 2])
    expect(compile(speciesOf(['Na+', 'K+', 'Cl-']), library.electrolytes, 25).likes[0]?.charges).toBeNull()
  })
})

describe('ice', () => {
  it('is as worked', () => {
    expect(osmolalityAtDepression(1.86)).toBeCloseTo(1.0012, 4)
    expect(freezingDepression(1)).toBeCloseTo(1.8578, 4)
    expect(osmolalityAtOwnFreezing(1, 0)?.kelvin).toBeCloseTo(1.8578, 4)
  })

  /* Robinson and Stokes 1965, recalled: −log₁₀ a_w = 4.207·10⁻³ θ + 2.1·10⁻⁶ θ². */
  it.each([0.5, 1.86, 5, 10])('agrees with a polynomial of another hand at %d K', (kelvin) => {
    const other = ((4.207e-3 * kelvin + 2.1e-6 * kelvin ** 2) * Math.LN10) / 0.0180153
    expect(Math.abs(osmolalityAtDepression(kelvin) / other - 1)).toBeLessThan(0.001)
  })

  it('turns back without loss and ends where it is not used', () => {
    for (const kelvin of [0.001, 0.5, 3, 20, 39.9]) {
      expect(freezingDepression(osmolalityAtDepression(kelvin))).toBeCloseTo(kelvin, 10)
    }
    expect(freezingDepression(osmolalityAtDepression(deepestDepression) * 1.01)).toBeNaN()
    expect(osmolalityAtOwnFreezing(100, 0)).toBeNull()
  })
})

describe('parameters at a temperature', () => {
  it('are as worked', () => {
    expect(atCelsius({ at25: 1, perK: 0.01, perK2: 0 }, 0)).toBe(0.75)
  })

  it('move φ from 25 to 0 °C as published forms do', () => {
    const change = (ids: readonly string[], m: readonly number[]) => {
      const at = (celsius: number) => modelOf(ids, celsius).osmotic(Float64Array.from(m)).osmoticCoefficient
      return (at(0) / at(25) - 1) * 100
    }
    expect(change(['Na+', 'Cl-'], [1, 1])).toBeCloseTo(-2.1, 0)
    expect(change(['Mg+2', 'Cl-'], [1, 2])).toBeCloseTo(3.4, 0)
    expect(change(['Na+', 'SO4-2'], [1, 0.5])).toBeGreaterThan(-9)
    expect(change(['Na+', 'SO4-2'], [1, 0.5])).toBeLessThan(-5)
  })
})

describe('sodium chloride', () => {
  it('0.9 % is as worked', () => {
    expect(sodiumChlorideOsmolality(library)(0.9)).toBeCloseTo(0.2867, 4)
  })
})

describe('remarks', () => {
  it('name what makes the model less sure, with its weight', () => {
    const strong = modelOf(['Na+', 'Gluconate-', 'Lactate-']).remarks(Float64Array.of(2.5, 1.5, 1))
    expect(strong.map(({ anion, kind }) => [anion, kind])).toEqual([
      ['Gluconate-', 'beyond-range'],
      ['Gluconate-', 'stand-in'],
      ['Lactate-', 'low-quality'],
    ])
    expect(strong.find(({ kind }) => kind === 'low-quality')?.weight).toBeCloseTo(0.4, 12)
  })

  it('count the molality of the salt, not of the ion', () => {
    const model = modelOf(['Ca+2', 'Cl-'])
    expect(model.remarks(Float64Array.of(1.1, 2.2))).toEqual([])
    expect(model.remarks(Float64Array.of(1.3, 2.6))[0]?.kind).toBe('beyond-range')
    expect(model.relativeUncertainty(Float64Array.of(2, 4))).toBeGreaterThan(
      model.relativeUncertainty(Float64Array.of(1, 2)),
    )
  })

  it('parameters of the freezing point are surer there than at 25 °C', () => {
    const m = Float64Array.of(0.3, 0.1)
    const at = (celsius: number) => modelOf(['Na+', 'Citrate-3'], celsius).relativeUncertainty(m)
    expect(at(0)).toBeLessThan(at(25))
    const bromide = (celsius: number) =>
      modelOf(['Na+', 'I-'], celsius).relativeUncertainty(Float64Array.of(0.1, 0.1))
    expect(bromide(0)).toBeGreaterThan(bromide(25))
  })
})
