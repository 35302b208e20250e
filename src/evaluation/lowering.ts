import type { Amount } from '../quantity/amount.ts'
import { resolveAmount } from '../quantity/resolveAmount.ts'
import { roundToReadability } from '../quantity/readability.ts'
import type { Library } from '../library/library.ts'
import type { Ingredient } from '../library/types.ts'
import { findingOf } from './finding.ts'
import { factsOf } from './order/facts.ts'
import type { Finding } from './types.ts'

/** A line whose words were understood. */
export interface ReadLine {
  readonly key: string
  readonly ingredient: Ingredient
  readonly amount: Amount
  /** What the line is in the work: put into the solution, sized to the target, or the water around it. */
  readonly part: 'solute' | 'adjuster' | 'vehicle'
  readonly share: number
  /** Largest mass of an adjuster in the evaluated volume, g. */
  readonly capGrams: number | null
}

/** Masses of the pure substance in the evaluated volume. */
export interface Lowered {
  readonly key: string
  readonly gramsExact: number
  /** After rounding to the balance; everything downstream belongs to it. */
  readonly grams: number
  readonly articleGrams: number | null
  readonly millilitres: number | null
  readonly belowLeastWeighable: boolean
  readonly belowReadability: boolean
}

/** What the solution is like, for amounts that are written against it. */
export interface Surroundings {
  readonly volumeMl: number
  readonly waterKg: number
  readonly densityGPerMl: number
}

export interface Balance {
  /** g; null: nothing is rounded. */
  readonly readabilityG: number | null
  readonly leastWeighableG: number
  readonly batchFactor: number
}

/** Its mass follows from the finished solution, which must be known first. */
export const needsSurroundings = ({ amount }: ReadLine) =>
  amount.kind === 'moles-per-water-mass' || amount.kind === 'mass-per-mass'

/** Mass of a solute line in the evaluated volume, or the finding that says why there is none. */
export function lower(
  line: ReadLine,
  around: Surroundings,
  balance: Balance,
  library: Library,
): Lowered | Finding {
  const { ingredient, amount, key } = line
  const resolved = resolveAmount(amount, factsOf(ingredient, around.densityGPerMl), around.volumeMl)
  if (!resolved.ok) {
    const { message, wayOut } = resolved.refusal
    return findingOf(library, 'amount-unusable', {
      values: { ingredient: ingredient.name, text: amount.text, reason: message, instead: wayOut },
      ingredients: [ingredient.id],
      lineKeys: [key],
      blocks: true,
    })
  }
  const { grams, molPerKg = 0, millilitres } = resolved.value
  const exact = grams ?? molPerKg * (ingredient.molarMass?.value ?? Number.NaN) * around.waterKg
  return isByVolume(line) ? poured(line, exact, millilitres ?? null) : weighed(line, exact, balance)
}

export const isFinding = (result: Lowered | Finding): result is Finding => 'code' in result

/** A liquid that was ordered by volume is measured, not weighed. */
function isByVolume({ amount, ingredient }: ReadLine): boolean {
  if (amount.kind === 'volume' || amount.kind === 'volume-per-volume') return true
  return ingredient.percentBasis === 'v/v' && (amount.kind === 'percent' || amount.kind === 'ratio')
}

function poured({ key, ingredient }: ReadLine, grams: number, millilitres: number | null): Lowered {
  return {
    key,
    gramsExact: grams,
    grams,
    articleGrams: articleMass(ingredient, grams),
    millilitres,
    belowLeastWeighable: false,
    belowReadability: false,
  }
}

const articleMass = ({ article }: Ingredient, grams: number): number | null =>
  article ? grams / article.massFraction.value : null

/* A mass that differs from a limit by the noise of its last binary digit is at the limit. */
const belowAtAll = 1 - 1e-12

/**
 * Rounds what is put on the balance: the batch, and the article where it is not the pure substance. What the
 * balance cannot show stays exact, since it will not be weighed as such.
 */
export function weighed(
  { key, ingredient }: Pick<ReadLine, 'key' | 'ingredient'>,
  gramsExact: number,
  { readabilityG, leastWeighableG, batchFactor }: Balance,
): Lowered {
  const exactArticle = articleMass(ingredient, gramsExact)
  const onBalance = (exactArticle ?? gramsExact) * batchFactor
  const rounds = readabilityG !== null && onBalance >= readabilityG * belowAtAll && Number.isFinite(onBalance)
  const rounded = rounds ? roundToReadability(onBalance, readabilityG) / batchFactor : onBalance / batchFactor
  return {
    key,
    gramsExact,
    grams: rounds ? rounded * (ingredient.article?.massFraction.value ?? 1) : gramsExact,
    articleGrams: exactArticle === null ? null : rounded,
    millilitres: null,
    belowLeastWeighable: readabilityG !== null && onBalance > 0 && onBalance < leastWeighableG * belowAtAll,
    belowReadability: readabilityG !== null && onBalance > 0 && onBalance < readabilityG * belowAtAll,
  }
}
