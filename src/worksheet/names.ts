import { ownTag } from '../library/make-ingredient.ts'
import { numberText } from './say.ts'
import type { LineAnswer } from '../evaluation/types.ts'

/** Generic name with its tall-man letters, salt and hydrate as the library writes it. */
export const nameOf = (line: LineAnswer): string => line.ingredient.tallManName ?? line.ingredient.name

/** Molecular formula with crystal water, and molar mass. */
export function identity({ ingredient }: LineAnswer): string | undefined {
  const parts = [
    ingredient.formula,
    ingredient.molarMass && `${numberText(ingredient.molarMass.value, 5)} g/mol`,
    ingredient.tags.includes(ownTag) ? 'entered by hand, not from the library' : undefined,
  ].filter((part) => part !== undefined)
  return parts.length > 0 ? parts.join(', ') : undefined
}
