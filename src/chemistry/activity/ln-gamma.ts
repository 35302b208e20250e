import type { Flat } from './flat.ts'
import { unlikeCharges, type MixingWork } from './mixing.ts'
import { equivalentsOf, pitzerB, strengthOf, type Workspace } from './model.ts'

/* g(x) = 2(1 − (1 + x)e^−x)/x² and x²-scaled slope of B in Pitzer's B and B′. */
const small = 1e-5
const g = (x: number, exponential: number) =>
  x < small ? 1 - (2 * x) / 3 : (2 * (1 - (1 + x) * exponential)) / (x * x)
const gSlope = (x: number, exponential: number) =>
  x < small ? -x / 3 : (-2 * (1 - (1 + x + (x * x) / 2) * exponential)) / (x * x)

/** ln γ of every species into `out`, Harvie, Møller and Weare's form; consistent with φ by Gibbs and Duhem. */
export function lnActivityCoefficients(
  m: Float64Array,
  out: Float64Array,
  flat: Flat,
  slope: number,
  work: Workspace,
): void {
  out.fill(0)
  const ionic = strengthOf(m, flat.charges)
  const root = Math.sqrt(ionic)
  for (let at = 0; at < flat.alphas.length; at += 1) {
    const x = flat.alphas[at]! * root
    const exponential = Math.exp(-x)
    work.g[at] = g(x, exponential)
    work.gSlope[at] = gSlope(x, exponential)
  }
  unlikeCharges(flat.mixings, ionic, slope, work.mixing)
  const limiting = -slope * (root / (1 + pitzerB * root) + (2 / pitzerB) * Math.log1p(pitzerB * root))
  const f = limiting + pairTerms(m, out, flat, ionic, work) + likeTerms(m, out, flat, ionic, work.mixing)
  moleculeTerms(m, out, flat)
  const c = commonTerm(m, flat)
  for (let at = 0; at < m.length; at += 1) {
    const charge = flat.charges[at]!
    out[at]! += charge * charge * f + flat.magnitudes[at]! * c
  }
}

/** ΣΣ m₊·m₋·C. */
function commonTerm(m: Float64Array, { pairs }: Flat): number {
  let sum = 0
  for (let at = 0; at < pairs.cation.length; at += 1)
    sum += m[pairs.cation[at]!]! * m[pairs.anion[at]!]! * pairs.c[at]!
  return sum
}

/** Adds the pairs' own terms and answers their part of F. */
function pairTerms(m: Float64Array, out: Float64Array, flat: Flat, ionic: number, work: Workspace): number {
  const { pairs } = flat
  const z = equivalentsOf(m, flat.magnitudes)
  let f = 0
  for (let at = 0; at < pairs.cation.length; at += 1) {
    const cation = pairs.cation[at]!
    const anion = pairs.anion[at]!
    const first = pairs.alpha1[at]!
    const second = pairs.alpha2[at]!
    const beta1 = pairs.beta1[at]!
    const beta2 = pairs.beta2[at]!
    const b = pairs.beta0[at]! + beta1 * work.g[first]! + beta2 * work.g[second]!
    const change = beta1 * work.gSlope[first]! + beta2 * work.gSlope[second]!
    f += m[cation]! * m[anion]! * change
    const both = 2 * b + z * pairs.c[at]!
    out[cation]! += m[anion]! * both
    out[anion]! += m[cation]! * both
  }
  return ionic > 0 ? f / ionic : 0
}

function likeTerms(m: Float64Array, out: Float64Array, flat: Flat, ionic: number, work: MixingWork): number {
  const { likes, psiThird, psiValue } = flat
  let f = 0
  for (let at = 0; at < likes.first.length; at += 1) {
    const first = likes.first[at]!
    const second = likes.second[at]!
    const product = m[first]! * m[second]!
    const mixing = likes.mixing[at]!
    let phi = 2 * likes.theta[at]!
    if (mixing >= 0) {
      phi += 2 * work.theta[mixing]!
      f += product * work.change[mixing]!
    }
    for (let place = likes.psiStart[at]!; place < likes.psiStart[at + 1]!; place += 1) {
      const third = psiThird[place]!
      phi += m[third]! * psiValue[place]!
      out[third]! += product * psiValue[place]!
    }
    out[first]! += m[second]! * phi
    out[second]! += m[first]! * phi
  }
  return ionic > 0 ? f / ionic : 0
}

function moleculeTerms(m: Float64Array, out: Float64Array, { neutrals, triples }: Flat): void {
  for (let at = 0; at < neutrals.neutral.length; at += 1) {
    const neutral = neutrals.neutral[at]!
    const other = neutrals.other[at]!
    out[neutral]! += 2 * m[other]! * neutrals.lambda[at]!
    if (neutral !== other) out[other]! += 2 * m[neutral]! * neutrals.lambda[at]!
  }
  for (let at = 0; at < triples.neutral.length; at += 1) {
    const neutral = triples.neutral[at]!
    const cation = triples.cation[at]!
    const anion = triples.anion[at]!
    const zeta = triples.zeta[at]!
    out[neutral]! += m[cation]! * m[anion]! * zeta
    out[cation]! += m[neutral]! * m[anion]! * zeta
    out[anion]! += m[neutral]! * m[cation]! * zeta
  }
}
