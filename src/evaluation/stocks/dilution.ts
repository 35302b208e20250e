/* Dilution of one strength, and alligation of several; strengths in one unit, whatever it is. */

export type Dilution =
  | { readonly status: 'found'; readonly stockMl: number; readonly diluentMl: number; readonly fold: number }
  | { readonly status: 'refused'; readonly because: 'stock is weaker' | 'not above zero' }

/**
 * Volume of a stock that, made up with water to a volume, has a wanted strength: V1 = V2 · C2 / C1. Volumes are those
 * of measures filled to the mark; the diluent is what fills up, its figure the difference of volumes.
 * @example dilute(15, 5, 1500) → stockMl 500, diluentMl 1000, fold 3
 */
export function dilute(stockStrength: number, wanted: number, volumeMl: number): Dilution {
  if (!(stockStrength > 0 && wanted > 0 && volumeMl > 0))
    return { status: 'refused', because: 'not above zero' }
  if (wanted > stockStrength) return { status: 'refused', because: 'stock is weaker' }
  const stockMl = (volumeMl * wanted) / stockStrength
  return { status: 'found', stockMl, diluentMl: volumeMl - stockMl, fold: stockStrength / wanted }
}

export type Alligation =
  | { readonly status: 'found'; readonly parts: readonly number[] }
  | { readonly status: 'refused'; readonly because: 'not between' | 'below zero' }

/**
 * Parts of several strengths that give a strength between them: each stronger one is paired with each weaker one, in the
 * inverse ratio of their distances. Refused where the wanted strength is not between the weakest and the strongest.
 * @example alligate([95, 50], 70) → parts [20, 25]
 */
export function alligate(strengths: readonly number[], wanted: number): Alligation {
  if (!(wanted >= 0) || strengths.some((strength) => !(strength >= 0)))
    return { status: 'refused', because: 'below zero' }
  const parts = strengths.map(() => 0)
  const exact = strengths
    .map((strength, index) => (strength === wanted ? index : -1))
    .filter((index) => index >= 0)
  if (exact.length > 0)
    return { status: 'found', parts: parts.map((_, index) => (exact.includes(index) ? 1 : 0)) }
  for (const [i, high] of strengths.entries()) {
    for (const [j, low] of strengths.entries()) {
      if (!(high > wanted && low < wanted)) continue
      parts[i] = (parts[i] ?? 0) + (wanted - low)
      parts[j] = (parts[j] ?? 0) + (high - wanted)
    }
  }
  return parts.every((part) => part === 0)
    ? { status: 'refused', because: 'not between' }
    : { status: 'found', parts }
}

/**
 * Strength of a mixture of volumes, as if volumes added.
 * @example mixedStrength([[500, 40], [100, 90], [400, 0]]) → 29
 */
export function mixedStrength(parts: readonly (readonly [volume: number, strength: number])[]): number {
  const volume = parts.reduce((sum, [each]) => sum + each, 0)
  return parts.reduce((sum, [each, strength]) => sum + each * strength, 0) / volume
}
