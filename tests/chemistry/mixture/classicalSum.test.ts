import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { debyeHueckelSlope } from '../../../src/chemistry/activity/debye-hueckel.ts'
import { sodiumChlorideOsmolality } from '../../../src/chemistry/activity/sodium-chloride.ts'
import { limitingOsmoticCoefficient } from '../../../src/chemistry/curve/curve.ts'
import { molalityOf } from '../../../src/chemistry/curve/tabulated.ts'
import { solveSolution } from '../../../src/chemistry/solution.ts'
import type { Ingredient } from '../../../src/library/types.ts'
import { library, ownIngredient, type OwnRecord } from '../../evaluation/formulas.ts'

/*
 * When the textbook sum Σ c·E is what equal water activity gives, and when it is not:
 *  - exact, whatever the curves, where every solute is tabulated at its isotonic strength and the sum is 0.9 %: a
 *    mixture of isotonic solutions is isotonic;
 *  - exact at every strength where all curves are straight lines (molecules with one tabulated point): the
 *    osmolalities add;
 *  - not for curves that bend: E belongs to the water activity of the mixture, not to the drug's own strength.
 */

const isotonic = sodiumChlorideOsmolality(library)

interface Part {
  readonly ingredient: Ingredient
  readonly percent: number
}

/** osmol/kg at freezing of solutes given in g per 100 mL. */
function osmolality(parts: readonly Part[]): number {
  const dissolved = parts.map(({ ingredient, percent }, index) => ({
    key: `${index}`,
    ingredient,
    amount: { kind: 'moles', mol: (percent * 10) / (ingredient.molarMass?.value ?? NaN) } as const,
  }))
  const result = solveSolution({ volumeLitres: 1, pH: 'solve', temperatureCelsius: 25, dissolved }, library, {
    temperatures: ['freezing'],
    uncertainty: false,
  })
  if (result.status === 'refused') throw new Error(JSON.stringify(result.problems))
  return result.state.states.freezing.osmolalityOsmPerKg
}

const ions = fc.constantFrom<readonly number[] | undefined>(undefined, [1, -1], [1, 1, -2], [2, -1, -1])
const molarMass = fc.integer({ min: 120, max: 600 })

/** A solute known by a single equivalent at the strength that is said to be isotonic. */
const isotonicSolute = fc
  .tuple(fc.integer({ min: 8, max: 60 }), molarMass, ions)
  .map(([hundredths, mass, charges]): Part => {
    const equivalent = hundredths / 100
    const percent = 0.9 / equivalent
    const own: OwnRecord = {
      name: `solute ${hundredths} ${mass} ${charges?.join('') ?? ''}`,
      molarMass: mass,
      equivalent,
      equivalentAtPercent: percent,
      ...(charges ? { ions: charges } : {}),
    }
    return { ingredient: ownIngredient(own), percent }
  })

const isotonicSolutes = fc.uniqueArray(isotonicSolute, {
  minLength: 1,
  maxLength: 5,
  selector: ({ ingredient }) => ingredient.id,
})
const weights = fc.array(fc.integer({ min: 1, max: 100 }), { minLength: 5, maxLength: 5 })

/** The parts at random shares of one litre. */
function shared(parts: readonly Part[], sizes: readonly number[]): readonly Part[] {
  const whole = parts.reduce((sum, _, index) => sum + (sizes[index] ?? 0), 0)
  return parts.map((part, index) => ({ ...part, percent: (part.percent * (sizes[index] ?? 0)) / whole }))
}

