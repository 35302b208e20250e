import * as v from 'valibot'
import type { Read } from '../quantity/amount.ts'
import { molarMassOf } from './formula-mass.ts'
import { ingredientIdOf } from './ingredients.ts'
import { ingredientSchema } from './schema.ts'
import type { Ingredient } from './types.ts'

/** Largest relative difference between a stated molar mass and that of the molecular formula. */
const massTolerance = 5e-4

const refuse = (code: string, message: string, wayOut: string): Read<never> => ({
  ok: false,
  refusal: { code, message, wayOut },
})

/**
 * An ingredient record that somebody brings along, held to the same rules as the library's own: shape, id from
 * the name, ions that balance, a molar mass that follows from the molecular formula.
 */
export function readIngredient(record: unknown): Read<Ingredient> {
  const result = v.safeParse(ingredientSchema, record, { abortEarly: true })
  if (!result.success) {
    const [issue] = result.issues
    return refuse(
      'ingredient-record-unreadable',
      `The ingredient record cannot be read at "${v.getDotPath(issue) ?? 'its top'}": ${issue.message}.`,
      'Write the record as the library writes its own, every figure with unit, kind and source.',
    )
  }
  const ingredient: Ingredient = result.output
  return refusalOf(ingredient) ?? { ok: true, value: ingredient }
}

function refusalOf({ id, name, formula, molarMass, releases = [] }: Ingredient): Read<never> | null {
  const expectedId = ingredientIdOf(name)
  if (id !== expectedId) {
    return refuse(
      'ingredient-id-differs',
      `The ingredient "${name}" carries the id "${id}".`,
      `Use the id that follows from the name: "${expectedId}".`,
    )
  }
  const net = releases.reduce((sum, { count, charge }) => sum + count * charge, 0)
  if (net !== 0) {
    return refuse(
      'ingredient-not-neutral',
      `What one formula unit of ${name} gives in water has a net charge of ${net}.`,
      'Name every ion it gives, the counter-ion too.',
    )
  }
  if (formula === undefined) return null
  const mass = molarMassOf(formula)
  if (!mass.ok) return mass
  if (molarMass && Math.abs(molarMass.value / mass.value - 1) > massTolerance) {
    return refuse(
      'ingredient-mass-differs',
      `${name} is given ${molarMass.value} g/mol, but ${formula} has ${mass.value.toFixed(2)} g/mol.`,
      'Check the crystal water in the formula, and the molar mass.',
    )
  }
  return null
}
