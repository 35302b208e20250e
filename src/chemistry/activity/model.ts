import type { SpeciesRecord } from '../../library/types.ts'
import type { ElectrolyteParameters } from '../../library/electrolytes.ts'
import { compile, type Compiled } from './compiled.ts'
import { debyeHueckelSlope } from './debye-hueckel.ts'
import { mixingIntegral } from './electrostatic.ts'
import { mixtureUncertainty, pairRemarks, type PairRemark } from './uncertainty.ts'
import { loadEstimates } from '../../library/estimates.ts'

export interface Osmotic {
  osmoticCoefficient: number
  sumOfMolalities: number
  waterActivity: number
  osmolalityOsmPerKg: number
}

export interface ActivityModel {
  readonly species: readonly SpeciesRecord[]
  readonly celsius: number
  ionicStrength(m: Float64Array): number
  osmotic(m: Float64Array): Osmotic
  lnGamma(m: Float64Array, out: Float64Array): void
  readonly missingPairs: readonly (readonly [string, string])[]
  /** Standard uncertainty of φ, relative. */
  relativeUncertainty(m: Float64Array): number
  remarks(m: Float64Array): readonly PairRemark[]
}

const b = 1.2
export const kgPerMolWater = 0.0180153

export function compileActivityModel(
  species: readonly SpeciesRecord[],
  parameters: ElectrolyteParameters,
  celsius: number,
): ActivityModel {
  const compiled = compile(species, parameters, celsius)
  const slope = debyeHueckelSlope(celsius)
  const work = new Float64Array(4)
  const id = (at: number) => species[at]?.id ?? ''
  return {
    species,
    celsius,
    ionicStrength: (m) => strength(m, compiled.charges),
    osmotic: (m) => osmotic(m, compiled, slope, work),
    lnGamma: (m, out) => lnGamma(m, out, compiled, slope, work),
    relativeUncertainty: (m) => mixtureUncertainty(m, compiled, celsius, loadEstimates()),
    remarks: (m) =>
      pairRemarks(
        m,
        compiled,
        species.map(({ id: name }) => name),
      ),
    missingPairs: compiled.missing.map(([cation, anion]) => [id(cation), id(anion)] as const),
  }
}

function strength(m: Float64Array, z: Float64Array): number {
  let sum = 0
  for (let at = 0; at < m.length; at += 1) sum += m[at]! * z[at]! * z[at]!
  return sum / 2
}

function charges(m: Float64Array, z: Float64Array): number {
  let sum = 0
  for (let at = 0; at < m.length; at += 1) sum += m[at]! * Math.abs(z[at]!)
  return sum
}

/** E-θ and I·E-θ′ into work[0], work[1]. */
function electrostatic(z: readonly [number, number], ionic: number, slope: number, work: Float64Array): void {
  const x = 6 * slope * Math.sqrt(ionic)
  const [p, q] = z
  mixingIntegral(x * p * q, work)
  let value = work[0]!
  let change = x * p * q * work[1]!
  mixingIntegral(x * p * p, work)
  value -= work[0]! / 2
  change -= (x * p * p * work[1]!) / 2
  mixingIntegral(x * q * q, work)
  value -= work[0]! / 2
  change -= (x * q * q * work[1]!) / 2
  const theta = ((p * q) / (4 * ionic)) * value
  work[0] = theta
  work[1] = -theta + ((p * q) / (8 * ionic)) * change
}

