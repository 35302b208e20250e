import { describe, expect, it } from 'vitest'
import { debyeHueckelSlope } from '../../../src/chemistry/activity/debye-hueckel.ts'
import { sodiumChlorideOsmolality } from '../../../src/chemistry/activity/sodium-chloride.ts'
import { invert, limitingOsmoticCoefficient } from '../../../src/chemistry/curve/curve.ts'
import { neutralCurve } from '../../../src/chemistry/curve/neutral.ts'
import { pointsOf, shapeOf } from '../../../src/chemistry/curve/points.ts'
import {
  countAt,
  curveOf,
  molalityOf,
  tabulatedCurve,
  uncertaintyAt,
} from '../../../src/chemistry/curve/tabulated.ts'
import { loadConventions } from '../../../src/library/conventions.ts'
import { loadEstimates } from '../../../src/library/estimates.ts'
import { library, ownIngredient, type OwnRecord } from '../../evaluation/formulas.ts'

const slope = debyeHueckelSlope(0)
const known = { conventions: loadConventions(), estimates: loadEstimates() }
const sodiumChloride = sodiumChlorideOsmolality(library)

function tableOf(own: OwnRecord) {
  const ingredient = ownIngredient(own)
  const points = pointsOf(ingredient, 1, known)
  if (!points) throw new Error('nothing is known')
  return {
    ingredient,
    points,
    table: tabulatedCurve(ingredient, points.points, shapeOf(ingredient), sodiumChloride, slope),
  }
}

const sodiumChlorideOf = (point: object | undefined) =>
  point && 'sodiumChloridePercent' in point ? Number(point.sodiumChloridePercent) : Number.NaN

describe('limiting osmotic coefficient', () => {
  it('is 1 for a molecule and 0.910 for a 1:1 salt of 0.1 mol/kg at 25 °C', () => {
    expect(limitingOsmoticCoefficient(0.1, { strengthPerMolal: 0, chargeProduct: 0 }, 0.3914)).toBe(1)
    const shape = { strengthPerMolal: 1, chargeProduct: 1 }
    const root = Math.sqrt(0.1)
    const worked = 1 - (0.3914 * root) / (1 + 1.2 * root)
    expect(limitingOsmoticCoefficient(0.1, shape, 0.3914)).toBeCloseTo(worked, 12)
    expect(worked).toBeCloseTo(0.9103, 4)
  })
})

describe('what is known of a solute', () => {
  it('equivalents go first, then a depression, then the ionic class', () => {
    const both = tableOf({ name: 'both', molarMass: 300, equivalent: 0.2, depression: 0.3 })
    expect(both.points).toMatchObject({ basis: 'tabulated-curve', points: [{ sodiumChloridePercent: 0.2 }] })
    const depression = tableOf({ name: 'depression', molarMass: 300, depression: 0.104 })
    expect(sodiumChlorideOf(depression.points.points[0])).toBeCloseTo(0.18, 12)
    const byClass = tableOf({ name: 'class', molarMass: 170, electrolyteClass: 'uni-univalent' })
    expect(byClass.points.basis).toBe('class-estimate')
    expect(sodiumChlorideOf(byClass.points.points[0])).toBeCloseTo(0.34, 12)
  })

  it('nothing at all is refused above a trace', () => {
    const nothing = ownIngredient({ name: 'nothing', molarMass: 300 })
    expect(pointsOf(nothing, 1, known)).toBeNull()
    expect(pointsOf(nothing, 0.05, known)?.basis).toBe('bounded')
  })

  it('the charge type comes from the ions, else from the class', () => {
    const shape = (own: OwnRecord) => shapeOf(ownIngredient(own))
    const base = { name: 'salt', molarMass: 300 }
    expect(shape({ ...base, ions: [1, -1] })).toEqual({ strengthPerMolal: 1, chargeProduct: 1 })
    expect(shape({ ...base, ions: [1, 1, -2] })).toEqual({ strengthPerMolal: 3, chargeProduct: 2 })
    expect(shape({ ...base, ions: [3, -3] })).toEqual({ strengthPerMolal: 9, chargeProduct: 4 })
    expect(shape({ ...base, electrolyteClass: 'di-divalent' })).toEqual({
      strengthPerMolal: 4,
      chargeProduct: 4,
    })
    expect(shape(base)).toEqual({ strengthPerMolal: 0, chargeProduct: 0 })
  })
})

describe('curve made of a table', () => {
  const record: OwnRecord = { name: 'drug', molarMass: 300, equivalent: 0.24, ions: [1, -1] }

  it('meets its tabulated point: 1 % is iso-osmotic with 0.24 % sodium chloride', () => {
    const { ingredient, table } = tableOf(record)
    const curve = curveOf(table, slope)
    const molality = molalityOf(ingredient, 1)
    expect(curve.osmolalityAt(molality)).toBeCloseTo(sodiumChloride(0.24), 12)
    expect(curve.molalityAt(sodiumChloride(0.24))).toBeCloseTo(molality, 12)
    expect(curve.osmolalityAt(0)).toBe(0)
    expect(curve.molalityAt(0)).toBe(0)
  })

  it('turns % w/v into molality with the solute’s own room: 1 % of 300 g/mol is 0.03363 mol/kg', () => {
    const { ingredient } = tableOf(record)
    expect(molalityOf(ingredient, 1)).toBeCloseTo(10 / 300 / (0.993 * 0.998204), 6)
  })

  it('counts between two points linearly in ln m, and keeps the nearest count outside', () => {
    const point = (ln: number, count: number) => ({ ln, count, relativeUncertainty: 0.02 })
    const table = {
      points: [point(0, 2), point(2, 1)],
      shape: { strengthPerMolal: 0, chargeProduct: 0 },
    }
    expect(countAt(table, Math.E)).toBeCloseTo(1.5, 12)
    expect(countAt(table, 0.5)).toBe(2)
    expect(countAt(table, 100)).toBe(1)
    expect(uncertaintyAt(table, 1)).toBe(0.02)
    expect(uncertaintyAt(table, Math.exp(3))).toBeCloseTo(Math.hypot(0.02, 0.04), 12)
    expect(uncertaintyAt(table, Math.exp(-2))).toBeCloseTo(Math.hypot(0.02, 0.03), 12)
  })
})

describe('measured curve of a molecule', () => {
  const curve = library.curves.get('D-glucose')
  if (!curve) throw new Error('no curve')

  it('is its freezing fit below, its fit at 25 °C above, in proportion between', () => {
    const at = (celsius: number) => neutralCurve(curve, celsius).osmolalityAt(0.5)
    const [a1, a2] = curve.freezing.coefficients
    expect(at(0)).toBeCloseTo(0.5 * (1 + 0.5 * a1! + 0.25 * a2!), 12)
    expect(at(-3)).toBe(at(0))
    expect(at(37)).toBe(at(25))
    expect(at(5)).toBeCloseTo(0.8 * at(0) + 0.2 * at(25), 12)
  })

  it('turns back without loss', () => {
    const freezing = neutralCurve(curve, 0)
    for (const molality of [1e-6, 0.1, 0.3, 2])
      expect(freezing.molalityAt(freezing.osmolalityAt(molality))).toBeCloseTo(molality, 11)
    expect(invert(1, 0.1, (m) => 2 * m)).toBeCloseTo(0.5, 13)
  })
})
