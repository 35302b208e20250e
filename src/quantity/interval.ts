/** A value with a standard uncertainty and a 95 % interval, all in the same unit. */
export interface Interval {
  readonly value: number
  readonly low: number
  readonly high: number
  readonly standardUncertainty: number
}

/** Standard uncertainties that a 95 % interval of a normal distribution reaches to each side. */
export const coverageFactor95 = 1.959964

/**
 * The symmetric 95 % interval around a value. The standard uncertainty is finite and not negative, or a
 * RangeError.
 * @example intervalAround(290, 2.5) → { value: 290, low: 285.10009, high: 294.89991, standardUncertainty: 2.5 }
 */
export function intervalAround(value: number, standardUncertainty: number): Interval {
  if (!Number.isFinite(value) || !Number.isFinite(standardUncertainty) || standardUncertainty < 0) {
    throw new RangeError('An interval needs a finite value and an uncertainty that is not negative.')
  }
  const reach = coverageFactor95 * standardUncertainty
  return { value, low: value - reach, high: value + reach, standardUncertainty }
}

/**
 * The same interval in another unit; the factor is positive.
 * @example scaleInterval({ value: 2, low: 1, high: 3, standardUncertainty: 0.5 }, 10) → { value: 20, low: 10, high: 30, standardUncertainty: 5 }
 */
export const scaleInterval = (interval: Interval, factor: number): Interval => ({
  value: interval.value * factor,
  low: interval.low * factor,
  high: interval.high * factor,
  standardUncertainty: interval.standardUncertainty * factor,
})

/**
 * Whether a value lies in the interval, ends included.
 * @example contains({ value: 2, low: 1, high: 3, standardUncertainty: 0.5 }, 3) → true
 */
export const contains = ({ low, high }: Interval, value: number) => value >= low && value <= high
