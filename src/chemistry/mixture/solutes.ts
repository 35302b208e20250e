import type { Conventions } from '../../library/conventions.ts'
import type { NeutralCurve } from '../../library/curves.ts'
import type { ElectrolyteParameters } from '../../library/electrolytes.ts'
import type { Estimates } from '../../library/estimates.ts'
import type { Ingredient, SpeciesRecord } from '../../library/types.ts'
import { pointsOf, shapeOf, type Points } from '../curve/points.ts'
import { tabulatedCurve, type SodiumChlorideOsmolality, type TabulatedCurve } from '../curve/tabulated.ts'
import type { ChemistryProblem, Dissolved } from '../types.ts'

/** What the sorting of solutes needs of the library. */
export interface SoluteParts {
  readonly species: ReadonlyMap<string, SpeciesRecord>
  readonly electrolytes: ElectrolyteParameters
  readonly curves: ReadonlyMap<string, NeutralCurve>
  readonly conventions: Conventions
  readonly estimates: Estimates
  readonly sodiumChloride: SodiumChlorideOsmolality
  /** Debye–Hückel slope at freezing. */
  readonly slope: number
}

interface Base {
  readonly key: string
  readonly ingredient: Ingredient
  /** mol (g without a molar mass) per kg of water. */
  readonly molality: number
}

/** How a solute enters the mixture. */
export type Solute =
  | (Base & { readonly kind: 'pool' })
  | (Base & { readonly kind: 'molecule'; readonly curve: NeutralCurve })
  | (Base & { readonly kind: 'table'; readonly table: TabulatedCurve; readonly basis: Points['basis'] })

/**
 * Sorts a solute: into the pool of ions and molecules with parameters, to its own measured curve, or to the curve made
 * from its tabulated values. A salt whose own pair has no parameters goes by its table when it has one.
 */
export function soluteOf(
  item: Dissolved,
  molality: number,
  percent: number,
  parts: SoluteParts,
): Solute | ChemistryProblem {
  const { key, ingredient } = item
  const base = { key, ingredient, molality }
  const only = ingredient.releases?.length === 1 ? ingredient.releases[0] : undefined
  const curve = only && parts.curves.get(only.species)
  if (curve) return { ...base, kind: 'molecule', curve }
  if (isInPool(ingredient, parts)) return { ...base, kind: 'pool' }
  const points = pointsOf(ingredient, percent, parts)
  if (points) {
    const table = tableOf(ingredient, points, parts)
    return { ...base, kind: 'table', table, basis: points.basis }
  }
  return { code: 'no-osmotic-data', values: { ingredient: ingredient.name }, keys: [key], fatal: true }
}

export const isProblem = (result: Solute | ChemistryProblem): result is ChemistryProblem => 'code' in result

function isInPool(ingredient: Ingredient, { species, electrolytes }: SoluteParts): boolean {
  const { releases = [] } = ingredient
  if (releases.length === 0 || !ingredient.molarMass || !releases.every(({ species: id }) => species.has(id)))
    return false
  const cations = releases.filter(({ charge }) => charge > 0)
  const anions = releases.filter(({ charge }) => charge < 0)
  const complete = cations.every((cation) =>
    anions.every((anion) => electrolytes.binary.has(`${cation.species}|${anion.species}`)),
  )
  const hasTable = ingredient.sodiumChlorideEquivalents.some(({ e }) => e.value > 0)
  return complete || !hasTable
}

/* A table depends on the ingredient alone; the same one is asked for at every keystroke. */
const tables = new WeakMap<
  Ingredient,
  { readonly slope: number; readonly basis: string; readonly table: TabulatedCurve }
>()

function tableOf(ingredient: Ingredient, { points, basis }: Points, parts: SoluteParts): TabulatedCurve {
  const known = tables.get(ingredient)
  if (known && known.slope === parts.slope && known.basis === basis) return known.table
  const table = tabulatedCurve(ingredient, points, shapeOf(ingredient), parts.sodiumChloride, parts.slope)
  tables.set(ingredient, { slope: parts.slope, basis, table })
  return table
}
