import type { WeighingRules } from '../../library/devices.ts'

/** One balance of the bench. */
export interface Scale {
  /** Empty for a balance that was named by its readability alone. */
  readonly name: string
  readonly readabilityG: number
  readonly leastWeighableG: number
  /** A smaller mass is not weighed as such: it is diluted or triturated. */
  readonly dilutedBelowG: number
  /** Largest error of one weighing, g. */
  readonly errorG: number
  readonly basis: 'readability' | 'repeatability' | 'sensitivity'
  readonly capacityG: number | null
}

export interface ScaleData {
  readonly name: string
  readonly readabilityG: number
  readonly repeatabilityG: number | null
  readonly sensitivityG: number | null
  readonly allowedErrorPercent: number | null
  readonly capacityG: number | null
}

/**
 * Least mass that a balance of the given sensitivity weighs within the allowed error, g.
 * LWQ = sensitivity / allowed relative error.
 * @example leastWeighable(0.006, 5) → 0.12
 */
export const leastWeighable = (sensitivityGrams: number, allowedErrorPercent: number): number =>
  (sensitivityGrams * 100) / allowedErrorPercent

/**
 * A balance with what it can weigh: largest error over allowed error. The error is its sensitivity, or 2·s with s
 * never below 0.41 readabilities; 0.10 % is allowed where nothing else is said, which makes 820 readabilities where s
 * is not known (USP41). A balance known by its readability alone weighs as such what errs by no more than 5 %.
 * @example scaleOf({ readabilityG: 0.0001, repeatabilityG: 0.00008, … }, rules).leastWeighableG → 0.16
 */
export function scaleOf(data: ScaleData, rules: WeighingRules): Scale {
  const { name, readabilityG, capacityG, sensitivityG, allowedErrorPercent, repeatabilityG } = data
  const allowed = allowedErrorPercent ?? rules.allowedFraction.value * 100
  if (sensitivityG !== null) {
    const least = leastWeighable(sensitivityG, allowed)
    const limits = { leastWeighableG: least, dilutedBelowG: least }
    return { name, readabilityG, ...limits, errorG: sensitivityG, basis: 'sensitivity', capacityG }
  }
  const leastDeviation = rules.leastRepeatabilityReadabilities.value * readabilityG
  const errorG = rules.repeatabilityMultiple.value * Math.max(repeatabilityG ?? 0, leastDeviation)
  const leastWeighableG = leastWeighable(errorG, allowed)
  const unnamed = leastWeighable(errorG, rules.unnamedAllowedFraction.value * 100)
  return {
    name,
    readabilityG,
    leastWeighableG,
    dilutedBelowG: name === '' ? unnamed : leastWeighableG,
    errorG,
    basis: repeatabilityG !== null && repeatabilityG > leastDeviation ? 'repeatability' : 'readability',
    capacityG,
  }
}

/* A mass that differs from a limit by the noise of its last binary digit is at the limit. */
const atAll = 1 - 1e-12

export const isBelowLeast = (grams: number, { leastWeighableG }: Scale): boolean =>
  grams < leastWeighableG * atAll

export const isDiluted = (grams: number, { dilutedBelowG }: Scale): boolean => grams < dilutedBelowG * atAll

/**
 * The balance for a mass: of those that take it, the coarsest that errs by no more than 0.10 %; where none does, the
 * one with the smallest error among those that may weigh it, then among all. Null when none takes the mass.
 */
export function chooseScale(grams: number, scales: readonly Scale[], rules: WeighingRules): Scale | null {
  const taking = scales.filter(({ capacityG }) => capacityG === null || grams <= capacityG)
  const exact = taking.filter((scale) => scale.errorG * atAll <= rules.allowedFraction.value * grams)
  const coarsest = exact.toSorted((a, b) => b.readabilityG - a.readabilityG)[0]
  if (coarsest) return coarsest
  const byError = taking.toSorted((a, b) => a.errorG - b.errorG)
  return byError.find((scale) => !isBelowLeast(grams, scale)) ?? byError[0] ?? null
}
