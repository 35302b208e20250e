import { findingOf } from '../finding.ts'
import type { Lowered } from '../lowering.ts'
import type { Ingredient } from '../../library/types.ts'
import type { Finding } from '../types.ts'
import type { RemarkContext } from './remarkContext.ts'

/** What the balance cannot show, cannot weigh well, or changes by its steps. Masses are those of the batch. */
export function weighingRemarks(context: RemarkContext): Finding[] {
  if (context.plan.balance.readabilityG === null) return []
  const ingredients = new Map(context.read.map(({ key, ingredient }) => [key, ingredient]))
  const each = context.lowered.flatMap((line) => {
    const ingredient = ingredients.get(line.key)
    return ingredient ? lineRemarks(line, ingredient, context) : []
  })
  return [...each, ...leastWeighable(context, ingredients)]
}

function lineRemarks(line: Lowered, ingredient: Ingredient, { plan }: RemarkContext): Finding[] {
  const { balance, library, conventions } = plan
  const grams = onBalance(line, plan.balance.batchFactor)
  const change = line.gramsExact === 0 ? 0 : line.grams / line.gramsExact - 1
  const values = {
    ingredient: ingredient.name,
    grams,
    readabilityG: balance.readabilityG ?? 0,
    leastG: balance.leastWeighableG,
    multiple: grams > 0 ? Math.ceil(balance.leastWeighableG / grams) : 0,
    changePercent: change * 100,
  }
  const about = { values, ingredients: [ingredient.id], lineKeys: [line.key] }
  if (line.belowReadability) return [findingOf(library, 'below-readability', about)]
  return Math.abs(change) > conventions.roundingWorthMentionFraction.value
    ? [findingOf(library, 'rounding-changes-strength', about)]
    : []
}

/** One remark for all lines that are weighable, but not well; each line carries the mark too. */
function leastWeighable(
  { plan, lowered }: RemarkContext,
  ingredients: ReadonlyMap<string, Ingredient>,
): Finding[] {
  const below = lowered.filter((line) => line.belowLeastWeighable && !line.belowReadability)
  const named = below.flatMap(({ key }) => ingredients.get(key) ?? [])
  if (named.length === 0) return []
  return [
    findingOf(plan.library, 'below-least-weighable', {
      values: { ingredient: named.map(({ name }) => name).join(', '), leastG: plan.balance.leastWeighableG },
      ingredients: named.map(({ id }) => id),
      lineKeys: below.map(({ key }) => key),
    }),
  ]
}

const onBalance = (line: Lowered, batchFactor: number) => (line.articleGrams ?? line.grams) * batchFactor
