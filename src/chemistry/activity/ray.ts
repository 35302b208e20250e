import type { Flat } from './flat.ts'
import { unlikeCharges } from './mixing.ts'
import { equivalentsOf, pitzerB, strengthOf, type Workspace } from './model.ts'

/** Species at fixed proportions: the osmolality at a multiple of their molalities. */
export interface Ray {
  /** osmol per kg at `factor` times the molalities. */
  osmolality(factor: number): number
}

/**
 * Osmolality along a ray of composition. Every term of the excess is a power of the factor f times something that
 * hangs on the ionic strength f·I alone, so the sums over pairs and triples are made once: O = f·Σm + 2·(limiting term
 * + f²·(β0, θ, λ + Σ β·e^(−α√(fI)) + Σ(E-θ + I·E-θ′)) + f³·(C, ψ, ζ)). The same as the model at the scaled molalities.
 */
export function rayOf(m: Float64Array, flat: Flat, slope: number, work: Workspace): Ray {
  const sums = sumsOf(m, flat)
  const { sum, strength, plain, cubic, byAlpha, byMixing } = sums
  const { alphas, mixings } = flat
  return {
    osmolality(factor) {
      const ionic = factor * strength
      const root = Math.sqrt(ionic)
      let squares = plain
      for (let at = 0; at < byAlpha.length; at += 1) {
        if (byAlpha[at] !== 0) squares += byAlpha[at]! * Math.exp(-alphas[at]! * root)
      }
      if (byMixing.length > 0) unlikeCharges(mixings, ionic, slope, work.mixing)
      for (let at = 0; at < byMixing.length; at += 1) {
        squares += byMixing[at]! * (work.mixing.theta[at]! + work.mixing.change[at]!)
      }
      const limiting = (-slope * ionic * root) / (1 + pitzerB * root)
      return factor * sum + 2 * (limiting + factor * factor * (squares + factor * cubic))
    },
  }
}

interface Sums {
  readonly sum: number
  readonly strength: number
  readonly plain: number
  readonly cubic: number
  readonly byAlpha: Float64Array
  readonly byMixing: Float64Array
}

function sumsOf(m: Float64Array, flat: Flat): Sums {
  const { pairs, neutrals, triples, likes } = flat
  const z = equivalentsOf(m, flat.magnitudes)
  const byAlpha = new Float64Array(flat.alphas.length)
  const byMixing = new Float64Array(flat.mixings.cross.length)
  let [sum, plain, cubic] = [0, 0, 0]
  for (let at = 0; at < m.length; at += 1) sum += m[at]!
  for (let at = 0; at < pairs.cation.length; at += 1) {
    const product = m[pairs.cation[at]!]! * m[pairs.anion[at]!]!
    plain += product * pairs.beta0[at]!
    cubic += product * z * pairs.c[at]!
    byAlpha[pairs.alpha1[at]!]! += product * pairs.beta1[at]!
    byAlpha[pairs.alpha2[at]!]! += product * pairs.beta2[at]!
  }
  for (let at = 0; at < likes.first.length; at += 1) {
    const product = m[likes.first[at]!]! * m[likes.second[at]!]!
    plain += product * likes.theta[at]!
    if (likes.mixing[at]! >= 0) byMixing[likes.mixing[at]!]! += product
    for (let third = likes.psiStart[at]!; third < likes.psiStart[at + 1]!; third += 1) {
      cubic += product * m[flat.psiThird[third]!]! * flat.psiValue[third]!
    }
  }
  for (let at = 0; at < neutrals.neutral.length; at += 1) {
    const neutral = neutrals.neutral[at]!
    const other = neutrals.other[at]!
    plain += m[neutral]! * m[other]! * neutrals.lambda[at]! * (neutral === other ? 0.5 : 1)
  }
  for (let at = 0; at < triples.neutral.length; at += 1) {
    cubic += m[triples.neutral[at]!]! * m[triples.cation[at]!]! * m[triples.anion[at]!]! * triples.zeta[at]!
  }
  return { sum, strength: strengthOf(m, flat.charges), plain, cubic, byAlpha, byMixing }
}
