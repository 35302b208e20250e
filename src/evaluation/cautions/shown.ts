import { roundedToDigits, roundedToPlace } from '../../quantity/rational.ts'

/** Digits in which a figure stands on the page and on paper. */
export type Shown = { readonly decimals: number } | { readonly significant: number }

/**
 * A figure as a person sees it: rounded as it is written, halves away from zero. Limits are checked on this, so that
 * what is read and what is said never disagree.
 * @example asShown(240.4, { decimals: 0 }) → 240
 */
export function asShown(value: number, shown: Shown): number {
  return 'decimals' in shown
    ? roundedToPlace(value, -shown.decimals)
    : roundedToDigits(value, shown.significant)
}
