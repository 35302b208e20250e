import { findingOf } from '../finding.ts'
import type { Finding } from '../types.ts'
import type { RemarkContext } from './remarkContext.ts'

/** What the balance cannot show, cannot weigh well, or changes by its steps. Masses are those of the batch. */
export function weighingRemarks({ plan, lowered, read }: RemarkContext): Finding[] {
  const { balance, library, conventions } = plan
  const { readabilityG, leastWeighableG, batchFactor } = balance
  if (readabilityG === null) return []
  const ingredients = new Map(read.map(({ key, ingredient }) => [key, ingredient]))
  return lowered.flatMap((line) => {
    const ingredient = ingredients.get(line.key)
    if (!ingredient) return []
    const grams = (line.articleGrams ?? line.grams) * batchFactor
    const change = line.gramsExact === 0 ? 0 : line.grams / line.gramsExact - 1
    const values = {
      ingredient: ingredient.name,
      grams,
      readabilityG,
      leastG: leastWeighableG,
      multiple: Math.ceil(leastWeighableG / grams),
      changePercent: change * 100,
    }
    const about = { values, ingredients: [ingredient.id], lineKeys: [line.key] }
    if (line.belowReadability) return [findingOf(library, 'below-readability', about)]
    const found: Finding[] = []
    if (line.belowLeastWeighable) found.push(findingOf(library, 'below-least-weighable', about))
    if (Math.abs(change) > conventions.roundingWorthMentionFraction.value) {
      found.push(findingOf(library, 'rounding-changes-strength', about))
    }
    return found
  })
}
