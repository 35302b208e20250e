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
  const member = poolMember(pool, system)
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

function ownCurve(solute: Exclude<Solute, { kind: 'pool' }>, slope: number, celsius: number): OsmoticCurve {
  return solute.kind === 'molecule' ? neutralCurve(solute.curve, celsius) : curveOf(solute.table, slope)
}
