/** A value with a standard uncertainty and a 95 % interval, all in the same unit. */
export interface Interval {
  readonly value: number
  readonly low: number
  readonly high: number
  readonly standardUncertainty: number
}
