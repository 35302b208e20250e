import type { Cluster } from './layout.ts'

/* Free amounts of components that form complexes or polymers, at given pH and activity coefficients. */

const acceptable = 1e-11
const quickSteps = 60
const sureSteps = 200
const longestStep = 12

/** Scratch of one cluster: reused in every call. */
export class ClusterWork {
  /** Activity of the master of each component, kept between calls as the next start. */
  readonly free: Float64Array
  readonly sums: Float64Array
  /** Second derivatives, then their factor. */
  readonly matrix: Float64Array
  readonly step: Float64Array
  /** Change of ln(free) with ln(H+), sign reversed. */
  readonly response: Float64Array
  readonly totals: Float64Array
  readonly cluster: Cluster

  constructor(cluster: Cluster) {
    const size = cluster.components.length
    this.cluster = cluster
    this.free = new Float64Array(size)
    this.sums = new Float64Array(size)
    this.matrix = new Float64Array(size * size)
    this.step = new Float64Array(size)
    this.response = new Float64Array(size)
    this.totals = new Float64Array(size)
  }
}

/**
 * Change of the molalities when the weights drift by `dLnWeight` at held pH: the balances kept. Needs the
 * factor that the last solve left.
 */
export function driftCluster(
  work: ClusterWork,
  molalities: Float64Array,
  dLnWeight: Float64Array,
  out: Float64Array,
): void {
  const { step } = work
  const { species, starts, members, counts } = work.cluster
  step.fill(0)
  for (let row = 0; row < species.length; row++) {
    const index = species[row] as number
    const moved = (molalities[index] as number) * (dLnWeight[index] as number)
    for (let k = starts[row] as number; k < (starts[row + 1] as number); k++) {
      const c = members[k] as number
      step[c] = (step[c] as number) + moved * (counts[k] as number)
    }
  }
  backSolve(work.matrix, step.length, step)
  for (let row = 0; row < species.length; row++) {
    const index = species[row] as number
    let change = dLnWeight[index] as number
    for (let k = starts[row] as number; k < (starts[row + 1] as number); k++) {
      change -= (counts[k] as number) * (step[members[k] as number] as number)
    }
    out[index] = (molalities[index] as number) * change
  }
}

/** Molalities from the free amounts, the sums per component and the second derivatives. */
function assemble(work: ClusterWork, weights: Float64Array, molalities: Float64Array): void {
  const { free, sums, matrix } = work
  const { species, starts, members, counts } = work.cluster
  const size = sums.length
  sums.fill(0)
  matrix.fill(0)
  for (let row = 0; row < species.length; row++) {
    const start = starts[row] as number
    const end = starts[row + 1] as number
    let molality = weights[species[row] as number] as number
    for (let k = start; k < end; k++) {
      const factorOfOne = free[members[k] as number] as number
      for (let n = counts[k] as number; n > 0; n--) molality *= factorOfOne
    }
    molalities[species[row] as number] = molality
    for (let k = start; k < end; k++) {
      const c = members[k] as number
      const held = (counts[k] as number) * molality
      sums[c] = (sums[c] as number) + held
      for (let other = start; other <= k; other++) {
        const place = c * size + (members[other] as number)
        matrix[place] = (matrix[place] as number) + held * (counts[other] as number)
      }
    }
  }
}

/** Factors the symmetric matrix into L D Lᵀ in its lower half. False when it is not positive definite. */
function factor(matrix: Float64Array, size: number): boolean {
  for (let c = 0; c < size; c++) {
    for (let d = 0; d <= c; d++) {
      let value = matrix[c * size + d] as number
      for (let k = 0; k < d; k++) {
        value -=
          (matrix[c * size + k] as number) * (matrix[d * size + k] as number) * diagonal(matrix, size, k)
      }
      if (c === d) {
        if (!(value > 0)) return false
        matrix[c * size + c] = value
      } else matrix[c * size + d] = value / diagonal(matrix, size, d)
    }
  }
  return true
}

const diagonal = (matrix: Float64Array, size: number, k: number) => matrix[k * size + k] as number

/** Solves with the factor, in place. */
function backSolve(matrix: Float64Array, size: number, right: Float64Array): void {
  for (let c = 0; c < size; c++) {
    for (let k = 0; k < c; k++) {
      right[c] = (right[c] as number) - (matrix[c * size + k] as number) * (right[k] as number)
    }
  }
  for (let c = 0; c < size; c++) right[c] = (right[c] as number) / diagonal(matrix, size, c)
  for (let c = size - 1; c >= 0; c--) {
    for (let k = c + 1; k < size; k++) {
      right[c] = (right[c] as number) - (matrix[k * size + c] as number) * (right[k] as number)
    }
  }
}

/** Largest relative error of the balances. */
function imbalance(work: ClusterWork): number {
  let worst = 0
  for (let c = 0; c < work.sums.length; c++) {
    const total = work.totals[c] as number
    if (total > 0) worst = Math.max(worst, Math.abs((work.sums[c] as number) - total) / total)
  }
  return worst
}

