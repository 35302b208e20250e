import { findIngredients, type IngredientMatch } from '../../library/find.ts'
import type { Library } from '../../library/library.ts'
import type { Ingredient } from '../../library/types.ts'
import { equivalentWithStanding, formulaFact, molarMassFact } from '../words/ingredient.ts'

export interface Candidate {
  readonly id: string
  readonly name: string
  /** The synonym or number by which it was found, when not by its name. */
  readonly matched: string | null
  readonly facts: string
}

/** What the ingredient cell offers for the text typed into it. */
export const searchIn =
  (library: Library) =>
  (text: string): readonly Candidate[] =>
    findIngredients(library, text).map(candidateOf)

function candidateOf({ ingredient, matched, by }: IngredientMatch): Candidate {
  return {
    id: ingredient.id,
    name: ingredient.tallManName ?? ingredient.name,
    matched: by === 'name' ? null : matched,
    facts: [formulaFact(ingredient), molarMassFact(ingredient), equivalentWithStanding(ingredient)]
      .filter((fact) => fact !== undefined)
      .join(' · '),
  }
}

/** The one ingredient that is called exactly this by name, synonym or id; nothing is guessed. */
export function calledExactly(library: Library, text: string): Ingredient | null {
  const wanted = text.trim().toLowerCase()
  if (wanted === '') return null
  const called = [...library.ingredients.values()].filter(
    ({ id, name, synonyms }) =>
      id === wanted || [name, ...synonyms].some((known) => known.toLowerCase() === wanted),
  )
  return called.length === 1 ? (called[0] ?? null) : null
}
