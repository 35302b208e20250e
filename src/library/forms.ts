import * as v from 'valibot'
import moietiesFile from '../../data/forms/moieties.json'
import { checked } from './checked.ts'
import { molarMassOf } from './formula-mass.ts'
import type { Ingredient } from './types.ts'

/** The part of a substance that an order can mean: a base, an anhydrous salt, an element. */
export interface Moiety {
  readonly id: string
  readonly name: string
  readonly formula: string
  /** g/mol, from the formula. */
  readonly molarMass: number
  /** What holds it on a shelf, and how many of it one formula unit holds. */
  readonly forms: readonly { readonly ingredient: string; readonly moieties: number }[]
}

const text = v.pipe(v.string(), v.trim(), v.nonEmpty())
const moietiesSchema = v.array(
  v.strictObject({
    id: v.pipe(v.string(), v.regex(/^[a-z0-9]+(-[a-z0-9]+)*$/)),
    name: text,
    formula: text,
    forms: v.pipe(
      v.array(v.strictObject({ ingredient: text, moieties: v.pipe(v.number(), v.integer(), v.minValue(1)) })),
      v.minLength(1),
    ),
  }),
)

export const formFiles: Readonly<Record<string, unknown>> = { moieties: moietiesFile }

/** Every moiety, its molar mass reckoned from its formula. */
export function loadMoieties(): readonly Moiety[] {
  return checked(moietiesSchema, moietiesFile, 'forms/moieties').map((moiety) => {
    const mass = molarMassOf(moiety.formula)
    if (!mass.ok) throw new Error(`data/forms/moieties.json: ${moiety.id}: ${mass.refusal.message}`)
    return { ...moiety, molarMass: mass.value }
  })
}

/** What an order for an ingredient can mean beside the ingredient itself. */
export const moietiesOf = (id: string, moieties: readonly Moiety[]): readonly Moiety[] =>
  moieties.filter(({ forms }) => forms.some(({ ingredient }) => ingredient === id))

/** Other articles of the same moiety that could be weighed instead. Elements do not count: they join unlike drugs. */
export function shelfForms(id: string, moieties: readonly Moiety[]): readonly string[] {
  const forms = moietiesOf(id, moieties)
    .filter(({ name }) => !name.endsWith('(element)'))
    .flatMap((moiety) => moiety.forms.map(({ ingredient }) => ingredient))
  return [...new Set(forms)]
}

export interface FormFactor {
  /** Grams of the article for one gram as ordered. */
  readonly factor: number
  readonly orderedName: string
  readonly orderedMolarMass: number
  /** How many of the ordered units one formula unit of the article holds. */
  readonly unitsPerArticle: number
}

/**
 * Mass of an article for one gram of what the order means: M(article) / (n · M(ordered)), n units in one formula unit of
 * the article. `orderedAs` is a moiety or another article of the same moiety. Null where both are not of one kind.
 * @example formFactor(timolol maleate, 'timolol-base', …) → factor 432.49 / 316.42 = 1.3668
 */
export function formFactor(
  article: Ingredient,
  orderedAs: string,
  ingredients: ReadonlyMap<string, Ingredient>,
  moieties: readonly Moiety[],
): FormFactor | null {
  const mass = article.molarMass?.value
  if (mass === undefined) return null
  const direct = moieties.find(({ id }) => id === orderedAs)
  if (direct) {
    const count = direct.forms.find(({ ingredient }) => ingredient === article.id)?.moieties
    if (count === undefined) return null
    return {
      factor: mass / (count * direct.molarMass),
      orderedName: direct.name,
      orderedMolarMass: direct.molarMass,
      unitsPerArticle: count,
    }
  }
  const ordered = ingredients.get(orderedAs)
  const orderedMass = ordered?.molarMass?.value
  const shared = moieties.find(
    ({ forms }) =>
      forms.some(({ ingredient }) => ingredient === article.id) &&
      forms.some(({ ingredient }) => ingredient === orderedAs),
  )
  if (!ordered || orderedMass === undefined || !shared) return null
  const countOf = (id: string) => shared.forms.find(({ ingredient }) => ingredient === id)?.moieties ?? 1
  const units = countOf(article.id) / countOf(orderedAs)
  return {
    factor: mass / (units * orderedMass),
    orderedName: ordered.name,
    orderedMolarMass: orderedMass,
    unitsPerArticle: units,
  }
}
