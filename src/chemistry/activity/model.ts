import type { ElectrolyteParameters } from '../../library/electrolytes.ts'
import { loadEstimates } from '../../library/estimates.ts'
import type { SpeciesRecord } from '../../library/types.ts'
import { compile } from './compiled.ts'
import { debyeHueckelSlope } from './debye-hueckel.ts'
import { flatten, type Flat } from './flat.ts'
import { lnActivityCoefficients } from './ln-gamma.ts'
import { mixingWork, unlikeCharges, type MixingWork } from './mixing.ts'
import { rayOf, type Ray } from './ray.ts'
import { pairRemarks, type PairRemark } from './remarks.ts'
import { mixtureUncertainty } from './uncertainty.ts'

export interface Osmotic {
  readonly osmoticCoefficient: number
  readonly sumOfMolalities: number
  readonly waterActivity: number
  /** osmol per kg: −ln(a_w) / 0.0180153. */
  readonly osmolalityOsmPerKg: number
}

/** Activities of one set of species at one temperature. Molalities are in the order of `species`. */
export interface ActivityModel {
  readonly species: readonly SpeciesRecord[]
  readonly celsius: number
  ionicStrength(m: Float64Array): number
  osmotic(m: Float64Array): Osmotic
  osmolality(m: Float64Array): number
  /** The same proportions at any strength. */
  ray(m: Float64Array): Ray
  /** ln γ of each species, on the model's own single-ion scale. */
  lnGamma(m: Float64Array, out: Float64Array): void
  readonly missingPairs: readonly (readonly [string, string])[]
  /** Standard uncertainty of φ, relative. */
  relativeUncertainty(m: Float64Array): number
  remarks(m: Float64Array): readonly PairRemark[]
}

/** What the loops write to; one for each model, so a model serves one solve at a time. */
export interface Workspace {
  /** e^−x, and Pitzer's g and x²-scaled slope of it, of each different α. */
  readonly exponentials: Float64Array
  readonly g: Float64Array
  readonly gSlope: Float64Array
  readonly mixing: MixingWork
}

/** Pitzer's b, kg^½ mol^-½. */
export const pitzerB = 1.2
export const kgPerMolWater = 0.0180153

/**
 * Pitzer ion interaction for any number of ions and molecules: β0, β1, β2, Cφ, θ, ψ, λ, ζ and unsymmetrical mixing. A
 * pair without parameters has the Debye–Hückel term alone and is named in `missingPairs`. Sources stand with the data.
 */
export function compileActivityModel(
  species: readonly SpeciesRecord[],
  parameters: ElectrolyteParameters,
  celsius: number,
): ActivityModel {
  const compiled = compile(species, parameters, celsius)
  const flat = flatten(compiled)
  const slope = debyeHueckelSlope(celsius)
  const work: Workspace = {
    exponentials: new Float64Array(flat.alphas.length),
    g: new Float64Array(flat.alphas.length),
    gSlope: new Float64Array(flat.alphas.length),
    mixing: mixingWork(flat.mixings),
  }
  const ids = species.map(({ id }) => id)
  return {
    species,
    celsius,
    ionicStrength: (m) => strengthOf(m, flat.charges),
    osmolality: (m) => sumOf(m) + 2 * excess(m, flat, slope, work),
    ray: (m) => rayOf(m, flat, slope, work),
    osmotic: (m) => osmotic(sumOf(m), excess(m, flat, slope, work)),
    lnGamma: (m, out) => lnActivityCoefficients(m, out, flat, slope, work),
    relativeUncertainty: (m) => mixtureUncertainty(m, compiled, celsius, loadEstimates()),
    remarks: (m) => pairRemarks(m, compiled, ids),
    missingPairs: compiled.missing.map(([cation, anion]) => [ids[cation] ?? '', ids[anion] ?? ''] as const),
  }
}

export function strengthOf(m: Float64Array, charges: Float64Array): number {
  let sum = 0
  for (let at = 0; at < m.length; at += 1) sum += m[at]! * charges[at]! * charges[at]!
  return sum / 2
}

/** Σ m·|z|. */
export function equivalentsOf(m: Float64Array, magnitudes: Float64Array): number {
  let sum = 0
  for (let at = 0; at < m.length; at += 1) sum += m[at]! * magnitudes[at]!
  return sum
}

function sumOf(m: Float64Array): number {
  let sum = 0
  for (let at = 0; at < m.length; at += 1) sum += m[at]!
  return sum
}

function osmotic(sum: number, half: number): Osmotic {
  const osmolality = sum + 2 * half
  return {
    osmoticCoefficient: sum === 0 ? 1 : osmolality / sum,
    sumOfMolalities: sum,
    waterActivity: Math.exp(-kgPerMolWater * osmolality),
    osmolalityOsmPerKg: osmolality,
  }
}

/** (φ − 1)·Σm / 2. */
function excess(m: Float64Array, flat: Flat, slope: number, work: Workspace): number {
  const ionic = strengthOf(m, flat.charges)
  const root = Math.sqrt(ionic)
  const { exponentials } = work
  for (let at = 0; at < exponentials.length; at += 1) exponentials[at] = Math.exp(-flat.alphas[at]! * root)
  unlikeCharges(flat.mixings, ionic, slope, work.mixing)
  const limiting = (-slope * ionic * root) / (1 + pitzerB * root)
  return (
    limiting + pairExcess(m, flat, exponentials) + likeExcess(m, flat, work.mixing) + moleculeExcess(m, flat)
  )
}

function pairExcess(m: Float64Array, { pairs, magnitudes }: Flat, exponentials: Float64Array): number {
  const z = equivalentsOf(m, magnitudes)
  let sum = 0
  for (let at = 0; at < pairs.cation.length; at += 1) {
    const product = m[pairs.cation[at]!]! * m[pairs.anion[at]!]!
    if (product === 0) continue
    const b1 = pairs.beta1[at]! * exponentials[pairs.alpha1[at]!]!
    const b2 = pairs.beta2[at]! * exponentials[pairs.alpha2[at]!]!
    sum += product * (pairs.beta0[at]! + b1 + b2 + z * pairs.c[at]!)
  }
  return sum
}

function likeExcess(
  m: Float64Array,
  { likes, psiThird, psiValue }: Flat,
  { theta, change }: MixingWork,
): number {
  let sum = 0
  for (let at = 0; at < likes.first.length; at += 1) {
    const product = m[likes.first[at]!]! * m[likes.second[at]!]!
    if (product === 0) continue
    const mixing = likes.mixing[at]!
    let term = likes.theta[at]!
    if (mixing >= 0) term += theta[mixing]! + change[mixing]!
    for (let third = likes.psiStart[at]!; third < likes.psiStart[at + 1]!; third += 1) {
      term += m[psiThird[third]!]! * psiValue[third]!
    }
    sum += product * term
  }
  return sum
}

function moleculeExcess(m: Float64Array, { neutrals, triples }: Flat): number {
  let sum = 0
  for (let at = 0; at < neutrals.neutral.length; at += 1) {
    const neutral = neutrals.neutral[at]!
    const other = neutrals.other[at]!
    sum += m[neutral]! * m[other]! * neutrals.lambda[at]! * (neutral === other ? 0.5 : 1)
  }
  for (let at = 0; at < triples.neutral.length; at += 1) {
    sum += m[triples.neutral[at]!]! * m[triples.cation[at]!]! * m[triples.anion[at]!]! * triples.zeta[at]!
  }
  return sum
}
