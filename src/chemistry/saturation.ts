import type { Solid } from '../library/solids.ts'
import type { ThermalState } from './types.ts'

const gasConstant = 8.314462618e-3
const kelvin25 = 298.15

export interface Saturation {
  readonly solid: string
  /** log10 of the ion activity product over the constant: above 0 the solid can form. */
  readonly index: number
  /** Standard uncertainty of the index, from that of the constant. */
  readonly uncertainty: number
}

/** log K at a temperature by van 't Hoff; null away from 25 °C where no enthalpy is known. */
function logKAt({ logK, enthalpyKilojoulePerMole }: Solid, celsius: number): number | null {
  if (celsius === 25) return logK.value
  if (!enthalpyKilojoulePerMole) return null
  const inverse = 1 / (celsius + 273.15) - 1 / kelvin25
  return logK.value - (enthalpyKilojoulePerMole.value / (gasConstant * Math.LN10)) * inverse
}

/**
 * Saturation index of a solid in a speciated solution: log10(Π a(ion)^n · a(water)^w / a(H+)^p) − log K. Null where an
 * ion is absent, or its constant is not known at this temperature. Saturation says what may fall out, never that
 * nothing will.
 * @example saturationOf(gypsum, a solution with a(Ca+2) = a(SO4-2) = 10^-2.305 in pure water) → index 0
 */
export function saturationOf(solid: Solid, state: ThermalState): Saturation | null {
  const logK = logKAt(solid, state.celsius)
  if (logK === null) return null
  const activity = (species: string) =>
    (state.species[species] ?? 0) * (state.activityCoefficients[species] ?? Number.NaN)
  let product = solid.watersGiven * Math.log10(state.waterActivity)
  for (const { species, count } of solid.ions) {
    const value = activity(species)
    if (!(value > 0)) return null
    product += count * Math.log10(value)
  }
  if (solid.protonsTaken !== 0) {
    const protons = activity('H+')
    if (!(protons > 0)) return null
    product -= solid.protonsTaken * Math.log10(protons)
  }
  return { solid: solid.id, index: product - logK, uncertainty: solid.logK.uncertainty ?? 0 }
}
