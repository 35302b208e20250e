import { mixingIntegral } from './electrostatic.ts'
import type { Mixings } from './flat.ts'

/** What the mixing of unlike charges writes to: E-θ and I·E-θ′ of each pair, J and x·J′ of each product of charges. */
export interface MixingWork {
  readonly theta: Float64Array
  readonly change: Float64Array
  readonly integrals: Float64Array
  readonly growths: Float64Array
}

export const mixingWork = ({ products, cross }: Mixings): MixingWork => ({
  theta: new Float64Array(cross.length),
  change: new Float64Array(cross.length),
  integrals: new Float64Array(products.length),
  growths: new Float64Array(products.length),
})

const integral = new Float64Array(2)

/**
 * E-θ and I·E-θ′ of each pair of unlike charges at an ionic strength, from the slope A_φ: E-θ = z·z′/(4I)·(J(x₁₂) −
 * J(x₁₁)/2 − J(x₂₂)/2) with x = 6·z·z′·A_φ·√I. Written to `theta` and `change`.
 */
export function unlikeCharges(
  { products, cross, first, second }: Mixings,
  ionicStrength: number,
  slope: number,
  { theta, change, integrals, growths }: MixingWork,
): void {
  if (ionicStrength === 0) {
    theta.fill(0)
    change.fill(0)
    return
  }
  const x = 6 * slope * Math.sqrt(ionicStrength)
  for (let at = 0; at < products.length; at += 1) {
    mixingIntegral(x * products[at]!, integral)
    integrals[at] = integral[0]!
    growths[at] = x * products[at]! * integral[1]!
  }
  for (let at = 0; at < cross.length; at += 1) {
    const [both, one, two] = [cross[at]!, first[at]!, second[at]!]
    const value = integrals[both]! - integrals[one]! / 2 - integrals[two]! / 2
    const growth = growths[both]! - growths[one]! / 2 - growths[two]! / 2
    const factor = products[both]! / (4 * ionicStrength)
    theta[at] = factor * value
    change[at] = factor * (growth / 2 - value)
  }
}