/** An absent component takes no part: its row becomes the identity. */
function leaveOutAbsent(work: ClusterWork): void {
  const size = work.sums.length
  for (let c = 0; c < size; c++) {
    if ((work.totals[c] as number) === 0) work.matrix[c * size + c] = 1
  }
}

/**
 * Newton on the logarithms of the balances: quick from far away. A step is cut to `longestStep` in ln. Stops
 * when an iteration no longer improves a balance that is already good.
 */
function quickNewton(
  work: ClusterWork,
  weights: Float64Array,
  molalities: Float64Array,
  tolerance: number,
): boolean {
  const size = work.sums.length
  let before = Infinity
  for (let iteration = 0; iteration < quickSteps; iteration++) {
    assemble(work, weights, molalities)
    leaveOutAbsent(work)
    const error = imbalance(work)
    if (error <= tolerance || (error < acceptable && error >= before)) return factor(work.matrix, size)
    before = error
    if (!Number.isFinite(error) || !factor(work.matrix, size)) return false
    for (let c = 0; c < size; c++) {
      const total = work.totals[c] as number
      const sum = work.sums[c] as number
      work.step[c] = total === 0 ? 0 : sum * Math.log(sum / total)
    }
    backSolve(work.matrix, size, work.step)
    for (let c = 0; c < size; c++) {
      const step = Math.max(-longestStep, Math.min(longestStep, work.step[c] as number))
      work.free[c] = (work.free[c] as number) * Math.exp(-step)
    }
  }
  return false
}

/** Σ m - Σ total · ln(free): convex, and least where every balance holds. */
function potential(work: ClusterWork, molalities: Float64Array): number {
  let value = 0
  for (const species of work.cluster.species) value += molalities[species] as number
  for (let c = 0; c < work.totals.length; c++) {
    const total = work.totals[c] as number
    if (total > 0) value -= total * Math.log(work.free[c] as number)
  }
  return value
}

/** Damped Newton on the convex potential: slower, and cannot go astray. */
function sureNewton(work: ClusterWork, weights: Float64Array, molalities: Float64Array): boolean {
  const size = work.sums.length
  for (let iteration = 0; iteration < sureSteps; iteration++) {
    assemble(work, weights, molalities)
    leaveOutAbsent(work)
    const error = imbalance(work)
    const value = potential(work, molalities)
    if (!factor(work.matrix, size)) return false
    if (error < acceptable) return true
    let slope = 0
    for (let c = 0; c < size; c++) {
      const total = work.totals[c] as number
      work.response[c] = total === 0 ? 0 : (work.sums[c] as number) - total
      work.step[c] = work.response[c] as number
    }
    backSolve(work.matrix, size, work.step)
    let largest = 0
    for (let c = 0; c < size; c++) {
      slope += (work.step[c] as number) * (work.response[c] as number)
      largest = Math.max(largest, Math.abs(work.step[c] as number))
    }
    let share = Math.min(1, 2 / largest)
    for (let trial = 0; trial < 40; trial++) {
      moveBy(work, -share)
      assemble(work, weights, molalities)
      if (potential(work, molalities) <= value - 1e-4 * share * slope + 1e-15 * Math.abs(value)) break
      moveBy(work, share)
      share /= 2
    }
  }
  return false
}

function moveBy(work: ClusterWork, share: number): void {
  for (let c = 0; c < work.free.length; c++) {
    work.free[c] = (work.free[c] as number) * Math.exp(share * (work.step[c] as number))
  }
}

/** Start as if nothing were bound: each total shared among the species that hold the component alone. */
export function startCluster(work: ClusterWork, weights: Float64Array): void {
  const { species, starts, members, counts } = work.cluster
  work.sums.fill(0)
  for (let row = 0; row < species.length; row++) {
    const start = starts[row] as number
    if ((starts[row + 1] as number) - start !== 1 || counts[start] !== 1) continue
    const only = members[start] as number
    work.sums[only] = (work.sums[only] as number) + (weights[species[row] as number] as number)
  }
  for (let c = 0; c < work.free.length; c++) {
    work.free[c] = (work.totals[c] as number) / (work.sums[c] as number)
  }
}

/**
 * Molalities of the cluster's species so that every balance holds to `tolerance` (1e-11 at the least tight), and the response of
 * ln(free) to ln(H+). `weights` are K · a(H+)^protons · a(water)^waters / γ. False when it cannot be done.
 */
export function solveCluster(
  work: ClusterWork,
  weights: Float64Array,
  protons: Int32Array,
  molalities: Float64Array,
  tolerance: number,
): boolean {
  if (!quickNewton(work, weights, molalities, tolerance)) {
    startCluster(work, weights)
    if (!sureNewton(work, weights, molalities)) return false
  }
  const { response } = work
  const { species, starts, members, counts } = work.cluster
  response.fill(0)
  for (let row = 0; row < species.length; row++) {
    const index = species[row] as number
    const moved = (molalities[index] as number) * (protons[index] as number)
    for (let k = starts[row] as number; k < (starts[row + 1] as number); k++) {
      const c = members[k] as number
      response[c] = (response[c] as number) + moved * (counts[k] as number)
    }
  }
  backSolve(work.matrix, response.length, response)
  return true
}
