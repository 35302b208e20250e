import { mixingIntegral } from './electrostatic.ts'

const integral = new Float64Array(2)

/**
 * E-θ and I·E-θ′ of each pair of unlike charges at an ionic strength, from the slope A_φ: E-θ = z·z′/(4I)·(J(x₁₂) −
 * J(x₁₁)/2 − J(x₂₂)/2) with x = 6·z·z′·A_φ·√I. Written to `theta` and `change`.
 */
export function unlikeCharges(
  pairs: Float64Array,
  ionicStrength: number,
  slope: number,
  theta: Float64Array,
  change: Float64Array,
): void {
  const x = 6 * slope * Math.sqrt(ionicStrength)
  for (let at = 0; at < theta.length; at += 1) {
    if (ionicStrength === 0) {
      theta[at] = 0
      change[at] = 0
      continue
    }
    const p = pairs[2 * at]!
    const q = pairs[2 * at + 1]!
    mixingIntegral(x * p * q, integral)
    let value = integral[0]!
    let growth = x * p * q * integral[1]!
    mixingIntegral(x * p * p, integral)
    value -= integral[0]! / 2
    growth -= (x * p * p * integral[1]!) / 2
    mixingIntegral(x * q * q, integral)
    value -= integral[0]! / 2
    growth -= (x * q * q * integral[1]!) / 2
    const factor = (p * q) / (4 * ionicStrength)
    theta[at] = factor * value
    change[at] = factor * (growth / 2 - value)
  }
}
