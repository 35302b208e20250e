import type { Conventions } from '../../library/conventions.ts'
import type { Estimates } from '../../library/estimates.ts'
import type { Datum, Ingredient, TabulatedEquivalent } from '../../library/types.ts'
import type { SoluteShare } from '../types.ts'
import { osmolalityAtDepression } from '../activity/freezing.ts'
import { molalityOf, type EquivalentPoint, type Shape } from './tabulated.ts'

export interface Known {
  readonly conventions: Conventions
  readonly estimates: Estimates
}

export interface Points {
  readonly points: readonly EquivalentPoint[]
  readonly basis: SoluteShare['basis'] | 'bounded'
}

const macromolecular: ReadonlySet<string> = new Set(['polymer', 'nonionic-surfactant'])

/**
 * What is known of a solute's osmotic effect, best first: tabulated equivalents, the depression of a 1 % solution,
 * measured osmolalities, a measured van 't Hoff factor (taken at 1 %), its ionic class; where nothing is known, bounds for a macromolecule or a trace. Null: not even bounds.
 */
export function pointsOf(ingredient: Ingredient, percent: number, known: Known): Points | null {
  const tabulated = ingredient.sodiumChlorideEquivalents
    .filter(({ e }) => e.value > 0)
    .map((row) => fromEquivalent(row, known.estimates))
  if (tabulated.length > 0) return { points: tabulated, basis: 'tabulated-curve' }
  const depression = ingredient.freezingPointDepression1Percent
  if (depression && depression.value > 0)
    return { points: [fromDepression(depression, known)], basis: 'tabulated-curve' }
  const measured = fromMeasured(ingredient, known)
  if (measured.length > 0) return { points: measured, basis: 'tabulated-curve' }
  return fromClass(ingredient, known) ?? bounds(ingredient, percent, known.estimates)
}

const fromEquivalent = ({ atPercent, e }: TabulatedEquivalent, estimates: Estimates): EquivalentPoint => ({
  percent: atPercent,
  sodiumChloridePercent: atPercent * e.value,
  relativeUncertainty: Math.max(e.uncertainty ?? 0, estimates.equivalentRounding.value) / e.value,
})

/** Points straight from measurements: osmometer readings, else a van 't Hoff factor. */
function fromMeasured(ingredient: Ingredient, { conventions, estimates }: Known): readonly EquivalentPoint[] {
  const { measuredOsmolality = [], measuredI, molarMass } = ingredient
  const uncertaintyOf = ({ value, uncertainty = 0 }: Datum) =>
    Math.max(uncertainty / value, estimates.measuredReading.value)
  if (measuredOsmolality.length > 0) {
    return measuredOsmolality.map(({ atPercent, osmolality }) => ({
      percent: atPercent,
      osmolalityOsmPerKg: osmolalityAtDepression(
        (osmolality.value / 1000) * conventions.cryoscopicConstant.value,
      ),
      relativeUncertainty: uncertaintyOf(osmolality),
    }))
  }
  if (!measuredI || !molarMass) return []
  return [
    {
      percent: 1,
      osmolalityOsmPerKg: measuredI.value * molalityOf(ingredient, 1),
      relativeUncertainty: uncertaintyOf(measuredI),
    },
  ]
}

function fromDepression(depression: Datum, { conventions, estimates }: Known): EquivalentPoint {
  const { isotonicDepressionKelvin, isotonicSodiumChloridePercent } = conventions
  return {
    percent: 1,
    sodiumChloridePercent:
      (depression.value / isotonicDepressionKelvin.value) * isotonicSodiumChloridePercent.value,
    relativeUncertainty:
      Math.max(depression.uncertainty ?? 0, estimates.depressionRounding.value) / depression.value,
  }
}

function fromClass(ingredient: Ingredient, { conventions, estimates }: Known): Points | null {
  const { electrolyteClass, molarMass } = ingredient
  if (!electrolyteClass || !molarMass) return null
  const equivalent =
    (conventions.equivalentPerLiso.value * conventions.lIso[electrolyteClass].value) / molarMass.value
  return {
    points: [
      { percent: 1, sodiumChloridePercent: equivalent, relativeUncertainty: estimates.classScatter.value },
    ],
    basis: 'class-estimate',
  }
}

function bounds(ingredient: Ingredient, percent: number, estimates: Estimates): Points | null {
  const isLarge = ingredient.tags.some((tag) => macromolecular.has(tag))
  if (!isLarge && percent > estimates.traceUpToPercent.value) return null
  const { value, uncertainty = value } = isLarge
    ? estimates.macromoleculeEquivalent
    : estimates.traceEquivalent
  return {
    points: [{ percent: 1, sodiumChloridePercent: value, relativeUncertainty: uncertainty / value }],
    basis: 'bounded',
  }
}

const shapeOfClass: Readonly<Record<string, Shape>> = {
  'uni-univalent': { strengthPerMolal: 1, chargeProduct: 1 },
  'uni-divalent': { strengthPerMolal: 3, chargeProduct: 2 },
  'di-univalent': { strengthPerMolal: 3, chargeProduct: 2 },
  'di-divalent': { strengthPerMolal: 4, chargeProduct: 4 },
  'uni-trivalent': { strengthPerMolal: 6, chargeProduct: 3 },
  'tri-univalent': { strengthPerMolal: 6, chargeProduct: 3 },
}

/** Charge type of a solute for the Debye–Hückel part of its curve: from its ions, else from its ionic class. */
export function shapeOf({ releases, electrolyteClass, molarMass }: Ingredient): Shape {
  const molecule = { strengthPerMolal: 0, chargeProduct: 0 }
  if (!molarMass) return molecule
  if (!releases?.length) return shapeOfClass[electrolyteClass ?? ''] ?? molecule
  let [strength, highest, lowest] = [0, 0, 0]
  for (const { count, charge } of releases) {
    strength += (count * charge * charge) / 2
    highest = Math.max(highest, charge)
    lowest = Math.min(lowest, charge)
  }
  // Above a product of 4 the limiting law overshoots at any strength that is used.
  return { strengthPerMolal: strength, chargeProduct: Math.min(4, -highest * lowest) }
}
