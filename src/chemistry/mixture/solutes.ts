import type { Conventions } from '../../library/conventions.ts'
import type { NeutralCurve } from '../../library/curves.ts'
import type { ElectrolyteParameters } from '../../library/electrolytes.ts'
import type { Estimates } from '../../library/estimates.ts'
import type { Ingredient, SpeciesRecord } from '../../library/types.ts'
import { pointsOf, shapeOf, type Points } from '../curve/points.ts'
import { tabulatedCurve, type SodiumChlorideOsmolality, type TabulatedCurve } from '../curve/tabulated.ts'
import type { ChemistryProblem, Dissolved } from '../types.ts'
import { chargesOf, formalCountOf, givenBy, type SoluteFacts } from './facts.ts'

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
  readonly facts: SoluteFacts
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
  { key, ingredient }: Dissolved,
  molality: number,
  percent: number,
  facts: SoluteFacts,
  parts: SoluteParts,
): Solute | ChemistryProblem {
  const { curve, table } = facts
  if (curve) return { key, ingredient, molality, facts, kind: 'molecule', curve }
  if (facts.isInPool) return { key, ingredient, molality, facts, kind: 'pool' }
  // Bounds are for traces alone, so that they hang on the strength.
  if (table && (table.basis !== 'bounded' || pointsOf(ingredient, percent, parts))) {
    return { key, ingredient, molality, facts, kind: 'table', table: table.curve, basis: table.basis }
  }
  return { code: 'no-osmotic-data', values: { ingredient: ingredient.name }, keys: [key], fatal: true }
}

/** What is known of an ingredient whatever its amount. */
export function factsOf(ingredient: Ingredient, parts: SoluteParts, mark: number): SoluteFacts {
  const only = ingredient.releases?.length === 1 ? ingredient.releases[0] : undefined
  const curve = only && parts.curves.get(only.species)
  const inPool = isInPool(ingredient, parts)
  return {
    mark,
    curve,
    isInPool: inPool,
    table: curve || inPool ? null : tableOf(ingredient, parts),
    formalCount: formalCountOf(ingredient),
    given: givenBy(ingredient, parts.species),
    ...chargesOf(ingredient),
  }
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

function tableOf(ingredient: Ingredient, parts: SoluteParts): SoluteFacts['table'] {
  const known = pointsOf(ingredient, 0, parts)
  if (!known) return null
  const { points, basis } = known
  const curve = tabulatedCurve(ingredient, points, shapeOf(ingredient), parts.sodiumChloride, parts.slope)
  return { curve, basis }
}
