import type { MethodAnswer } from '../types.ts'
import type { MethodSum } from './sum.ts'

/** mOsm/kg of each line by the headline. */
export type HeadlineShares = ReadonlyMap<string, number>

/**
 * The ingredient whose share differs most between a method and the headline, with the reason that belongs to it.
 * A method's share is its osmolality in proportion to what the line adds on the method's scale.
 */
export function largestDifference(
  { parts, sum }: MethodSum,
  osmolality: number | null,
  headline: HeadlineShares,
): MethodAnswer['differsBy'] {
  if (sum === null || osmolality === null || sum === 0) return null
  let largest: MethodAnswer['differsBy'] = null
  for (const { line, contribution } of parts) {
    const { key } = line
    const share = headline.get(key)
    if (contribution.status === 'missing' || share === undefined) continue
    const milliosmPerKg = (contribution.value / sum) * osmolality - share
    if (largest === null || Math.abs(milliosmPerKg) > Math.abs(largest.milliosmPerKg)) {
      largest = { key, milliosmPerKg, reason: contribution.reason }
    }
  }
  return largest
}
