import { balanceAt, placeTotals, takeActivities, Workspace } from './balance.ts'
import { driftCluster } from './cluster.ts'
import type { Network } from './compile.ts'
import { lnConventionalChloride } from './ph.ts'
import type { CompiledSpeciation } from './speciation.ts'
import type { Speciated, Totals } from './types.ts'

const ln10 = Math.LN10
const waterMolarMassKg = 0.0180153
const perturbedShare = 1e-3
const mostIterations = 60
const settled = 1e-12

export interface BufferCapacity {
  /** d(strong base, mol/kg) / d pH of the whole solution, activity coefficients following. */
  readonly molPerKgPerPH: number
  /** The same with activity coefficients held, and its parts by component; "water" is H+ and OH-. */
  readonly atHeldActivity: number
  readonly byComponent: Readonly<Record<string, number>>
}

/** Directions of change per mol/kg of strong base. */
interface Response {
  readonly lnHydrogen: number
  readonly molalities: Float64Array
}

/** Share of each component in the capacity at held activity: Σ protons · dm / d ln a(H+). */
function shares(network: Network, work: Workspace): Record<string, number> {
  const { layout } = network
  const parts: Record<string, number> = {}
  for (const species of layout.variable) {
    const record = layout.species[species]
    if (!record) continue
    const name = record.component === 'proton' ? 'water' : record.component
    parts[name] =
      (parts[name] ?? 0) + (layout.protons[species] as number) * (work.slopes[species] as number) * ln10
  }
  return parts
}

/** dm for given d ln a(H+), with activity coefficients moving by `dLnGamma`, balances kept. */
function changeOf(
  network: Network,
  work: Workspace,
  drift: Float64Array,
  lnHydrogen: number,
  out: Float64Array,
): void {
  for (const species of network.layout.variable) {
    out[species] = (work.slopes[species] as number) * lnHydrogen + (drift[species] as number)
  }
}

/** Change of the molalities by drifting activity coefficients alone, at held a(H+): the balances kept. */
function driftOf(network: Network, work: Workspace, dLnWeight: Float64Array, out: Float64Array): void {
  const { layout } = network
  const { molalities } = work
  out.fill(0)
  const plain = (species: number) => (molalities[species] as number) * (dLnWeight[species] as number)
  for (const species of layout.free) out[species] = plain(species)
  for (const family of layout.families) {
    let sum = 0
    let total = 0
    for (const species of family.species) {
      sum += plain(species)
      total += molalities[species] as number
    }
    const mean = total > 0 ? sum / total : 0
    for (const species of family.species) {
      out[species] = plain(species) - (molalities[species] as number) * mean
    }
  }
  for (const part of work.clusters) driftCluster(part, molalities, dLnWeight, out)
}

/** d ln γ along a direction of the molalities: three points on one side, exact to second order. */
function activityAlong(
  network: Network,
  molalities: Float64Array,
  direction: Float64Array,
  scratch: readonly [Float64Array, Float64Array, Float64Array],
  out: Float64Array,
): void {
  const [point, near, far] = scratch
  const { charges } = network.layout
  let strength = 0
  let reach = 0
  for (let i = 0; i < molalities.length; i++) {
    strength += (charges[i] as number) ** 2 * (molalities[i] as number)
    reach += (charges[i] as number) ** 2 * Math.abs(direction[i] as number)
  }
  const size = (perturbedShare * strength) / Math.max(reach, 1e-300)
  const at = (share: number, target: Float64Array) => {
    for (let i = 0; i < molalities.length; i++) {
      point[i] = (molalities[i] as number) + share * size * (direction[i] as number)
    }
    network.activity.lnGamma(point, target)
  }
  at(0, out)
  at(1, near)
  at(2, far)
  for (let i = 0; i < out.length; i++) {
    out[i] = (4 * (near[i] as number) - (far[i] as number) - 3 * (out[i] as number)) / (2 * size)
  }
}

/** The response of the solution to strong base, iterated until activity coefficients agree with it. */
function respond(
  network: Network,
  work: Workspace,
  held: number,
): { response: Response; dLnGamma: Float64Array } {
  const { layout } = network
  const size = layout.species.length
  const make = () => new Float64Array(size)
  const [dLnGamma, dLnWeight, drift, direction] = [make(), make(), make(), make()]
  const scratch = [make(), make(), make()] as const
  let lnHydrogen = -1 / held
  for (let iteration = 0; iteration < mostIterations; iteration++) {
    driftOf(network, work, dLnWeight, drift)
    let driftCharge = 1
    for (const species of layout.variable) {
      driftCharge += (layout.charges[species] as number) * (drift[species] as number)
    }
    const next = -driftCharge / held
    const isSettled = iteration > 1 && Math.abs(next - lnHydrogen) <= settled * Math.abs(next)
    lnHydrogen = next
    changeOf(network, work, drift, lnHydrogen, direction)
    direction[layout.baseCation] = 1
    activityAlong(network, work.molalities, direction, scratch, dLnGamma)
    if (isSettled) break
    let sum = 0
    for (const change of direction) sum += change
    for (const species of layout.variable) {
      dLnWeight[species] =
        -waterMolarMassKg * sum * (layout.waters[species] as number) - (dLnGamma[species] as number)
    }
  }
  return { response: { lnHydrogen, molalities: direction }, dLnGamma }
}

/* Scratch, apart from that of the solves; everything read from it is written before. */
const workspaces = new WeakMap<Network, Workspace>()

function workspaceOf(network: Network): Workspace {
  const known = workspaces.get(network)
  if (known) return known
  const made = new Workspace(network.layout)
  workspaces.set(network, made)
  return made
}

/**
 * Buffer capacity of an answer: mol/kg of strong base per unit of pH, from the derivative of the mass and
 * charge balances at the actual composition: every acid step, complex, polymer and water counts.
 * `totals` are those that gave the answer. The base is the one of the system's adjuster.
 * Source: derived.
 */
export function bufferCapacity(
  compiled: CompiledSpeciation,
  totals: Totals,
  answer: Speciated,
): BufferCapacity {
  const { network } = compiled
  const { layout } = network
  const work = workspaceOf(network)
  for (const [index, component] of layout.components.entries()) work.totals[index] = totals[component] ?? 0
  placeTotals(layout, work)
  work.lnGamma.set(answer.lnGamma)
  let sum = 0
  for (const molality of answer.molalities) sum += molality
  takeActivities(layout, work, -waterMolarMassKg * sum)
  balanceAt(layout, work, answer.lnHydrogenActivity, true, 1e-15)
  work.molalities.set(answer.molalities)
  const byComponent = shares(network, work)
  const held = work.positiveSlope - work.negativeSlope
  const { response, dLnGamma } = respond(network, work, held)
  let dScale = 0
  if (network.pHScale === 'operational') {
    let dStrength = 0
    for (const [index, change] of response.molalities.entries()) {
      dStrength += 0.5 * (layout.charges[index] as number) ** 2 * change
    }
    const { ionicStrength } = answer
    const nearby = ionicStrength * 1e-5
    const slope =
      (lnConventionalChloride(ionicStrength + nearby, network.debyeHueckelSlope) -
        lnConventionalChloride(ionicStrength - nearby, network.debyeHueckelSlope)) /
      (2 * nearby)
    dScale = (dLnGamma[layout.chloride] as number) - slope * dStrength
  }
  const dPH = -(response.lnHydrogen + dScale) / ln10
  return { molPerKgPerPH: 1 / dPH, atHeldActivity: held * ln10, byComponent }
}
