import type { Estimates } from '../../library/estimates.ts'
import type { Compiled, PairTerm } from './compiled.ts'

/** Temperature at which the parameters of most pairs were measured. */
const measuredAtCelsius = 25

/**
 * Relative standard uncertainty of φ of a mixture: each cation–anion pair counts by m₊·m₋·|z₊z₋|; a pair without
 * parameters, without temperature terms, or beyond its molality range adds the stated estimate.
 */
export function mixtureUncertainty(
  m: Float64Array,
  { pairs, missing, charges }: Compiled,
  celsius: number,
  estimates: Estimates,
): number {
  let total = 0
  let variance = 0
  const weigh = (cation: number, anion: number) =>
    Math.abs((m[cation] ?? 0) * (m[anion] ?? 0) * (charges[cation] ?? 0) * (charges[anion] ?? 0))
  for (const pair of pairs) {
    const weight = weigh(pair.cation, pair.anion)
    total += weight
    variance += weight * pairVariance(pair, m, celsius, estimates)
  }
  for (const [cation, anion] of missing) {
    const weight = weigh(cation, anion)
    total += weight
    variance += weight * estimates.missingPair.value ** 2
  }
  const least = estimates.leastModelUncertainty.value
  return total === 0 ? least : Math.hypot(least, Math.sqrt(variance / total))
}

function pairVariance(
  { row, cation, anion }: PairTerm,
  m: Float64Array,
  celsius: number,
  estimates: Estimates,
): number {
  const away =
    celsius !== measuredAtCelsius && !row.temperatureSource ? estimates.missingTemperature.value : 0
  const strongest = Math.max(m[cation] ?? 0, m[anion] ?? 0)
  const beyond =
    strongest > row.maximumMolality
      ? Math.log(strongest / row.maximumMolality) * estimates.outOfRange.value
      : 0
  return row.relativeUncertainty ** 2 + away ** 2 + beyond ** 2
}

export interface PairRemark {
  readonly cation: string
  readonly anion: string
  readonly kind: 'missing' | 'beyond-range'
  /** Its part of all pairs, 0 to 1. */
  readonly weight: number
  readonly maximumMolality: number | null
}

/** Pairs that make the model less sure, with how much they weigh. */
export function pairRemarks(
  m: Float64Array,
  { pairs, missing, charges }: Compiled,
  ids: readonly string[],
): readonly PairRemark[] {
  const weigh = (cation: number, anion: number) =>
    Math.abs((m[cation] ?? 0) * (m[anion] ?? 0) * (charges[cation] ?? 0) * (charges[anion] ?? 0))
  const all = [
    ...pairs.map(({ cation, anion }) => weigh(cation, anion)),
    ...missing.map(([c, a]) => weigh(c, a)),
  ]
  const total = all.reduce((sum, weight) => sum + weight, 0) || 1
  const named = (cation: number, anion: number) => ({ cation: ids[cation] ?? '', anion: ids[anion] ?? '' })
  const absent = missing.map(([cation, anion]) => ({
    ...named(cation, anion),
    kind: 'missing' as const,
    weight: weigh(cation, anion) / total,
    maximumMolality: null,
  }))
  const beyond = pairs
    .filter(({ cation, anion, row }) => Math.max(m[cation] ?? 0, m[anion] ?? 0) > row.maximumMolality)
    .map(({ cation, anion, row }) => ({
      ...named(cation, anion),
      kind: 'beyond-range' as const,
      weight: weigh(cation, anion) / total,
      maximumMolality: row.maximumMolality,
    }))
  return [...absent, ...beyond]
}
