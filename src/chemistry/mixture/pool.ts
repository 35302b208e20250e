import type { Speciated } from '../speciation/types.ts'
import type { Member } from './blend.ts'
import type { ReadySystem } from './system.ts'

/** The ions and molecules that the interaction model takes together. */
export interface Pool {
  /** In the order of the system's species; those that belong to a solute with its own curve are taken out. */
  readonly molalities: Float64Array
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
  speciated: Speciated,
  outsidePool: Readonly<Record<string, number>>,
  system: ReadySystem,
): Pool {
  const { molalities: all } = speciated
  const molalities = Float64Array.from(all)
  const outside = Object.entries(outsidePool)
  if (outside.length > 0) {
    const totals = componentTotals(speciated, system)
    const kept = new Map(
      outside.map(([component, amount]) => [
        component,
        Math.max(0, 1 - amount / (totals.get(component) ?? amount)),
      ]),
    )
    system.componentsOf.forEach((components, index) => {
      let keep = 1
      for (const component of components) keep = Math.min(keep, kept.get(component) ?? 1)
      molalities[index] = (all[index] ?? 0) * keep
    })
  }
  const osmotic = system.activity.osmotic(molalities)
  return {
    molalities,
    osmolalityOsmPerKg: osmotic.osmolalityOsmPerKg,
    sumOfMolalities: osmotic.sumOfMolalities,
    isPresent: osmotic.sumOfMolalities > nothing,
  }
}

/** mol per kg of water of each component, over all its species. */
export function componentTotals(
  { species, molalities }: Speciated,
  { componentsOf }: ReadySystem,
): ReadonlyMap<string, number> {
  const totals = new Map<string, number>()
  componentsOf.forEach((components, index) => {
    components.forEach((component, place) => {
      const record = species[index]
      const count = place === 0 ? (record?.count ?? 1) : (record?.partners?.[place - 1]?.count ?? 1)
      totals.set(component, (totals.get(component) ?? 0) + count * (molalities[index] ?? 0))
    })
  })
  return totals
}

/** The pool as one member of the mixture: scaled as a whole, at fixed proportions, until it has the osmolality. */
export function poolMember(pool: Pool, { activity }: ReadySystem): Member {
  const scaled = new Float64Array(pool.molalities.length)
  const osmolalityAt = (factor: number) => {
    for (let at = 0; at < scaled.length; at += 1) scaled[at] = (pool.molalities[at] ?? 0) * factor
    return activity.osmolality(scaled)
  }
  let factor = 1
  return {
    shareAt(osmolality) {
      // O grows nearly as a power of the scale: a secant in the logarithms settles in a few rounds.
      let power = 1
      let before = { ln: 0, miss: 0 }
      for (let round = 0; round < 60; round += 1) {
        const miss = Math.log(osmolalityAt(factor) / osmolality)
        const ln = Math.log(factor)
        if (round > 0 && ln !== before.ln) power = (miss - before.miss) / (ln - before.ln)
        before = { ln, miss }
        factor *= Math.exp(-miss / power)
        if (Math.abs(miss) <= 1e-13) return 1 / factor
      }
      factor = 1
      return Number.NaN
    },
  }
}
