import type { Lowered } from '../lowering.ts'
import type { Scale } from './scales.ts'

/* A largest error with any value inside it as likely as any other has this share as its standard uncertainty. */
const uniform = 1 / Math.sqrt(3)

/** Largest relative error of what enters the batch: the aliquot's budget, the balance's error, the measure's. */
export function largestErrorOf(line: Lowered, batchFactor: number): number | null {
  if (line.aliquot) return line.aliquot.errorPercent / 100
  if (line.measured) return line.measured.measure.toleranceMl / line.measured.millilitres
  if (!line.scale || line.grams === 0) return null
  const onBalance = (line.articleGrams ?? line.grams) * batchFactor
  return onBalance > 0 ? line.scale.errorG / onBalance : null
}

/**
 * Standard uncertainty of a mass, relative: the step of the balance (d/√12) with its repeatability where that is
 * known; the budget of an aliquot, a measure or a sensitivity as a largest error (divided by √3).
 */
export function standardErrorOf(
  line: Lowered | undefined,
  batchFactor: number,
): { readonly relative?: number } {
  if (!line) return {}
  if (line.aliquot) return { relative: (line.aliquot.errorPercent / 100) * uniform }
  if (line.measured) {
    return { relative: (line.measured.measure.toleranceMl / line.measured.millilitres) * uniform }
  }
  const onBalance = (line.articleGrams ?? line.grams) * batchFactor
  return line.scale && onBalance > 0 ? { relative: standardErrorG(line.scale) / onBalance } : {}
}

function standardErrorG({ readabilityG, errorG, basis }: Scale): number {
  const step = readabilityG / Math.sqrt(12)
  if (basis === 'readability') return step
  return Math.hypot(step, basis === 'repeatability' ? errorG / 2 : errorG * uniform)
}
