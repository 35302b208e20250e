import type { Estimates } from '../../library/estimates.ts'
import { saltMolality, type Compiled, type PairTerm } from './compiled.ts'

/** Temperature at which the parameters of most pairs were measured, and how far from it the estimate is meant for. */
const usualCelsius = 25
const spanKelvin = 25

/**
 * Relative standard uncertainty of φ of a mixture: that of the pairs, weighed by m₊·m₋·|z₊z₋|, as if they erred
 * together. A pair without parameters, away from the temperature of its measurements, or beyond its molality range adds
 * the stated estimate; unknown θ and ψ are within the least uncertainty.
 */
export function mixtureUncertainty(
  m: Float64Array,
  { pairs, missing, charges }: Compiled,
  celsius: number,
  estimates: Estimates,
): number {
  let total = 0
  let sum = 0
  const weigh = (cation: number, anion: number) =>
    Math.abs((m[cation] ?? 0) * (m[anion] ?? 0) * (charges[cation] ?? 0) * (charges[anion] ?? 0))
  for (const pair of pairs) {
    const weight = weigh(pair.cation, pair.anion)
    total += weight
    sum += weight * Math.sqrt(pairVariance(pair, m, celsius, estimates))
  }
  for (const [cation, anion] of missing) {
    const weight = weigh(cation, anion)
    total += weight
    sum += weight * estimates.missingPair.value
  }
  const least = estimates.leastModelUncertainty.value
  return total === 0 ? least : Math.hypot(least, sum / total)
}

function pairVariance(pair: PairTerm, m: Float64Array, celsius: number, estimates: Estimates): number {
  const { row } = pair
  const distance = Math.abs(celsius - (row.measuredAtCelsius ?? usualCelsius)) / spanKelvin
  const { missingTemperature, temperatureForm } = estimates
  const away = distance * (row.temperatureSource ? temperatureForm : missingTemperature).value
  const strongest = saltMolality(pair, m)
  const beyond =
    strongest > row.maximumMolality
      ? Math.log(strongest / row.maximumMolality) * estimates.outOfRange.value
      : 0
  return row.relativeUncertainty ** 2 + away ** 2 + beyond ** 2
}
