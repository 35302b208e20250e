import type { Lowered } from '../lowering.ts'
import type { LineAliquot } from '../types.ts'

/** The lines whose batch mass is below the least weighable one, with the dilution that measures it. */
export const aliquotsOf = (lowered: readonly Lowered[], batchFactor: number): readonly LineAliquot[] =>
  lowered
    .filter(({ isDiluted }) => isDiluted)
    .map(({ key, gramsExact, grams, articleGrams, aliquot }) => {
      const pure = grams === 0 ? 1 : (articleGrams ?? grams) / grams
      return { key, neededGrams: gramsExact * pure * batchFactor, plan: aliquot ?? null }
    })
