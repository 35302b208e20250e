import { findIngredients, type IngredientMatch } from '../../library/find.ts'
import type { Library } from '../../library/library.ts'
import type { Stock } from '../../library/stocks.ts'
import type { Ingredient } from '../../library/types.ts'
import { equivalentWithStanding, formulaFact, molarMassFact } from '../words/ingredient.ts'

export interface Candidate {
  readonly id: string
  /** An ingredient of one's own comes with its whole record. */
  readonly record?: Ingredient
  /** A solution of one's own. */
  readonly stock?: Stock
  readonly name: string
  /** The synonym or number by which it was found, when not by its name. */
  readonly matched: string | null
  readonly facts: string
}

/** What the ingredient cell offers for the text typed into it. */
export const searchIn =
  (library: Library, ownOf: () => Own = () => none) =>
  (text: string): readonly Candidate[] => {
    const { ingredients, stocks } = ownOf()
    const own = new Map(ingredients.map((ingredient) => [ingredient.id, ingredient]))
    const solutions = [...stocks, ...library.stocks.values()]
    const matches = [
      ...findIngredients(library, text).map((match) => ({ match, candidate: candidateOf(match) })),
      ...findIngredients({ ingredients: own }, text).map((match) => ({
        match,
        candidate: { ...candidateOf(match), record: match.ingredient, matched: 'your own shelf' },
      })),
      ...findIngredients({ ingredients: asIngredients(solutions) }, text).map((match) => ({
        match: { ...match, score: match.score - behindIngredients },
        candidate: solutionCandidate(match, solutions, library),
      })),
    ]
    return matches
      .toSorted((a, b) => b.match.score - a.match.score)
      .slice(0, mostOffered)
      .map(({ candidate }) => candidate)
  }

/** What was added last, the latest first; what is known no more is left out. */
export function recentCandidates(
  library: Library,
  own: Own & { readonly recent: readonly string[] },
): readonly Candidate[] {
  const solutions = [...own.stocks, ...library.stocks.values()]
  const shapes = asIngredients(solutions)
  const matchOf = (ingredient: Ingredient): IngredientMatch => ({
    ingredient,
    matched: ingredient.name,
    by: 'name',
    score: 1,
  })
  return own.recent.flatMap((id) => {
    const known = library.ingredients.get(id)
    if (known) return [candidateOf(matchOf(known))]
    const record = own.ingredients.find((ingredient) => ingredient.id === id)
    if (record) return [{ ...candidateOf(matchOf(record)), record }]
    const solution = shapes.get(id)
    return solution ? [solutionCandidate(matchOf(solution), solutions, library)] : []
  })
}

/** What a person has on a shelf of one's own. */
export interface Own {
  readonly ingredients: readonly Ingredient[]
  readonly stocks: readonly Stock[]
}

const none: Own = { ingredients: [], stocks: [] }
const mostOffered = 10
/** A solution is offered after the substance of the same name. */
const behindIngredients = 0.08

const indexed = new WeakMap<Stock, Ingredient>()

/** Stocks in the shape that the search reads: names alone. */
function asIngredients(stocks: readonly Stock[]): ReadonlyMap<string, Ingredient> {
  const made = stocks.map((stock): readonly [string, Ingredient] => {
    const known = indexed.get(stock)
    if (known) return [stock.id, known]
    const shape: Ingredient = {
      id: stock.id,
      name: stock.name,
      synonyms: stock.synonyms,
      crystalWaters: 0,
      state: 'liquid',
      percentBasis: 'v/v',
      roles: [],
      tags: [],
      sodiumChlorideEquivalents: [],
    }
    indexed.set(stock, shape)
    return [stock.id, shape]
  })
  return new Map(made)
}

function solutionCandidate(
  { ingredient, matched, by }: IngredientMatch,
  stocks: readonly Stock[],
  library: Library,
): Candidate {
  const stock = stocks.find(({ id }) => id === ingredient.id)
  const holds = (stock?.contains ?? []).map(
    ({ ingredient: id, gramsPerLitre }) =>
      `${library.ingredients.get(id)?.name ?? id} ${gramsPerLitre.value} g/L`,
  )
  return {
    id: ingredient.id,
    name: ingredient.name,
    matched: by === 'name' ? null : matched,
    facts: `a solution: ${holds.join(', ')}`,
    ...(stock && !library.stocks.has(stock.id) ? { stock } : {}),
  }
}

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

/** The one ingredient or stock that is called exactly this by name, synonym or id; nothing is guessed. */
export function calledExactly(library: Library, text: string): { readonly id: string } | null {
  const wanted = text.trim().toLowerCase()
  if (wanted === '') return null
  const called = [...library.ingredients.values(), ...library.stocks.values()].filter(
    ({ id, name, synonyms }) =>
      id === wanted || [name, ...synonyms].some((known) => known.toLowerCase() === wanted),
  )
  return called.length === 1 ? (called[0] ?? null) : null
}
