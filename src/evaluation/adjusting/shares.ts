/** A line that is sized to the target. */
export interface Adjuster {
  readonly key: string
  /** Mass ratio in which several are sized together. */
  readonly share: number
  readonly capGrams: number | null
}

/**
 * Masses of the adjusters for a common size x: share·x each, none above its cap. g.
 *
 * @example massesAt([{ key: 'a', share: 1, capGrams: 2 }, { key: 'b', share: 2, capGrams: null }], 3) → [2, 6]
 */
export const massesAt = (adjusters: readonly Adjuster[], size: number): readonly number[] =>
  adjusters.map(({ share, capGrams }) => Math.min(share * size, capGrams ?? Infinity))

/** The size from which nothing grows any more; infinite unless every adjuster has a cap. */
export const largestSize = (adjusters: readonly Adjuster[]): number =>
  Math.max(...adjusters.map(({ share, capGrams }) => (capGrams ?? Infinity) / share))
