import { readTarget } from '../../quantity/readMeasure.ts'
import { expressNumber } from '../../quantity/express.ts'
import type { TargetQuantity } from '../../formula/types.ts'
import { targetUnits } from '../adjusting/target.ts'
import type { Finding } from '../types.ts'
import type { CautionContext, CautionSolution } from './context.ts'
import { asShown, type Shown } from './shown.ts'

interface Reached {
  readonly value: number
  readonly low: number
  readonly high: number
}

const shownAs: Readonly<Record<TargetQuantity, Shown>> = {
  osmolality: { decimals: 0 },
  'effective-osmolality': { decimals: 0 },
  'sodium-chloride-equivalent': { decimals: 3 },
  'freezing-point-depression': { decimals: 3 },
}

/**
 * A target that no line is sized to any more: the adjuster was fixed by hand, and an excipient came or went after
 * that. Told when the target lies outside of the interval within which a reading of this solution may lie.
 */
export function missedTarget({ formula, lines, solution }: CautionContext): Finding[] {
  const { target } = formula
  if (!target || !solution || lines.some(({ isAdjuster }) => isAdjuster)) return []
  const wanted = readTarget(target.quantity, target.value)
  const reached = reachedOf(target.quantity, solution)
  if (!wanted.ok || !reached) return []
  const shown = shownAs[target.quantity]
  const [low, high] = [asShown(reached.low, shown), asShown(reached.high, shown)]
  if (wanted.value >= low && wanted.value <= high) return []
  const unit = targetUnits[target.quantity]
  const values = {
    target: `${expressNumber(wanted.value)} ${unit}`,
    reached: `${expressNumber(asShown(reached.value, shown))} ${unit}`,
    interval: `${expressNumber(low)} to ${expressNumber(high)}`,
  }
  return [
    {
      code: 'target-missed',
      severity: 'warn',
      values,
      ingredients: [],
      lineKeys: [],
      source: 'project',
      blocks: false,
    },
  ]
}

/** What the solution comes to in the quantity of the target; null beyond the sodium chloride scale. */
function reachedOf(quantity: TargetQuantity, solution: CautionSolution): Reached | null {
  const { osmolality, effectiveOsmolality } = solution.intervals
  if (quantity === 'osmolality') return osmolality
  if (quantity === 'effective-osmolality') return effectiveOsmolality
  const value =
    quantity === 'sodium-chloride-equivalent'
      ? solution.sodiumChlorideEquivalentPercent
      : solution.freezingPointDepressionK
  if (value === null || osmolality.value <= 0) return null
  const share = (bound: number) => (value * bound) / osmolality.value
  return { value, low: share(osmolality.low), high: share(osmolality.high) }
}
