import { neutralCurve } from '../curve/neutral.ts'
import type { OsmoticCurve } from '../curve/curve.ts'
import { curveOf } from '../curve/tabulated.ts'
import type { Speciated } from '../speciation/types.ts'
import { blend, type Member } from './blend.ts'
import { poolMember, poolOf, type Pool } from './pool.ts'
import type { Solute } from './solutes.ts'
import type { ReadySystem } from './system.ts'

/** The solved mixture at one temperature. */
export interface Mixture {
  readonly celsius: number
  readonly osmolalityOsmPerKg: number
  readonly speciated: Speciated
  readonly pool: Pool
  /** Share of the water that the pool takes, and each solute with its own curve, by key. */
  readonly poolShare: number
  readonly curveShares: ReadonlyMap<string, number>
}

/** Mixes the pool with the solutes that have their own curves; null when the mixture did not converge. */
export function mix(
  solutes: readonly Solute[],
  speciated: Speciated,
  outsidePool: Readonly<Record<string, number>>,
  system: ReadySystem,
  celsius: number,
): Mixture | null {
  const pool = poolOf(speciated, outsidePool, system)
  const curves = solutes.flatMap((solute) =>
    solute.kind === 'pool' || solute.molality <= 0
      ? []
      : [{ key: solute.key, molality: solute.molality, curve: ownCurve(solute, system.slope, celsius) }],
  )
  const poolOnly = pool.osmolalityOsmPerKg
  if (curves.length === 0) {
    return { celsius, osmolalityOsmPerKg: poolOnly, speciated, pool, poolShare: 1, curveShares: new Map() }
  }
  const members: Member[] = curves.map(({ molality, curve }) => ({
    shareAt: (osmolality) => molality / curve.molalityAt(osmolality),
  }))
  const hasPool = pool.isPresent
  const member = poolMember(pool)
  if (hasPool) members.push(member)
  const guess = curves.reduce(
    (sum, { molality, curve }) => sum + curve.osmolalityAt(molality),
    hasPool ? poolOnly : 0,
  )
  const blended = blend(members, guess)
  if (blended.status !== 'blended') return null
  const osmolality = blended.osmolalityOsmPerKg
  return {
    celsius,
    osmolalityOsmPerKg: osmolality,
    speciated,
    pool,
    poolShare: hasPool ? member.shareAt(osmolality) : 0,
    curveShares: new Map(
      curves.map(({ key, molality, curve }) => [key, molality / curve.molalityAt(osmolality)]),
    ),
  }
}

/** The members of a mixture that can be asked again with errors in them. */
export interface Movable {
  readonly solutes: readonly Solute[]
  readonly mixture: Mixture
  readonly system: ReadySystem
}

/** Factors near 1 on what a solute's curve, its amount, and the pool's model give. */
export interface Errors {
  readonly curve: ReadonlyMap<string, number>
  readonly amount: ReadonlyMap<string, number>
  readonly everyAmount: number
  readonly pool: number
  /** Share of the pool that each of its members makes. */
  readonly poolShares: ReadonlyMap<string, number>
}

/**
 * Osmolality of the mixture with errors in curves, amounts and model, at the proportions of species that it has. Not a
 * number when it does not converge.
 */
export function osmolalityWithErrors({ solutes, mixture, system }: Movable, errors: Errors): number {
  const amountOf = (key: string) => errors.everyAmount * (errors.amount.get(key) ?? 1)
  const members: Member[] = []
  for (const solute of solutes) {
    if (solute.kind === 'pool' || solute.molality <= 0) continue
    const curve = ownCurve(solute, system.slope, Math.max(0, mixture.celsius))
    const molality = solute.molality * amountOf(solute.key)
    const factor = errors.curve.get(solute.key) ?? 1
    members.push({ shareAt: (osmolality) => molality / curve.molalityAt(osmolality / factor) })
  }
  if (mixture.pool.isPresent) {
    const pool = poolMember(mixture.pool)
    let amount = errors.everyAmount
    for (const [key, share] of errors.poolShares)
      amount += errors.everyAmount * share * ((errors.amount.get(key) ?? 1) - 1)
    members.push({ shareAt: (osmolality) => amount * pool.shareAt(osmolality / errors.pool) })
  }
  const blended = blend(members, mixture.osmolalityOsmPerKg)
  return blended.status === 'blended' ? blended.osmolalityOsmPerKg : Number.NaN
}

function ownCurve(solute: Exclude<Solute, { kind: 'pool' }>, slope: number, celsius: number): OsmoticCurve {
  return solute.kind === 'molecule' ? neutralCurve(solute.curve, celsius) : curveOf(solute.table, slope)
}
