import { balanceAt, placeTotals, takeActivities, Workspace } from './balance.ts'
import type { Network } from './compile.ts'
import { lnHydrogenActivityOf, pHOf, scaleShift } from './ph.ts'
import { findNeutral } from './proton.ts'
import type {
  ProtonCondition,
  Speciated,
  SpeciationFailure,
  SpeciationRemark,
  SpeciationResult,
} from './types.ts'

const activityTolerance = 1e-9
/** Balances are kept this much tighter than the activity coefficients are known, and never looser than the first. */
const balanceShare = 1e-4
const balanceTolerance = { loosest: 1e-2, good: 1e-11, tightest: 1e-15 }
const mostIterations = 200
const waterMolarMassKg = 0.0180153
const neutralStart = -7 * Math.LN10
const pHRange = { low: -1, high: 15 }

function ionicStrengthOf(network: Network, molalities: Float64Array): number {
  const { charges } = network.layout
  let sum = 0
  for (let i = 0; i < molalities.length; i++) sum += (charges[i] as number) ** 2 * (molalities[i] as number)
  return sum / 2
}

/** ln a(water) of the solute particles as an ideal solution: an error below 0.001 in any pH. */
function lnWaterActivity(molalities: Float64Array): number {
  let sum = 0
  for (let i = 0; i < molalities.length; i++) sum += molalities[i] as number
  return -waterMolarMassKg * sum
}

/** First guess of the activity coefficients: the charge alone, at the ionic strength of the inert ions. */
function guessActivities(network: Network, work: Workspace): void {
  const { charges } = network.layout
  const strength = Math.max(ionicStrengthOf(network, work.molalities), 1e-3)
  const root = Math.sqrt(strength)
  const unit = (-3 * network.debyeHueckelSlope * root) / (1 + 1.5 * root)
  for (let i = 0; i < work.lnGamma.length; i++) work.lnGamma[i] = unit * (charges[i] as number) ** 2
}

/** How the scale of the pH lies against the model's hydrogen ion activity, at the present state. */
function shiftOfScale(network: Network, lnGamma: Float64Array, molalities: Float64Array): number {
  if (network.pHScale === 'hydrogen-activity') return 0
  const lnChloride = lnGamma[network.layout.chloride] as number
  return scaleShift(lnChloride, ionicStrengthOf(network, molalities), network.debyeHueckelSlope)
}

interface State {
  lnHydrogen: number
  /** Implied acid and base, mol/kg, and what the composition names of their ions. */
  acid: number
  base: number
  readonly namedAnion: number
  readonly namedCation: number
}

/** One pass at fixed activity coefficients: all molalities for the wanted pH or for neutrality. */
function pass(
  network: Network,
  work: Workspace,
  condition: ProtonCondition,
  state: State,
  isFirst: boolean,
  tolerance: number,
): SpeciationFailure | null {
  const { layout } = network
  takeActivities(layout, work, lnWaterActivity(work.molalities))
  if (condition.kind === 'electroneutral') {
    const search = findNeutral(layout, work, state.lnHydrogen, isFirst, tolerance)
    if (!search.found) return { status: 'not-converged', code: search.code, values: {} }
    state.lnHydrogen = search.lnHydrogen
    return null
  }
  const shift = shiftOfScale(network, work.lnGamma, work.molalities)
  state.lnHydrogen = lnHydrogenActivityOf(condition.pH, shift)
  if (!balanceAt(layout, work, state.lnHydrogen, isFirst, tolerance)) {
    return { status: 'not-converged', code: 'complexes-not-converged', values: {} }
  }
  const excess = work.positive - work.negative
  const { molalities } = work
  state.acid = Math.max(excess, 0) / Math.abs(layout.charges[layout.acidAnion] as number)
  state.base = Math.max(-excess, 0) / Math.abs(layout.charges[layout.baseCation] as number)
  molalities[layout.acidAnion] = state.namedAnion + state.acid
  molalities[layout.baseCation] = state.namedCation + state.base
  return null
}

function refuseInput(
  network: Network,
  work: Workspace,
  condition: ProtonCondition,
): SpeciationFailure | null {
  for (let index = 0; index < work.totals.length; index++) {
    const total = work.totals[index] as number
    if (Number.isFinite(total) && total >= 0) continue
    const component = network.layout.components[index] ?? ''
    return { status: 'impossible', code: 'total-not-possible', values: { component, total: String(total) } }
  }
  if (condition.kind === 'electroneutral') return null
  if (condition.pH >= pHRange.low && condition.pH <= pHRange.high) return null
  return { status: 'impossible', code: 'ph-outside-range', values: { pH: String(condition.pH), ...pHRange } }
}

