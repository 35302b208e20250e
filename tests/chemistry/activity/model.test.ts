import { describe, expect, it } from 'vitest'
import type { SpeciesRecord } from '../../../src/library/types.ts'
import { compileActivityModel } from '../../../src/chemistry/activity/model.ts'
import { library, modelOf, sequence, speciesOf } from './support.ts'

const mixed = [
  'Na+',
  'K+',
  'Mg+2',
  'Ca+2',
  'NH4+',
  'TrisH+',
  'Cl-',
  'SO4-2',
  'HCO3-',
  'Acetate-',
  'H2PO4-',
  'HPO4-2',
  'Citrate-3',
  'EDTA-4',
  'B(OH)4-',
  'B(OH)3',
  'Tris',
  'CO2',
  'HAcetate',
]

function molalities(seed: number, scale: number): Float64Array {
  const next = sequence(seed)
  return Float64Array.from(mixed, () => scale * next() ** 3)
}

/** Balances charge with sodium or chloride, as every solution is. */
function balanced(m: Float64Array): Float64Array {
  const charge = speciesOf(mixed).reduce((sum, record, at) => sum + record.charge * (m[at] ?? 0), 0)
  const out = Float64Array.from(m)
  const at = mixed.indexOf(charge > 0 ? 'Cl-' : 'Na+')
  out[at] = (out[at] ?? 0) + Math.abs(charge)
  return out
}

const seeds = Array.from({ length: 20 }, (_, index) => 17 + 101 * index)

describe('consistency of the osmotic and the activity coefficients', () => {
  it.each([0, 25, 37])('Gibbs and Duhem: φ from ln γ integrated along dilution, at %d °C', (celsius) => {
    const model = modelOf(mixed, celsius)
    for (const seed of seeds) {
      const m = balanced(molalities(seed, 0.3))
      const ln = new Float64Array(m.length)
      const lnAt = (fraction: number) => {
        model.lnGamma(
          m.map((value) => value * fraction),
          ln,
        )
        return m.reduce((sum, value, at) => sum + value * (ln[at] ?? 0), 0)
      }
      /* Σm(φ−1) = Σ m ln γ − ∫₀¹ Σ m ln γ(x) dx; with x = s⁴ the square root of dilution is smooth. */
      const steps = 400
      let integral = 0
      for (let index = 0; index <= steps; index += 1) {
        const s = index / steps
        const weight = index === 0 || index === steps ? 1 : index % 2 === 1 ? 4 : 2
        integral += weight * 4 * s ** 3 * lnAt(s ** 4)
      }
      const excess = lnAt(1) - integral / (3 * steps)
      const { osmolalityOsmPerKg, sumOfMolalities } = model.osmotic(m)
      expect(osmolalityOsmPerKg).toBeCloseTo(sumOfMolalities + excess, 6)
    }
  })

  it('ln γ is the slope of one excess function: its cross slopes are equal', () => {
    const model = modelOf(mixed)
    const step = 1e-5
    const [up, down] = [new Float64Array(mixed.length), new Float64Array(mixed.length)]
    const slope = (m: Float64Array, of: number, along: number) => {
      const [high, low] = [Float64Array.from(m), Float64Array.from(m)]
      high[along] = (high[along] ?? 0) + step
      low[along] = (low[along] ?? 0) - step
      model.lnGamma(high, up)
      model.lnGamma(low, down)
      return ((up[of] ?? 0) - (down[of] ?? 0)) / (2 * step)
    }
    for (const seed of seeds.slice(0, 4)) {
      const m = balanced(molalities(seed, 0.3)).map((value) => value + 0.001)
      for (let of = 0; of < mixed.length; of += 3) {
        for (let along = 1; along < mixed.length; along += 4) {
          expect(slope(m, of, along)).toBeCloseTo(slope(m, along, of), 3)
        }
      }
    }
  })
})

