const ln10 = Math.LN10
/** √(kg/mol) in the conventional activity of chloride. */
const conventionalSize = 1.5

/**
 * ln of the conventional activity coefficient of chloride behind the primary pH standards:
 * ln γ_Cl = -3 A_φ √I / (1 + 1.5 √I). Defined up to I = 0.1 mol/kg and continued above it.
 * Source: BatesGuggenheim1960.
 * @example lnConventionalChloride(0.1, 0.3915) → -0.2519
 */
export function lnConventionalChloride(ionicStrength: number, debyeHueckelSlope: number): number {
  const root = Math.sqrt(ionicStrength)
  return (-3 * debyeHueckelSlope * root) / (1 + conventionalSize * root)
}

/**
 * How a meter's scale lies against the model's ion activities, in ln units: the difference between the
 * model's and the conventional activity coefficient of (trace) chloride. Only the product γ_H γ_Cl can be
 * measured, so this makes the pH free of the model's own split into single ions.
 */
export const scaleShift = (lnChloride: number, ionicStrength: number, debyeHueckelSlope: number) =>
  lnChloride - lnConventionalChloride(ionicStrength, debyeHueckelSlope)

/**
 * pH from ln of the hydrogen ion activity and the shift of the scale.
 * @example pHOf(-16.118, 0) → 7.000
 */
export const pHOf = (lnHydrogenActivity: number, shift: number) => -(lnHydrogenActivity + shift) / ln10

/**
 * The inverse of `pHOf`.
 * @example lnHydrogenActivityOf(7, 0) → -16.118
 */
export const lnHydrogenActivityOf = (pH: number, shift: number) => -pH * ln10 - shift
