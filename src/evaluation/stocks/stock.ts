import { waterIn } from '../../chemistry/water/water.ts'
import type { Formula } from '../../formula/types.ts'
import type { Library } from '../../library/library.ts'
import type { Stock } from '../../library/stocks.ts'
import type { Ingredient } from '../../library/types.ts'
import { compositionOf, type Portion } from '../model.ts'

/** The solution on the shelf that a part of the formula comes from. */
export interface StockShare {
  /** Key of the formula's line. */
  readonly lineKey: string
  readonly stock: Stock
  /** g of the ingredient in a millilitre of the solution. */
  readonly gramsPerMl: number
  /** Fills up to the final volume. */
  readonly fills: boolean
}

/** A solution by its id: of the library, or of the formula's own. */
export const stockOf = (id: string, formula: Formula, library: Library): Stock | undefined =>
  formula.stocks?.find((own) => own.id === id) ?? library.stocks.get(id)

export interface StockPart {
  readonly ingredient: Ingredient
  readonly gramsPerLitre: number
}

/** What a stock holds, with its ingredients looked up; the ids that are not known. */
export function contentsOf(
  stock: Stock,
  library: Library,
): { readonly parts: readonly StockPart[]; readonly unknown: readonly string[] } {
  const parts: StockPart[] = []
  const unknown: string[] = []
  for (const { ingredient: id, gramsPerLitre } of stock.contains) {
    const ingredient = library.ingredients.get(id)
    if (ingredient) parts.push({ ingredient, gramsPerLitre: gramsPerLitre.value })
    else unknown.push(id)
  }
  return { parts, unknown }
}

/** kg of water and g of solution in a millilitre; null where what it holds does not fit into its volume. */
export function bulkOf(
  stock: Stock,
  library: Library,
): { readonly waterKgPerMl: number; readonly densityGPerMl: number } | null {
  const { parts } = contentsOf(stock, library)
  const portions: Portion[] = parts.map(({ ingredient, gramsPerLitre }) => ({
    key: ingredient.id,
    ingredient,
    grams: gramsPerLitre,
  }))
  const water = waterIn(
    compositionOf(portions, { volumeMl: 1000, pH: 'solve', temperatureCelsius: 25 }),
    library.species,
  )
  if ('code' in water) return null
  return {
    waterKgPerMl: water.waterKg / 1000,
    densityGPerMl: stock.density?.value ?? water.densityGPerMl,
  }
}