function remarksOf(network: Network, work: Workspace, state: State): SpeciationRemark[] {
  const remarks = [...network.remarks]
  const total = (component: string) => work.totals[network.layout.components.indexOf(component)] ?? 0
  for (const bond of network.unknownBonds) {
    if (total(bond.metal) > 0 && total(bond.ligand) > 0) {
      remarks.push({ code: 'complex-unknown', values: { metal: bond.metal, ligand: bond.ligand } })
    }
  }
  const { species, acidAnion, baseCation } = network.layout
  if (state.acid > 0 || state.base > 0) {
    const isAcid = state.acid > 0
    remarks.push({
      code: 'implied-ph-adjuster',
      values: {
        kind: isAcid ? 'acid' : 'base',
        counterIon: species[isAcid ? acidAnion : baseCation]?.id ?? '',
        millimolesPerKg: 1000 * (isAcid ? state.acid : state.base),
      },
    })
  }
  return remarks
}

function conclude(
  network: Network,
  work: Workspace,
  state: State,
  iterations: number,
  activity: number,
): Speciated {
  const molalities = work.molalities.slice()
  const lnGamma = work.lnGamma.slice()
  let charge = 0
  for (let i = 0; i < molalities.length; i++) {
    charge += (network.layout.charges[i] as number) * (molalities[i] as number)
  }
  return {
    status: 'converged',
    species: network.layout.species,
    molalities,
    lnGamma,
    pH: pHOf(state.lnHydrogen, shiftOfScale(network, lnGamma, molalities)),
    lnHydrogenActivity: state.lnHydrogen,
    ionicStrength: ionicStrengthOf(network, molalities),
    impliedAcidMolPerKg: state.acid,
    impliedBaseMolPerKg: state.base,
    iterations,
    residuals: { massBalance: massError(network, work), charge: Math.abs(charge), activity },
    remarks: remarksOf(network, work, state),
  }
}

/** Largest relative error of the balances of families and clusters. */
function massError(network: Network, work: Workspace): number {
  let worst = 0
  for (const family of network.layout.families) {
    let sum = 0
    for (const species of family.species) sum += work.molalities[species] as number
    const total = work.totals[family.component] as number
    if (total > 0) worst = Math.max(worst, Math.abs(sum - total) / total)
  }
  for (const part of work.clusters) {
    for (let c = 0; c < part.totals.length; c++) {
      const total = part.totals[c] as number
      if (total > 0) worst = Math.max(worst, Math.abs((part.sums[c] as number) - total) / total)
    }
  }
  return worst
}

/**
 * Solves the amounts in `work.totals`: molalities, activity coefficients and pH that agree with one another.
 * Activity coefficients are iterated to a fixed point, each round with its balances closed.
 */
export function solveNetwork(
  network: Network,
  work: Workspace,
  condition: ProtonCondition,
): SpeciationResult {
  const refusal = refuseInput(network, work, condition)
  if (refusal) return refusal
  placeTotals(network.layout, work)
  const state: State = {
    lnHydrogen: neutralStart,
    acid: 0,
    base: 0,
    namedAnion: work.molalities[network.layout.acidAnion] as number,
    namedCation: work.molalities[network.layout.baseCation] as number,
  }
  guessActivities(network, work)
  work.activities.begin()
  let before = Infinity
  for (let iteration = 1; iteration <= mostIterations; iteration++) {
    const { loosest, good, tightest } = balanceTolerance
    const tolerance = Math.max(tightest, Math.min(loosest, balanceShare * before))
    const failure = pass(network, work, condition, state, iteration === 1, tolerance)
    if (failure) return failure
    network.activity.lnGamma(work.molalities, work.lnGammaNext)
    const distance = work.activities.advance(work.lnGamma, work.lnGammaNext)
    if (distance === Infinity) return { status: 'impossible', code: 'activity-not-finite', values: {} }
    if (distance <= activityTolerance && tolerance <= good) {
      return conclude(network, work, state, iteration, distance)
    }
    before = distance
  }
  return {
    status: 'not-converged',
    code: 'speciation-not-converged',
    values: { iterations: mostIterations, change: before },
  }
}
