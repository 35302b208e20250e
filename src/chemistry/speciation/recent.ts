import type { ProtonCondition, SpeciationResult } from './types.ts'

const mostKept = 4

interface Kept {
  readonly totals: Float64Array
  /** Not a number where charge balance decides. */
  readonly pH: number
  readonly result: SpeciationResult
}

/**
 * The last few answers of one system, by exactly the amounts and the condition that they belong to: within one
 * evaluation the same solution is asked for several times. A solve hangs on nothing else, so that a kept answer is the
 * one that would be found again.
 */
export class RecentAnswers {
  private readonly kept: Kept[] = []

  answer(totals: Float64Array, condition: ProtonCondition, solve: () => SpeciationResult): SpeciationResult {
    const pH = condition.kind === 'pH' ? condition.pH : Number.NaN
    for (const earlier of this.kept) {
      if (Object.is(earlier.pH, pH) && isSame(earlier.totals, totals)) return earlier.result
    }
    const asked = totals.slice()
    const result = solve()
    if (this.kept.length >= mostKept) this.kept.shift()
    this.kept.push({ totals: asked, pH, result })
    return result
  }
}

function isSame(one: Float64Array, two: Float64Array): boolean {
  for (let at = 0; at < one.length; at += 1) if (one[at] !== two[at]) return false
  return true
}
