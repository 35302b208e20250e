import { isWater } from './order/readLines.ts'
import type { Portion } from './model.ts'
import type { Evaluation } from './types.ts'

/** What is dissolved in an answered formula, with the masses that were evaluated. */
export const portionsInEvaluation = ({ lines }: Evaluation): readonly Portion[] =>
  lines.flatMap(({ key, ingredient, grams }) =>
    grams === null || isWater(ingredient) ? [] : [{ key, ingredient, grams }],
  )
