import type { Ingredient } from '../../library/types.ts'
import { significant } from './figures.ts'

const subscripts = '₀₁₂₃₄₅₆₇₈₉'

/** The molecular formula with its counts below the line; a number before a part of it stays on the line. */
export const formulaFact = ({ formula }: Ingredient): string | undefined =>
  formula?.replace(/(?<=[A-Za-z)\]])\d+/g, (digits) =>
    [...digits].map((digit) => subscripts.charAt(Number(digit))).join(''),
  )

export function molarMassFact({ molarMass }: Ingredient): string | undefined {
  return molarMass && `${significant(molarMass.value, 5)} ${molarMass.unit}`
}

/** The tabulated sodium chloride equivalent nearest to 1 %, with where it was read. */
export function equivalentFact({ sodiumChlorideEquivalents }: Ingredient): string {
  const tabulated = nearestToOnePercent(sodiumChlorideEquivalents)
  if (!tabulated) return 'no E known'
  return `E ${significant(tabulated.e.value, 2)} at ${significant(tabulated.atPercent, 2)} %`
}

export const equivalentWithStanding = (ingredient: Ingredient): string =>
  `${equivalentFact(ingredient)}${equivalentFromMemory(ingredient) ? ' from memory' : ''}`

export const equivalentFromMemory = ({ sodiumChlorideEquivalents }: Ingredient): boolean =>
  nearestToOnePercent(sodiumChlorideEquivalents)?.e.fromMemory ?? false

const nearestToOnePercent = (tabulated: Ingredient['sodiumChlorideEquivalents']) =>
  [...tabulated].sort((one, other) => Math.abs(one.atPercent - 1) - Math.abs(other.atPercent - 1))[0]
