import { rationalOfNumber, roundToStep, toNumber } from './rational.ts'

/**
 * A mass as a balance of this readability shows it: the nearest whole step, halves away from zero, in exact
 * decimals. Both in g; readability above zero, or a RangeError.
 * @example roundToReadability(0.29996, 0.001) → 0.3
 */
export function roundToReadability(grams: number, readabilityG: number): number {
  if (!Number.isFinite(grams)) throw new RangeError('A mass that is not finite cannot be rounded.')
  if (!Number.isFinite(readabilityG) || readabilityG <= 0) {
    throw new RangeError('The readability of a balance is above zero.')
  }
  return toNumber(roundToStep(rationalOfNumber(grams), rationalOfNumber(readabilityG)))
}
