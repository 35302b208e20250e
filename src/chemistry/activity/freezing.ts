/*
 * Equilibrium of ice with a solution: ln a_w = (ΔH/R)(1/T₀ − 1/T) + (ΔC/R)(T₀/T − 1 + ln(T/T₀)), with the enthalpy of
 * fusion 6009.5 J/mol and its heat capacity change 37.3 J/(mol K) at 273.15 K. Robinson and Stokes 1965, from memory;
 * within 0.1 % of their polynomial down to −10 °C, which a test checks.
 */

const fusionEnthalpy = 6009.5
const heatCapacityChange = 37.3
const gasConstant = 8.314462618
const meltingKelvin = 273.15
const waterKgPerMol = 0.0180153

/** Deepest depression for which the relation is used, K. */
export const deepestDepression = 40

/**
 * Osmolality of the solution that freezes that much below pure water, osmol per kg. 0 to 40 K.
 * @example osmolalityAtDepression(1.86) → 1.0012
 */
export function osmolalityAtDepression(kelvin: number): number {
  const temperature = meltingKelvin - kelvin
  const ratio = meltingKelvin / temperature
  const enthalpy = (fusionEnthalpy / (gasConstant * meltingKelvin)) * (1 - ratio)
  const capacity = (heatCapacityChange / gasConstant) * (ratio - 1 - Math.log(ratio))
  return -(enthalpy + capacity) / waterKgPerMol
}

/**
 * Freezing-point depression of a solution of that osmolality at its freezing point, K. Not a number beyond 40 K, where
 * the relation is not used.
 * @example freezingDepression(1) → 1.8578
 */
export function freezingDepression(osmolalityOsmPerKg: number): number {
  let kelvin = 1.86 * osmolalityOsmPerKg
  for (let round = 0; round < 8; round += 1) {
    const slope = (osmolalityAtDepression(kelvin + 1e-4) - osmolalityAtDepression(kelvin - 1e-4)) / 2e-4
    kelvin -= (osmolalityAtDepression(kelvin) - osmolalityOsmPerKg) / slope
  }
  return kelvin <= deepestDepression ? kelvin : Number.NaN
}

/** Below −10 °C the parameters of the solutes are not carried on any further, K. */
const coldestOfParameters = 10

/**
 * Where a solution whose osmolality is `zero + slope·t` below 0 °C meets ice: its depression and its osmolality there.
 * Null beyond the depth at which the relation is used.
 * @example osmolalityAtOwnFreezing(1, 0) → { kelvin: 1.8578, osmolalityOsmPerKg: 1 }
 */
export function osmolalityAtOwnFreezing(
  zero: number,
  slopePerKelvin: number,
): { readonly kelvin: number; readonly osmolalityOsmPerKg: number } | null {
  let osmolalityOsmPerKg = zero
  let kelvin = freezingDepression(osmolalityOsmPerKg)
  for (let round = 0; round < 12; round += 1) {
    osmolalityOsmPerKg = zero - slopePerKelvin * Math.min(kelvin, coldestOfParameters)
    kelvin = freezingDepression(osmolalityOsmPerKg)
  }
  return Number.isFinite(kelvin) ? { kelvin, osmolalityOsmPerKg } : null
}
