import { distanceOfPrefix } from './spelling.ts'
import type { Ingredient } from './types.ts'

export interface IngredientMatch {
  readonly ingredient: Ingredient
  /** The name, synonym, number or role that was found. */
  readonly matched: string
  readonly by: 'name' | 'synonym' | 'cas' | 'role'
  /** 0 to 1: how well it fits. */
  readonly score: number
}

interface Term {
  readonly text: string
  readonly words: readonly string[]
  readonly by: IngredientMatch['by']
}

interface Entry {
  readonly ingredient: Ingredient
  readonly terms: readonly Term[]
  readonly isCommon: boolean
}

const leastScore = 0.45
const leastRoleLength = 4

/** Lower case without accents; both spellings of one sound made one. */
const fold = (text: string) =>
  text
    .toLowerCase()
    .normalize('NFD')
    .replaceAll(/[\u0300-\u036f]/g, '')
    .replaceAll('sulph', 'sulf')
    .replaceAll('aluminium', 'aluminum')

const wordsOf = (text: string) => fold(text).match(/[a-z0-9]+/g) ?? []

function entryOf(ingredient: Ingredient): Entry {
  const term = (text: string, by: Term['by']): Term => ({ text, words: wordsOf(text), by })
  return {
    ingredient,
    isCommon: ingredient.tags.includes('common'),
    terms: [
      term(ingredient.name, 'name'),
      ...ingredient.synonyms.map((synonym) => term(synonym, 'synonym')),
      ...(ingredient.formula ? [term(ingredient.formula, 'synonym')] : []),
      ...ingredient.roles.map((role) => term(role, 'role')),
    ],
  }
}

/** How well one typed word fits one word of a term, 0 to 1. */
function wordFit(typed: string, word: string): number {
  if (typed === word) return 1
  if (word.startsWith(typed)) return 0.8 + (0.15 * typed.length) / word.length
  if (typed.length < 4) return 0
  const allowed = typed.length < 7 ? 1 : 2
  const distance = distanceOfPrefix(typed, word, allowed)
  if (distance === null) return 0
  const isWhole = Math.abs(word.length - typed.length) <= allowed
  return (isWhole ? 0.86 : 0.74) - 0.12 * distance
}

function termFit(typed: readonly string[], term: Term): number {
  let sum = 0
  let letters = 0
  let place = 0
  for (const [index, word] of typed.entries()) {
    let best = 0
    for (const [position, candidate] of term.words.entries()) {
      const fit = wordFit(word, candidate) - (position === index ? 0 : 0.02)
      if (fit > best) {
        best = fit
        place += position === index ? 0 : 1
      }
    }
    if (best < 0.4) return 0
    sum += best * word.length
    letters += word.length
  }
  const surplus = Math.max(0, term.words.length - typed.length)
  return sum / letters - 0.015 * surplus - 0.005 * place
}

function bestOf(entry: Entry, typed: readonly string[], text: string): IngredientMatch | null {
  const { ingredient } = entry
  const number = text.replaceAll(/\s/g, '')
  if (/^\d{2,7}-[\d-]*$/.test(number) && ingredient.cas?.value.startsWith(number)) {
    return { ingredient, matched: ingredient.cas.value, by: 'cas', score: 1 }
  }
  let best: IngredientMatch | null = null
  for (const term of entry.terms) {
    if (term.by === 'role' && text.length < leastRoleLength) continue
    const weight = term.by === 'name' ? 1 : term.by === 'synonym' ? 0.98 : 0.6
    const fit = termFit(typed, term) * weight + (entry.isCommon ? 0.06 : 0)
    const isWhole = term.by !== 'role' && term.words.join(' ') === typed.join(' ')
    const score = isWhole ? 1 : Math.min(0.99, fit)
    if (score >= leastScore && score > (best?.score ?? 0)) {
      best = { ingredient, matched: term.text, by: term.by, score: Math.min(1, score) }
    }
  }
  return best
}

const indexes = new WeakMap<object, readonly Entry[]>()

function entriesOf(ingredients: ReadonlyMap<string, Ingredient>): readonly Entry[] {
  const known = indexes.get(ingredients)
  if (known) return known
  const made = [...ingredients.values()].map(entryOf)
  indexes.set(ingredients, made)
  return made
}

/**
 * Ingredients that fit what was typed, best first: by generic name, synonym, molecular formula, CAS number
 * or role. Small typing errors are forgiven; a prefix is enough. Nothing typed finds nothing.
 */
export function findIngredients(
  library: { readonly ingredients: ReadonlyMap<string, Ingredient> },
  text: string,
  limit = 8,
): readonly IngredientMatch[] {
  const typed = wordsOf(text.slice(0, 80))
  if (typed.length === 0) return []
  return entriesOf(library.ingredients)
    .map((entry) => bestOf(entry, typed, text.trim()))
    .filter((match) => match !== null)
    .toSorted((a, b) => b.score - a.score || (a.ingredient.id < b.ingredient.id ? -1 : 1))
    .slice(0, limit)
}
