import { balanceAt } from './balance.ts'
import type { Workspace } from './balance.ts'
import type { Layout } from './layout.ts'

/* The hydrogen ion activity at which the solution carries no charge. */

const lowest = -20 * Math.LN10
const highest = 4 * Math.LN10
const stillEnough = 1e-15
const mostSteps = 240
/** As often as this the bracket must have halved, or it is bisected. */
const lookEvery = 3

export type ProtonSearch =
  | { readonly found: true; readonly lnHydrogen: number }
  | { readonly found: false; readonly code: 'complexes-not-converged' | 'charge-not-balanced' }

/**
 * Solves Σ z m = 0 for ln a(H+) at fixed activity coefficients. Positive over negative charge rises with
 * a(H+) for every composition, so Newton on its logarithm is kept inside a bracket and cannot fail to close.
 * Stops when charge differs by less than `tolerance` of the charge that the pH can change.
 */
export function findNeutral(
  layout: Layout,
  work: Workspace,
  start: number,
  isFirst: boolean,
  tolerance: number,
): ProtonSearch {
  let low = lowest
  let high = highest
  let lnHydrogen = start
  let width = high - low
  for (let step = 0; step < mostSteps; step++) {
    if (!balanceAt(layout, work, lnHydrogen, isFirst && step === 0, tolerance)) {
      return { found: false, code: 'complexes-not-converged' }
    }
    const { positive, negative } = work
    const excess = Math.log(positive / negative)
    if (!Number.isFinite(excess)) return { found: false, code: 'charge-not-balanced' }
    if (Math.abs(positive - negative) <= tolerance * (positive + negative)) {
      return { found: true, lnHydrogen }
    }
    if (excess > 0) high = lnHydrogen
    else low = lnHydrogen
    const slope = work.positiveSlope / positive - work.negativeSlope / negative
    let next = lnHydrogen - excess / slope
    const isSlow = step % lookEvery === lookEvery - 1 && high - low > width / 2
    if (isSlow || !(next > low && next < high)) next = (low + high) / 2
    if (step % lookEvery === lookEvery - 1) width = high - low
    if (Math.abs(next - lnHydrogen) <= stillEnough * Math.abs(lnHydrogen)) {
      return { found: true, lnHydrogen }
    }
    lnHydrogen = next
  }
  return { found: false, code: 'charge-not-balanced' }
}
