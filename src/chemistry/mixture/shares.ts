import type { SoluteShare } from '../types.ts'
import { componentTotals } from './pool.ts'
import type { Solute } from './solutes.ts'
import type { ReadySystem } from './system.ts'
import { countAt } from '../curve/tabulated.ts'
import type { Mixture } from './thermal.ts'

/** Formula units as labelled, fully dissociated; null without a molecular formula. */
export const formalCount = ({ ingredient: { releases, molarMass } }: Solute): number | null =>
  releases && releases.length > 0 && molarMass ? releases.reduce((sum, { count }) => sum + count, 0) : null

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
  const inPool = [...particles.values()].reduce((sum, count) => sum + count, 0)
  const shares = solutes.map((solute) => {
    const counted = solute.kind === 'pool' ? (particles.get(solute.key) ?? 0) : 0
    const share =
      solute.kind === 'pool'
        ? (mixture.poolShare * counted) / (inPool || 1)
        : (mixture.curveShares.get(solute.key) ?? 0)
    return shareOf(solute, share * mixture.osmolalityOsmPerKg, counted)
  })
  return scaled(shares, mixture.osmolalityOsmPerKg)
}

function shareOf(solute: Solute, osmolalityOsmPerKg: number, particles: number): SoluteShare {
  const { key, ingredient, molality } = solute
  return {
    key,
    molality,
    particlesFormal: formalCount(solute),
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

/** mol of particles per kg of water that each pool member ends up as; a particle joining two kinds counts half for each. */
function poolParticles(
  solutes: readonly Solute[],
  { speciated, pool }: Mixture,
  system: ReadySystem,
): ReadonlyMap<string, number> {
  const totals = componentTotals({ ...speciated, molalities: pool.molalities }, system)
  const particles = new Map<string, number>()
  let free = 0
  let bound = 0
  system.componentsOf.forEach((components, index) => {
    const molality = pool.molalities[index] ?? 0
    for (const component of components) {
      const part = molality / components.length
      if (component === 'proton') free += part
      else {
        particles.set(component, (particles.get(component) ?? 0) + part)
        bound += part
      }
    }
  })
  const growth = bound > 0 ? 1 + free / bound : 1
  return new Map(
    solutes
      .filter(({ kind }) => kind === 'pool')
      .map((solute) => [solute.key, growth * ownParticles(solute, particles, totals, speciated)]),
  )
}

function ownParticles(
  { ingredient, molality }: Solute,
  particles: ReadonlyMap<string, number>,
  totals: ReadonlyMap<string, number>,
  { species }: Mixture['speciated'],
): number {
  let sum = 0
  for (const { species: id, count } of ingredient.releases ?? []) {
    const record = species.find((candidate) => candidate.id === id)
    if (!record || record.component === 'proton') continue
    const held = [{ component: record.component, count: record.count }, ...(record.partners ?? [])]
    for (const { component, count: units } of held) {
      const total = totals.get(component) ?? 0
      if (total > 0) sum += (molality * count * units * (particles.get(component) ?? 0)) / total
    }
  }
  return sum
}
