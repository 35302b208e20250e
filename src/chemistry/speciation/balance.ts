import { ClusterWork, solveCluster, startCluster } from './cluster.ts'
import { FixedPoint } from './fixed-point.ts'
import type { Layout } from './layout.ts'

/* All molalities and the charge they carry, at one pH and given activity coefficients. */

/** Scratch of one compiled system: every array is made once. */
export class Workspace {
  readonly totals: Float64Array
  readonly molalities: Float64Array
  readonly lnGamma: Float64Array
  readonly lnGammaNext: Float64Array
  /** K · a(water)^waters / γ: all of a species' weight but the pH. */
  readonly constants: Float64Array
  readonly weights: Float64Array
  /** dm / d ln a(H+) with the balances kept. */
  readonly slopes: Float64Array
  readonly clusters: readonly ClusterWork[]
  readonly activities: FixedPoint
  /** a(H+)^n from the most negative n that a species takes to the most positive. */
  readonly powers: Float64Array
  readonly lowestPower: number
  /** Charge of the ions that no pH changes. */
  inertCharge = 0
  positive = 0
  negative = 0
  positiveSlope = 0
  negativeSlope = 0

  constructor(layout: Layout) {
    const size = layout.species.length
    this.totals = new Float64Array(layout.components.length)
    this.molalities = new Float64Array(size)
    this.lnGamma = new Float64Array(size)
    this.lnGammaNext = new Float64Array(size)
    this.constants = new Float64Array(size)
    this.weights = new Float64Array(size)
    this.slopes = new Float64Array(size)
    this.activities = new FixedPoint(size)
    this.lowestPower = Math.min(...layout.protons)
    this.powers = new Float64Array(Math.max(...layout.protons) - this.lowestPower + 1)
    this.clusters = layout.clusters.map((cluster) => new ClusterWork(cluster))
  }
}

/** Puts the totals in place: inert ions take theirs whole. */
export function placeTotals(layout: Layout, work: Workspace): void {
  work.molalities.fill(0)
  work.inertCharge = 0
  for (let c = 0; c < work.totals.length; c++) {
    const species = layout.inert[c] as number
    if (species < 0) continue
    const total = work.totals[c] as number
    work.molalities[species] = total
    work.inertCharge += total * (layout.charges[species] as number)
  }
  for (const cluster of work.clusters) {
    for (let c = 0; c < cluster.totals.length; c++) {
      cluster.totals[c] = work.totals[cluster.cluster.components[c] as number] as number
    }
  }
}

/** Takes the activity coefficients and the water activity into the weights. */
export function takeActivities(layout: Layout, work: Workspace, lnWaterActivity: number): void {
  for (const species of layout.variable) {
    work.constants[species] = Math.exp(
      (layout.lnK[species] as number) +
        (layout.waters[species] as number) * lnWaterActivity -
        (work.lnGamma[species] as number),
    )
  }
}

function takeHydrogen(layout: Layout, work: Workspace, lnHydrogen: number): void {
  const { powers, lowestPower } = work
  const activity = Math.exp(lnHydrogen)
  powers[0] = Math.exp(lowestPower * lnHydrogen)
  for (let n = 1; n < powers.length; n++) powers[n] = (powers[n - 1] as number) * activity
  for (const species of layout.variable) {
    work.weights[species] =
      (work.constants[species] as number) *
      (powers[(layout.protons[species] as number) - lowestPower] as number)
  }
}

/** A component whose species all hold it once: shares by weight. */
function solveFamily(
  layout: Layout,
  work: Workspace,
  family: { readonly component: number; readonly species: Int32Array },
): void {
  const { weights, molalities, slopes } = work
  let sum = 0
  let protons = 0
  for (const species of family.species) {
    const weight = weights[species] as number
    sum += weight
    protons += weight * (layout.protons[species] as number)
  }
  const share = (work.totals[family.component] as number) / sum
  const mean = protons / sum
  for (const species of family.species) {
    const molality = (weights[species] as number) * share
    molalities[species] = molality
    slopes[species] = molality * ((layout.protons[species] as number) - mean)
  }
}

function clusterSlopes(layout: Layout, work: Workspace, part: ClusterWork): void {
  const { species, starts, members, counts } = part.cluster
  for (let row = 0; row < species.length; row++) {
    const index = species[row] as number
    let change = layout.protons[index] as number
    for (let k = starts[row] as number; k < (starts[row + 1] as number); k++) {
      change -= (counts[k] as number) * (part.response[members[k] as number] as number)
    }
    work.slopes[index] = (work.molalities[index] as number) * change
  }
}

/** Sums the charges that depend on the pH; the inert charge stands on the side of its sign. */
function sumCharges(layout: Layout, work: Workspace): void {
  work.positive = Math.max(work.inertCharge, 0)
  work.negative = Math.max(-work.inertCharge, 0)
  work.positiveSlope = 0
  work.negativeSlope = 0
  for (const species of layout.variable) {
    const charge = layout.charges[species] as number
    if (charge > 0) {
      work.positive += charge * (work.molalities[species] as number)
      work.positiveSlope += charge * (work.slopes[species] as number)
    } else if (charge < 0) {
      work.negative -= charge * (work.molalities[species] as number)
      work.negativeSlope -= charge * (work.slopes[species] as number)
    }
  }
}

/**
 * Every molality at this hydrogen ion activity, with each component's balance kept, and the charge with its
 * slope against ln a(H+). False when a cluster of complexes cannot be solved.
 */
export function balanceAt(
  layout: Layout,
  work: Workspace,
  lnHydrogen: number,
  isFirst: boolean,
  tolerance: number,
): boolean {
  takeHydrogen(layout, work, lnHydrogen)
  for (const species of layout.free) {
    const molality = work.weights[species] as number
    work.molalities[species] = molality
    work.slopes[species] = molality * (layout.protons[species] as number)
  }
  for (const family of layout.families) solveFamily(layout, work, family)
  for (const part of work.clusters) {
    if (isFirst) startCluster(part, work.weights)
    if (!solveCluster(part, work.weights, layout.protons, work.molalities, tolerance)) return false
    clusterSlopes(layout, work, part)
  }
  sumCharges(layout, work)
  return true
}