describe('the model', () => {
  it('does not mind the order of the species', () => {
    const next = sequence(5)
    const order = mixed.map((_, at) => at).toSorted(() => next() - 0.5)
    const straight = modelOf(mixed)
    const shuffled = modelOf(order.map((at) => mixed[at] ?? ''))
    for (const seed of seeds) {
      const m = balanced(molalities(seed, 0.5))
      const moved = Float64Array.from(order, (at) => m[at] ?? 0)
      const [one, other] = [new Float64Array(m.length), new Float64Array(m.length)]
      straight.lnGamma(m, one)
      shuffled.lnGamma(moved, other)
      expect(shuffled.osmolality(moved)).toBeCloseTo(straight.osmolality(m), 12)
      for (const [place, at] of order.entries()) expect(other[place]).toBeCloseTo(one[at] ?? Number.NaN, 10)
    }
  })

  it('is not changed by species that are absent', () => {
    const m = Float64Array.of(0.14, 0.14)
    const all = new Float64Array(mixed.length)
    all[mixed.indexOf('Na+')] = 0.14
    all[mixed.indexOf('Cl-')] = 0.14
    expect(modelOf(mixed).osmolality(all)).toBeCloseTo(modelOf(['Na+', 'Cl-']).osmolality(m), 14)
  })

  it('is continuous in dilution and ideal at none', () => {
    const model = modelOf(mixed)
    const m = balanced(molalities(seeds[0] ?? 1, 0.4))
    let before = model.osmotic(m).osmoticCoefficient
    for (let fraction = 1; fraction > 1e-9; fraction *= 0.98) {
      const { osmoticCoefficient } = model.osmotic(m.map((value) => value * fraction))
      expect(Math.abs(osmoticCoefficient - before)).toBeLessThan(0.01)
      before = osmoticCoefficient
    }
    expect(before).toBeCloseTo(1, 3)
    const none = model.osmotic(new Float64Array(mixed.length))
    expect(none).toEqual({
      osmoticCoefficient: 1,
      sumOfMolalities: 0,
      waterActivity: 1,
      osmolalityOsmPerKg: 0,
    })
    const ln = new Float64Array(mixed.length)
    model.lnGamma(new Float64Array(mixed.length), ln)
    expect(ln.every((value) => value === 0)).toBe(true)
  })

  it('starts on the limiting law', () => {
    const m = 1e-6
    const { osmoticCoefficient } = modelOf(['Na+', 'Cl-']).osmotic(Float64Array.of(m, m))
    expect((1 - osmoticCoefficient) / Math.sqrt(m)).toBeCloseTo(0.3914, 2)
  })

  it('gives water the activity of its osmolality', () => {
    const { osmolalityOsmPerKg, waterActivity } = modelOf(['Na+', 'Cl-']).osmotic(Float64Array.of(1, 1))
    expect(-Math.log(waterActivity) / 0.0180153).toBeCloseTo(osmolalityOsmPerKg, 12)
  })

  it('lets an unknown ion in by its charge alone and names the pairs', () => {
    const own: SpeciesRecord = { id: 'drugH+', charge: 1, component: 'drug', count: 1, molarMass: 200 }
    const model = compileActivityModel([...speciesOf(['Na+', 'Cl-']), own], library.electrolytes, 25)
    expect(model.missingPairs).toEqual([['drugH+', 'Cl-']])
    const alone = Float64Array.of(0, 0.1, 0.1)
    const root = Math.sqrt(0.1)
    const debyeHueckel = 1 - (0.39145 * root) / (1 + 1.2 * root)
    expect(model.osmotic(alone).osmoticCoefficient).toBeCloseTo(debyeHueckel, 4)
    expect(model.relativeUncertainty(alone)).toBeGreaterThan(0.03)
    expect(model.relativeUncertainty(Float64Array.of(0.1, 0.11, 0.01))).toBeLessThan(0.012)
  })
})
