import { bufferedAt, capacityOf, type Buffered } from '../../chemistry/buffering.ts'
import type { BufferSystem, BufferWay } from '../../library/buffers.ts'
import type { Library } from '../../library/library.ts'
import type { Ingredient } from '../../library/types.ts'
import { findRoot } from '../../numeric/roots.ts'
import { compositionOf, type Portion, type Setting } from '../model.ts'
import type { BufferPart } from './types.ts'

/** The two things a buffer is put together from. `x` from 0 (most acid) to 1 (most alkaline) sets their amounts. */
export interface Recipe {
  readonly system: BufferSystem
  readonly way: BufferWay
  readonly acid: Ingredient
  readonly base: Ingredient
}

export type Reach =
  | { readonly status: 'reached'; readonly x: number; readonly buffered: Buffered }
  | { readonly status: 'out-of-reach'; readonly low: number; readonly high: number }
  | { readonly status: 'not-solved' }

/** Strong acid or base goes up to this many moles for each mole of the buffer. */
const mostTitrantPerMole = 4
/** and this much more for the acid or base of the drug itself, mol/L. */
const mostTitrantBeside = 0.3

/** How many of the buffering component one formula unit holds: 1 for a phosphate, 4 for borax. */
export function componentCount(
  { releases = [] }: Ingredient,
  system: BufferSystem,
  library: Library,
): number {
  return releases.reduce((sum, { species, count }) => {
    const record = library.species.get(species)
    return record?.component === system.component ? sum + count * record.count : sum
  }, 0)
}

/** Formula units of both parts for a strength, mol/L of the component. */
export function amountsAt(
  recipe: Recipe,
  molPerLitre: number,
  x: number,
  library: Library,
): { readonly acid: number; readonly base: number } {
  const { way, system, acid, base } = recipe
  const titrant = mostTitrantPerMole * molPerLitre + mostTitrantBeside
  if (way === 'acid-with-base')
    return { acid: molPerLitre / componentCount(acid, system, library), base: titrant * x }
  if (way === 'base-with-acid')
    return { acid: titrant * (1 - x), base: molPerLitre / componentCount(base, system, library) }
  return {
    acid: (molPerLitre * (1 - x)) / componentCount(acid, system, library),
    base: (molPerLitre * x) / componentCount(base, system, library),
  }
}

/** The lines of a recipe in a volume. */
export function partsOf(
  recipe: Recipe,
  molPerLitre: number,
  x: number,
  volumeMl: number,
  library: Library,
): readonly BufferPart[] {
  const { acid, base, way } = recipe
  const amounts = amountsAt(recipe, molPerLitre, x, library)
  const part = (ingredient: Ingredient, amount: number, kind: BufferPart['part']): BufferPart => ({
    ingredient: ingredient.id,
    grams: (amount * (ingredient.molarMass?.value ?? Number.NaN) * volumeMl) / 1000,
    millimolesPerLitre: amount * 1000,
    part: kind,
  })
  return [
    part(acid, amounts.acid, way === 'base-with-acid' ? 'strong-acid' : 'acid-form'),
    part(base, amounts.base, way === 'acid-with-base' ? 'strong-base' : 'base-form'),
  ].filter(({ grams }) => grams > 0)
}

/** Finds how both parts share a strength so that the whole solution has the wanted pH. */
export function reach(
  recipe: Recipe,
  molPerLitre: number,
  pH: number,
  around: { readonly portions: readonly Portion[]; readonly setting: Setting },
  library: Library,
): Reach {
  const { portions, setting } = around
  const at = (x: number): Buffered | null => {
    const parts = partsOf(recipe, molPerLitre, x, setting.volumeMl, library)
    const own = parts.map(({ ingredient, grams, part }) => ({
      key: `buffer ${part}`,
      ingredient: ingredient === recipe.acid.id ? recipe.acid : recipe.base,
      grams,
    }))
    const composition = compositionOf([...portions, ...own], setting)
    const result = bufferedAt(composition, library, setting.temperatureCelsius)
    return result.status === 'ready' ? result : null
  }
  const gap = (x: number) => (at(x)?.answer.pH ?? Number.NaN) - pH
  const root = findRoot(gap, 0, 1, { relativeTolerance: 1e-9, absoluteTolerance: 1e-10 })
  if (root.status === 'no-bracket')
    return { status: 'out-of-reach', low: root.atLow + pH, high: root.atHigh + pH }
  if (root.status !== 'converged') return { status: 'not-solved' }
  const buffered = at(root.root)
  return buffered ? { status: 'reached', x: root.root, buffered } : { status: 'not-solved' }
}

/** Capacity of a reached solution, mmol/L and pH. */
export const capacityAt = (buffered: Buffered): number => capacityOf(buffered).molPerLitrePerPH * 1000
