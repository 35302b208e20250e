import { type Rational, rationalOfNumber, roundToStep, toNumber } from '../../quantity/rational.ts'

/** Digits in which a figure stands on the page and on paper. */
export type Shown = { readonly decimals: number } | { readonly significant: number }

/**
 * A figure as a person sees it: rounded as it is written, halves away from zero. Limits are checked on this, so that
 * what is read and what is said never disagree.
 * @example asShown(240.4, { decimals: 0 }) → 240
 */
export function asShown(value: number, shown: Shown): number {
  if (value === 0) return 0
  const place =
    'decimals' in shown
      ? -shown.decimals
      : Number(value.toExponential().split('e')[1]) - shown.significant + 1
  return toNumber(roundToStep(rationalOfNumber(value), tenTo(place)))
}

const tenTo = (power: number): Rational =>
  power >= 0
    ? { numerator: 10n ** BigInt(power), denominator: 1n }
    : { numerator: 1n, denominator: 10n ** BigInt(-power) }
