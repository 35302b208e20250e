import type { Ray } from '../activity/ray.ts'
import type { Speciated } from '../speciation/types.ts'
import type { Member } from './blend.ts'
import type { ReadySystem } from './system.ts'
import { componentTotals, type Ties } from './ties.ts'

/** The ions and molecules that the interaction model takes together. */
export interface Pool {
  /** In the order of the system's species; those that belong to a solute with its own curve are taken out. */
  readonly molalities: Float64Array
  /** The pool alone in water at any strength. */
  readonly ray: Ray
  readonly osmolalityOsmPerKg: number
  readonly sumOfMolalities: number
  readonly isPresent: boolean
}

/** Below this, mol/kg, there are only the ions of water. */
const nothing = 1e-6

/**
 * The speciated solution without the ions that solutes with their own curve bring along: of each component that part
 * is left out, evenly over its species.
 */
export function poolOf(
  { molalities: all }: Speciated,
  outsidePool: Readonly<Record<string, number>>,
  { ties, activity }: ReadySystem,
): Pool {
  const molalities = Float64Array.from(all)
  const kept = keptShares(all, outsidePool, ties)
  let sum = 0
  for (let species = 0; species < molalities.length; species += 1) {
    let keep = 1
    for (let at = ties.starts[species]!; at < ties.starts[species + 1]!; at += 1) {
      keep = Math.min(keep, kept[ties.component[at]!]!)
    }
    molalities[species]! *= keep
    sum += molalities[species]!
  }
  const ray = activity.ray(molalities)
  return {
    molalities,
    ray,
    osmolalityOsmPerKg: ray.osmolality(1),
    sumOfMolalities: sum,
    isPresent: sum > nothing,
  }
}

/** Of each component the part that stays in the pool. */
function keptShares(
  all: Float64Array,
  outsidePool: Readonly<Record<string, number>>,
  ties: Ties,
): Float64Array {
  const totals = componentTotals(all, ties)
  const kept = new Float64Array(totals.length).fill(1)
  for (const component in outsidePool) {
    const at = ties.componentAt.get(component)
    if (at !== undefined) kept[at] = Math.max(0, 1 - outsidePool[component]! / totals[at]!)
  }
  return kept
}

/** The pool as one member of the mixture: scaled as a whole, at fixed proportions, until it has the osmolality. */
export function poolMember({ ray }: Pick<Pool, 'ray'>): Member {
  // O grows nearly as a power of the scale: a secant in the logarithms settles in a few rounds.
  let factor = 1
  let power = 1
  return {
    shareAt(osmolality) {
      let before = 0
      let step = 0
      for (let round = 0; round < 60; round += 1) {
        const miss = Math.log(ray.osmolality(factor) / osmolality)
        if (step !== 0) power = (before - miss) / step
        before = miss
        step = miss / power
        factor *= Math.exp(-step)
        if (Math.abs(miss) <= 1e-13) return 1 / factor
      }
      factor = 1
      power = 1
      return Number.NaN
    },
  }
}