describe('the classical sum as the special case of equal water activity', () => {
  it('isotonic solutions mixed by volume stay isotonic, exactly, whatever the shape of their curves', () => {
    fc.assert(
      fc.property(isotonicSolutes, weights, (parts, sizes) => {
        const mixed = shared(parts, sizes)
        const sum = mixed.reduce((total, { ingredient, percent }) => {
          const [row] = ingredient.sodiumChlorideEquivalents
          return total + percent * (row?.e.value ?? NaN)
        }, 0)
        expect(sum).toBeCloseTo(0.9, 12)
        expect(Math.abs(osmolality(mixed) / isotonic(0.9) - 1)).toBeLessThan(1e-9)
      }),
      { numRuns: 100 },
    )
  })

  it('so do isotonic solutions known by a freezing-point depression: the sum of depressions is 0.52 K', () => {
    /* 1 % depresses by 0.52 K: a solute whose isotonic strength is the one that is tabulated. */
    const parts = [180, 250, 420].map((mass) => ({
      ingredient: ownIngredient({ name: `depressing ${mass}`, molarMass: mass, depression: 0.52 }),
      percent: 1,
    }))
    for (const sizes of [
      [1, 1, 1],
      [5, 2, 1],
      [1, 30, 9],
    ])
      expect(osmolality(shared(parts, sizes)) / isotonic(0.9)).toBeCloseTo(1, 9)
  })

  it('sodium chloride itself is one of them, to the rounding of its volume', () => {
    const sodiumChloride = library.ingredients.get('sodium-chloride')
    if (!sodiumChloride) throw new Error('no sodium chloride')
    fc.assert(
      fc.property(isotonicSolutes, weights, (parts, sizes) => {
        const mixed = shared([...parts.slice(0, 4), { ingredient: sodiumChloride, percent: 0.9 }], sizes)
        expect(Math.abs(osmolality(mixed) / isotonic(0.9) - 1)).toBeLessThan(2e-4)
      }),
      { numRuns: 50 },
    )
  })

  it('molecules with one tabulated point add their osmolalities at any strength, exactly', () => {
    const molecule = fc.tuple(fc.integer({ min: 8, max: 60 }), molarMass, fc.integer({ min: 1, max: 30 }))
    const molecules = fc.uniqueArray(molecule, {
      minLength: 1,
      maxLength: 5,
      selector: ([e, mass]) => `${e} ${mass}`,
    })
    fc.assert(
      fc.property(molecules, (drawn) => {
        const dissolved = drawn.map(([hundredths, mass, tenthsOfMillimolal], index) => ({
          key: `${index}`,
          ingredient: ownIngredient({
            name: `molecule ${hundredths} ${mass}`,
            molarMass: mass,
            equivalent: hundredths / 100,
          }),
          amount: { kind: 'per-water', molPerKg: tenthsOfMillimolal / 10_000 } as const,
        }))
        const of = (items: typeof dissolved) => {
          const result = solveSolution(
            { volumeLitres: 1, pH: 'solve', temperatureCelsius: 25, dissolved: items },
            library,
            { temperatures: ['freezing'], uncertainty: false },
          )
          if (result.status === 'refused') throw new Error(JSON.stringify(result.problems))
          return result.state.states.freezing.osmolalityOsmPerKg
        }
        const apart = dissolved.reduce((sum, item) => sum + of([item]), 0)
        expect(Math.abs(of(dissolved) / apart - 1)).toBeLessThan(1e-11)
      }),
      { numRuns: 100 },
    )
  })

  it('equal curves, halved between two names, are one curve: E is read at the mixture, not at each half', () => {
    const named = (name: string) =>
      ownIngredient({ name, molarMass: 300, equivalent: 0.3, equivalentAtPercent: 2, ions: [1, 1, -2] })
    const whole = osmolality([{ ingredient: named('one'), percent: 2 }])
    const halves = osmolality([
      { ingredient: named('one'), percent: 1 },
      { ingredient: named('two'), percent: 1 },
    ])
    expect(halves / whole).toBeCloseTo(1, 10)
    const apart = 2 * osmolality([{ ingredient: named('one'), percent: 1 }])
    expect(apart / whole - 1).toBeGreaterThan(0.015)
  })

  it('is not exact away from the tabulated strength: at half of it a salt’s equivalent is a little greater', () => {
    const salt = ownIngredient({
      name: 'salt',
      molarMass: 300,
      equivalent: 0.3,
      equivalentAtPercent: 3,
      ions: [1, 1, -2],
    })
    const half = osmolality([{ ingredient: salt, percent: 1.5 }]) / isotonic(0.45)
    /* Near 0.1 mol/kg of a salt of charges 2 and 1 at the tabulated strength; sodium chloride bends a little too. */
    const slope = debyeHueckelSlope(0)
    const shape = { strengthPerMolal: 3, chargeProduct: 2 }
    const effect = (percent: number) => {
      const molality = molalityOf(salt, percent)
      return molality * limitingOsmoticCoefficient(molality, shape, slope)
    }
    const expected = (effect(1.5) / effect(3)) * (isotonic(0.9) / isotonic(0.45))
    expect(expected).toBeGreaterThan(1.03)
    expect(half).toBeCloseTo(expected, 6)
  })
})
