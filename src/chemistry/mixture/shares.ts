import type { SoluteShare } from '../types.ts'
import type { Solute } from './solutes.ts'
import type { ReadySystem } from './system.ts'
import { componentTotals, type Ties } from './ties.ts'
import { countAt } from '../curve/tabulated.ts'
import type { Mixture } from './thermal.ts'

/**
 * Each solute's share of the osmolality: its share of the water, inside the pool by the particles that its components
 * end up as. The shares sum to the osmolality.
 */
export function sharesOf(
  solutes: readonly Solute[],
  mixture: Mixture,
  system: ReadySystem,
): readonly SoluteShare[] {
  const particles = poolParticles(solutes, mixture, system)
  let inPool = 0
  for (const count of particles) inPool += count
  const shares = solutes.map((solute, index) => {
    const counted = particles[index] ?? 0
    const share =
      solute.kind === 'pool'
        ? (mixture.poolShare * counted) / (inPool || 1)
        : (mixture.curveShares.get(solute.key) ?? 0)
    return shareOf(solute, share * mixture.osmolalityOsmPerKg, counted)
  })
  return scaled(shares, mixture.osmolalityOsmPerKg)
}

function shareOf(solute: Solute, osmolalityOsmPerKg: number, particles: number): SoluteShare {
  const { key, ingredient, molality, facts } = solute
  return {
    key,
    molality,
    particlesFormal: facts.formalCount,
    particlesCounted: molality === 0 ? 0 : countedOf(solute, particles),
    effectiveI: molality === 0 ? 0 : osmolalityOsmPerKg / molality,
    osmolalityOsmPerKg,
    reflection: ingredient.reflection ?? null,
    basis:
      solute.kind === 'pool'
        ? 'ion-interaction'
        : solute.kind === 'molecule'
          ? 'tabulated-curve'
          : basisOf(solute),
  }
}

const basisOf = ({ basis }: Extract<Solute, { kind: 'table' }>): SoluteShare['basis'] =>
  basis === 'bounded' ? 'class-estimate' : basis

/** Particles of a solute with a curve of its own, per mol (per g without a molar mass). */
export const apparentCount = (solute: Exclude<Solute, { kind: 'pool' }>): number =>
  solute.kind === 'molecule' ? 1 : countAt(solute.table, solute.molality)

function countedOf(solute: Solute, particles: number): number {
  if (solute.kind === 'pool') return particles / solute.molality
  return apparentCount(solute)
}

/** Ions of water, and of an acid or base that only the pH implies, belong to no line: they are spread over all. */
function scaled(shares: readonly SoluteShare[], total: number): readonly SoluteShare[] {
  const sum = shares.reduce((part, { osmolalityOsmPerKg }) => part + osmolalityOsmPerKg, 0)
  if (sum === 0 || sum === total) return shares
  return shares.map((share) => {
    const osmolalityOsmPerKg = (share.osmolalityOsmPerKg / sum) * total
    return {
      ...share,
      osmolalityOsmPerKg,
      effectiveI: share.molality === 0 ? 0 : osmolalityOsmPerKg / share.molality,
    }
  })
}

/**
 * mol of particles per kg of water that each pool member ends up as, 0 for the other solutes; a particle joining two
 * kinds counts half for each.
 */
function poolParticles(
  solutes: readonly Solute[],
  { pool }: Mixture,
  { ties }: ReadySystem,
): readonly number[] {
  const { starts, component, components } = ties
  const totals = componentTotals(pool.molalities, ties)
  const particles = new Float64Array(components.length)
  let free = 0
  let bound = 0
  for (let species = 0; species < pool.molalities.length; species += 1) {
    const first = starts[species]!
    const end = starts[species + 1]!
    const part = pool.molalities[species]! / (end - first)
    for (let at = first; at < end; at += 1) {
      if (component[at] === ties.proton) free += part
      else {
        particles[component[at]!]! += part
        bound += part
      }
    }
  }
  const growth = bound > 0 ? 1 + free / bound : 1
  return solutes.map((solute) =>
    solute.kind === 'pool' ? growth * ownParticles(solute, particles, totals, ties) : 0,
  )
}

function ownParticles(
  { facts, molality }: Solute,
  particles: Float64Array,
  totals: Float64Array,
  { componentAt }: Ties,
): number {
  let sum = 0
  for (const { component, count } of facts.given) {
    const at = componentAt.get(component) ?? -1
    const total = totals[at] ?? 0
    if (total > 0) sum += (molality * count * particles[at]!) / total
  }
  return sum
}
