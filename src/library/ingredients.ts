import activesAToD from '../../data/ingredients/actives-a-to-d.json'
import activesEToN from '../../data/ingredients/actives-e-to-n.json'
import activesOToX from '../../data/ingredients/actives-o-to-x.json'
import antioxidantsChelators from '../../data/ingredients/antioxidants-chelators.json'
import buffers from '../../data/ingredients/buffers.json'
import electrolytes from '../../data/ingredients/electrolytes.json'
import polymersSurfactants from '../../data/ingredients/polymers-surfactants.json'
import preservatives from '../../data/ingredients/preservatives.json'
import solvents from '../../data/ingredients/solvents.json'
import tonicityAgents from '../../data/ingredients/tonicity-agents.json'
import { checked } from './checked.ts'
import { ingredientsSchema } from './schema.ts'
import type { Ingredient } from './types.ts'

export const ingredientFiles: Readonly<Record<string, unknown>> = {
  'actives-a-to-d': activesAToD,
  'actives-e-to-n': activesEToN,
  'actives-o-to-x': activesOToX,
  electrolytes,
  buffers,
  preservatives,
  'antioxidants-chelators': antioxidantsChelators,
  'tonicity-agents': tonicityAgents,
  'polymers-surfactants': polymersSurfactants,
  solvents,
}

/** Every ingredient of the library, checked; an error names file, path and reason. */
export function loadIngredients(): readonly Ingredient[] {
  return Object.entries(ingredientFiles).flatMap(([file, content]) =>
    checked(ingredientsSchema, content, `ingredients/${file}`),
  )
}

/**
 * The id of a generic name: lower case, every run of other characters than letters and digits one hyphen.
 *
 * @example ingredientIdOf('Calcium chloride dihydrate') → 'calcium-chloride-dihydrate'
 */
export function ingredientIdOf(name: string): string {
  return name
    .toLowerCase()
    .replaceAll(/[^a-z0-9]+/g, '-')
    .replaceAll(/^-|-$/g, '')
}
