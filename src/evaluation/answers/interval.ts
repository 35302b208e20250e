import type { Interval } from '../../quantity/interval.ts'
import type { UncertaintyPart } from '../../chemistry/types.ts'

/** Standard normal quantile of a two-sided 95 % interval. */
const coverage = 1.959964

/** Root sum of squares of standard uncertainties, mOsm/kg. */
export const combined = (parts: readonly UncertaintyPart[]): number =>
  Math.sqrt(parts.reduce((sum, { osmolalityMilliosmPerKg }) => sum + osmolalityMilliosmPerKg ** 2, 0))

/**
 * A value with its 95 % interval.
 *
 * @example intervalAround(290, 5).low → 280.20018
 */
export const intervalAround = (value: number, standardUncertainty: number): Interval => ({
  value,
  low: value - coverage * standardUncertainty,
  high: value + coverage * standardUncertainty,
  standardUncertainty,
})

export interface Weighed {
  readonly key: string
  readonly name: string
  readonly grams: number
  readonly osmolalityMilliosmPerKg: number
  /** Standard uncertainty of this mass, relative, where it is not one of the step of a balance. */
  readonly relative?: number
}

/**
 * What the balance and the filling to volume add: a mass shown to d may be half a step off either way (d/√12 as a
 * standard uncertainty), a volume is off by its relative uncertainty.
 */
export function preparationParts(
  lines: readonly Weighed[],
  readabilityG: number | null,
  batchFactor: number,
  volumeRelativeUncertainty: number,
): readonly UncertaintyPart[] {
  const total = lines.reduce((sum, line) => sum + line.osmolalityMilliosmPerKg, 0)
  const step = readabilityG === null ? 0 : readabilityG / Math.sqrt(12) / batchFactor
  const weighing = lines
    .filter(({ grams }) => grams > 0)
    .map((line) => ({ ...line, relative: line.relative ?? step / line.grams }))
    .filter(({ relative }) => relative > 0)
    .map(({ key, name, relative, osmolalityMilliosmPerKg }) => ({
      kind: 'amount' as const,
      relative,
      key,
      input: `weighing of ${name}`,
      osmolalityMilliosmPerKg: osmolalityMilliosmPerKg * relative,
    }))
  const filling = {
    kind: 'every-amount' as const,
    relative: volumeRelativeUncertainty,
    key: '',
    input: 'final volume',
    osmolalityMilliosmPerKg: total * volumeRelativeUncertainty,
  }
  return [...weighing, filling]
}
