import { loadEstimates } from '../../library/estimates.ts'
import type { Ingredient } from '../../library/types.ts'
import { waterDensity } from '../activity/debye-hueckel.ts'
import { specificVolume } from '../water/volume.ts'
import {
  invert,
  invertQuickly,
  limitingGrowth,
  limitingOsmoticCoefficient,
  type OsmoticCurve,
} from './curve.ts'

/** One point: a solution of `percent` w/v is iso-osmotic with a sodium chloride solution, or has this osmolality itself. */
export type EquivalentPoint = {
  readonly percent: number
  /** Relative standard uncertainty. */
  readonly relativeUncertainty: number
} & ({ readonly sodiumChloridePercent: number } | { readonly osmolalityOsmPerKg: number })

export interface Shape {
  /** Ionic strength per molal of formula units. */
  readonly strengthPerMolal: number
  /** |z₊z₋|; 0 for a molecule. */
  readonly chargeProduct: number
}

export interface TabulatedCurve {
  /** ln of molality and the apparent count of particles k·ν at each tabulated point, by rising molality. */
  readonly points: readonly {
    readonly ln: number
    readonly count: number
    readonly relativeUncertainty: number
  }[]
  readonly shape: Shape
}

/** mol NaCl per kg of water in a solution of that % w/v. */
export type SodiumChlorideOsmolality = (percentWeightInVolume: number) => number

/**
 * Turns a table into the apparent particle counts k·ν = O / (φ_DH·m), with O from the sodium chloride solution that is
 * iso-osmotic with it. Both sides are on the trade's basis, % w/v, and each has its own water.
 */
export function tabulatedCurve(
  ingredient: Ingredient,
  points: readonly EquivalentPoint[],
  shape: Shape,
  sodiumChloride: SodiumChlorideOsmolality,
  slope: number,
): TabulatedCurve {
  const known = points
    .map((point) => {
      const { percent, relativeUncertainty } = point
      const molality = molalityOf(ingredient, percent)
      const osmolality =
        'osmolalityOsmPerKg' in point ? point.osmolalityOsmPerKg : sodiumChloride(point.sodiumChloridePercent)
      const count = osmolality / (limitingOsmoticCoefficient(molality, shape, slope) * molality)
      return { ln: Math.log(molality), count, relativeUncertainty }
    })
    .toSorted((first, second) => first.ln - second.ln)
  return { points: known, shape }
}

/** mol (g without a molar mass) per kg of water of a solution of that % w/v at 20 °C. */
export function molalityOf(ingredient: Ingredient, percent: number): number {
  const gramsPerLitre = percent * 10
  const litres = (gramsPerLitre * specificVolume(ingredient).value) / 1000
  const waterKg = (1 - litres) * (waterDensity(20) / 1000)
  return gramsPerLitre / (ingredient.molarMass?.value ?? 1) / waterKg
}

/** Apparent count at a molality: linear in ln m between the points, constant outside them. */
export function countAt({ points }: TabulatedCurve, molality: number): number {
  const first = points[0]
  if (!first) return Number.NaN
  if (points.length === 1) return first.count
  const ln = Math.log(molality)
  let before = first
  for (const point of points) {
    if (point.ln >= ln) {
      if (point === before) return point.count
      const share = (ln - before.ln) / (point.ln - before.ln)
      return before.count + share * (point.count - before.count)
    }
    before = point
  }
  return before.count
}

/** Relative standard uncertainty there: that of the nearest point, growing with the distance outside the table. */
export function uncertaintyAt({ points, shape }: TabulatedCurve, molality: number): number {
  const ln = Math.log(molality)
  let nearest = Number.POSITIVE_INFINITY
  let relative = Number.NaN
  for (const point of points) {
    const distance = Math.abs(point.ln - ln)
    if (distance < nearest) [nearest, relative] = [distance, point.relativeUncertainty]
  }
  const first = points[0]?.ln ?? 0
  const last = points.at(-1)?.ln ?? 0
  const outside = Math.max(0, ln - last, first - ln)
  const { driftAboveTable, driftBelowTable } = loadEstimates()
  const drift = (ln > last ? driftAboveTable : driftBelowTable).value * (shape.chargeProduct > 1 ? 1.5 : 1)
  return Math.hypot(relative, outside * drift)
}

/** Growth of the apparent count with ln m. */
function growthAt({ points }: TabulatedCurve, molality: number): number {
  if (points.length < 2) return 0
  const ln = Math.log(molality)
  let before = points[0]
  for (const point of points) {
    if (point.ln >= ln) {
      return before && point !== before ? (point.count - before.count) / (point.ln - before.ln) : 0
    }
    before = point
  }
  return 0
}

/** The curve itself at a temperature, by its Debye–Hückel slope. */
export function curveOf(table: TabulatedCurve, slope: number): OsmoticCurve {
  const { shape } = table
  const osmolalityAt = (m: number) =>
    m <= 0 ? 0 : countAt(table, m) * limitingOsmoticCoefficient(m, shape, slope) * m
  const withSlope = (m: number, out: Float64Array) => {
    const count = countAt(table, m)
    const coefficient = limitingOsmoticCoefficient(m, shape, slope)
    out[0] = count * coefficient * m
    out[1] = (count + growthAt(table, m)) * coefficient + count * limitingGrowth(m, shape, slope)
  }
  const typical = table.points[0]?.count ?? 1
  // Of osmolalities asked for one after another each is near the last.
  let ratio = 1 / typical
  return {
    osmolalityAt,
    molalityAt(osmolality) {
      if (osmolality <= 0) return 0
      const found = invertQuickly(osmolality, osmolality * ratio, withSlope)
      if (found !== null) ratio = found / osmolality
      return found ?? invert(osmolality, osmolality / typical, osmolalityAt)
    },
  }
}
