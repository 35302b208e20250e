import { findRoot } from '../../numeric/roots.ts'
import { massesAt, largestSize, type Adjuster } from '../adjusting/shares.ts'
import type { Ingredient } from '../../library/types.ts'
import type { AdditiveMethod, MethodContext, MethodLine, MethodTarget } from './common.ts'
import type { LineContribution } from './sum.ts'

export interface MethodAdjuster extends Adjuster {
  readonly ingredient: Ingredient
}

export interface MethodSizing {
  /** The solutes beside the adjusters. */
  readonly fixed: readonly MethodLine[]
  /** Keys of the adjusters. */
  readonly keys: ReadonlySet<string>
  readonly adjusters: readonly MethodAdjuster[]
  readonly target: MethodTarget
  /** Weight of each line in the sum: 1, or its reflection coefficient for an effective target. */
  readonly weightOf: (ingredient: Ingredient) => number
}

export type MethodSized =
  | { readonly status: 'sized'; readonly grams: number; readonly masses: readonly number[] }
  | { readonly status: 'missing'; readonly code: string }

/** The adjuster's mass in the evaluated volume, all adjusters together, by the method's own sum and target. g. */
export function sizeByMethod(
  method: AdditiveMethod,
  others: readonly LineContribution[],
  sizing: MethodSizing,
  context: MethodContext,
): MethodSized {
  const wanted = method.targetOnScale(sizing.target, context)
  if (wanted === null) return { status: 'missing', code: 'missing-target-on-scale' }
  const contributionsAt = (size: number) =>
    linesAt(sizing, size).map((line) => ({ line, contribution: method.contribution(line, context) }))
  const fixed = weightedSum(others, sizing)
  if (fixed === null || weightedSum(contributionsAt(0), sizing) === null) {
    return { status: 'missing', code: 'missing-for-adjuster' }
  }
  if (fixed > wanted) return { status: 'missing', code: 'method-already-above' }
  const sumAt = (size: number) => fixed + (weightedSum(contributionsAt(size), sizing) ?? Number.NaN)
  const high = highEnough(sumAt, wanted, Math.min(largestSize(sizing.adjusters), context.volumeMl))
  if (high === null) return { status: 'missing', code: 'method-out-of-reach' }
  const found = findRoot((size) => sumAt(size) - wanted, 0, high, { relativeTolerance: 1e-13 })
  if (found.status !== 'converged') return { status: 'missing', code: 'method-not-converged' }
  const masses = massesAt(sizing.adjusters, found.root)
  return { status: 'sized', grams: masses.reduce((sum, mass) => sum + mass, 0), masses }
}

function linesAt({ adjusters }: MethodSizing, size: number): readonly MethodLine[] {
  const masses = massesAt(adjusters, size)
  return adjusters.map(({ key, ingredient }, index) => ({ key, ingredient, grams: masses[index] ?? 0 }))
}

function weightedSum(parts: readonly LineContribution[], { weightOf }: MethodSizing): number | null {
  let sum = 0
  for (const { line, contribution } of parts) {
    if (contribution.status === 'missing') return null
    sum += contribution.value * weightOf(line.ingredient)
  }
  return sum
}

/** A size whose sum is not below the wanted one; null up to the largest size. */
function highEnough(sumAt: (size: number) => number, wanted: number, largest: number): number | null {
  for (let size = largest / 1000; ; size = Math.min(largest, size * 4)) {
    if (sumAt(size) >= wanted) return size
    if (size >= largest) return null
  }
}
