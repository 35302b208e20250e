import type { Datum } from '../../library/types.ts'

const gasConstant = 8.314462618
const standardKelvin = 298.15
const ln10 = Math.LN10

/**
 * ln K at a temperature minus ln K at 25 °C, by van 't Hoff with constant heat capacity:
 * Δ ln K = -(ΔH/R)(1/T - 1/T₀) + (ΔCp/R)(ln(T/T₀) + T₀/T - 1). ΔH in kJ/mol, ΔCp in J/(mol K) at 25 °C.
 * Meant for 0 to 60 °C.
 * Source: GoldbergKishoreLennen2002.
 * @example lnShift(47.45, -59, 37) → 0.7351
 */
export function lnShift(enthalpyKilojoule: number, heatCapacityJoule: number, celsius: number): number {
  const kelvin = celsius + 273.15
  const heat = -(enthalpyKilojoule * 1000) * (1 / kelvin - 1 / standardKelvin)
  const capacity = heatCapacityJoule * (Math.log(kelvin / standardKelvin) + standardKelvin / kelvin - 1)
  return (heat + capacity) / gasConstant
}

interface Shifted {
  readonly enthalpyKilojoulePerMole: Datum
  readonly heatCapacityJoulePerMoleKelvin?: Datum
}

const shiftOf = (constant: Shifted, celsius: number) =>
  lnShift(
    constant.enthalpyKilojoulePerMole.value,
    constant.heatCapacityJoulePerMoleKelvin?.value ?? 0,
    celsius,
  )

/** ln K of an ionisation at a temperature, zero ionic strength. */
export const lnAcidConstant = (step: Shifted & { readonly pKa: Datum }, celsius: number) =>
  -step.pKa.value * ln10 + shiftOf(step, celsius)

/** ln K of a formation at a temperature, zero ionic strength. */
export const lnFormationConstant = (formation: Shifted & { readonly logK: Datum }, celsius: number) =>
  formation.logK.value * ln10 + shiftOf(formation, celsius)

/**
 * pKa at a temperature, zero ionic strength.
 * @example pKaAt(step of TrisH+, 37) → 7.753
 */
export const pKaAt = (step: Shifted & { readonly pKa: Datum }, celsius: number) =>
  -lnAcidConstant(step, celsius) / ln10