function osmotic(m: Float64Array, model: Compiled, slope: number, work: Float64Array): Osmotic {
  const ionic = strength(m, model.charges)
  const root = Math.sqrt(ionic)
  const z = charges(m, model.charges)
  let sum = 0
  for (let at = 0; at < m.length; at += 1) sum += m[at]!
  let excess = (-slope * ionic * root) / (1 + b * root)
  for (const pair of model.pairs) {
    const product = m[pair.cation]! * m[pair.anion]!
    if (product === 0) continue
    let beta = pair.beta0 + pair.beta1 * Math.exp(-pair.alpha1 * root)
    if (pair.beta2 !== 0) beta += pair.beta2 * Math.exp(-pair.alpha2 * root)
    excess += product * (beta + z * pair.c)
  }
  for (const like of model.likes) {
    const product = m[like.first]! * m[like.second]!
    if (product === 0) continue
    let term = like.theta
    if (like.charges) {
      electrostatic(like.charges, ionic, slope, work)
      term += work[0]! + work[1]!
    }
    for (const [third, psi] of like.psi) term += m[third]! * psi
    excess += product * term
  }
  for (const { neutral, other, lambda } of model.neutrals) {
    excess += m[neutral]! * m[other]! * lambda * (neutral === other ? 0.5 : 1)
  }
  for (const { neutral, cation, anion, zeta } of model.triples) {
    excess += m[neutral]! * m[cation]! * m[anion]! * zeta
  }
  const osmolality = sum + 2 * excess
  return {
    osmoticCoefficient: sum === 0 ? 1 : osmolality / sum,
    sumOfMolalities: sum,
    waterActivity: Math.exp(-kgPerMolWater * osmolality),
    osmolalityOsmPerKg: osmolality,
  }
}

const g = (x: number) => (x < 1e-5 ? 1 - (2 * x) / 3 : (2 * (1 - (1 + x) * Math.exp(-x))) / (x * x))
const gSlope = (x: number) =>
  x < 1e-5 ? -x / 3 : (-2 * (1 - (1 + x + (x * x) / 2) * Math.exp(-x))) / (x * x)

function lnGamma(
  m: Float64Array,
  out: Float64Array,
  model: Compiled,
  slope: number,
  work: Float64Array,
): void {
  const ionic = strength(m, model.charges)
  out.fill(0)
  const root = Math.sqrt(ionic)
  const z = charges(m, model.charges)
  let f = -slope * (root / (1 + b * root) + (2 / b) * Math.log1p(b * root))
  let c = 0
  for (const pair of model.pairs) {
    const [i, j] = [pair.cation, pair.anion]
    const x1 = pair.alpha1 * root
    let beta = pair.beta0 + pair.beta1 * g(x1)
    let change = ionic > 0 ? (pair.beta1 * gSlope(x1)) / ionic : 0
    if (pair.beta2 !== 0) {
      const x2 = pair.alpha2 * root
      beta += pair.beta2 * g(x2)
      if (ionic > 0) change += (pair.beta2 * gSlope(x2)) / ionic
    }
    const product = m[i]! * m[j]!
    f += product * change
    c += product * pair.c
    out[i]! += m[j]! * (2 * beta + z * pair.c)
    out[j]! += m[i]! * (2 * beta + z * pair.c)
  }
  f += likeTerms(m, out, model, ionic, slope, work)
  neutralTerms(m, out, model)
  for (let at = 0; at < m.length; at += 1) {
    const charge = model.charges[at]!
    out[at]! += charge * charge * f + Math.abs(charge) * c
  }
}

function likeTerms(
  m: Float64Array,
  out: Float64Array,
  model: Compiled,
  ionic: number,
  slope: number,
  work: Float64Array,
): number {
  let f = 0
  for (const like of model.likes) {
    const [i, j] = [like.first, like.second]
    const product = m[i]! * m[j]!
    let theta = like.theta
    if (like.charges && ionic > 0) {
      electrostatic(like.charges, ionic, slope, work)
      theta += work[0]!
      f += (product * work[1]!) / ionic
    }
    let ternary = 0
    for (const [third, psi] of like.psi) {
      ternary += m[third]! * psi
      out[third]! += product * psi
    }
    out[i]! += m[j]! * (2 * theta + ternary)
    out[j]! += m[i]! * (2 * theta + ternary)
  }
  return f
}

function neutralTerms(m: Float64Array, out: Float64Array, model: Compiled): void {
  for (const { neutral, other, lambda } of model.neutrals) {
    out[neutral]! += 2 * m[other]! * lambda
    if (neutral !== other) out[other]! += 2 * m[neutral]! * lambda
  }
  for (const { neutral, cation, anion, zeta } of model.triples) {
    out[neutral]! += m[cation]! * m[anion]! * zeta
    out[cation]! += m[neutral]! * m[anion]! * zeta
    out[anion]! += m[neutral]! * m[cation]! * zeta
  }
}
