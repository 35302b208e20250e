import { uncertaintyAt } from '../curve/tabulated.ts'
import type { SoluteShare, UncertaintyPart } from '../types.ts'
import type { Water } from '../water/water.ts'
import type { Solute } from './solutes.ts'
import type { ReadySystem } from './system.ts'
import type { Mixture } from './thermal.ts'

/**
 * Standard uncertainties of the osmolality by input, mOsm/kg. In the mixture of equal water activity a relative error
 * of one member's curve moves the total by that member's share, so no solution is solved again.
 */
export function uncertaintyParts(
  solutes: readonly Solute[],
  mixture: Mixture,
  system: ReadySystem,
  shares: readonly SoluteShare[],
  water: Water,
): readonly UncertaintyPart[] {
  const total = mixture.osmolalityOsmPerKg * 1000
  const parts: UncertaintyPart[] = []
  if (mixture.poolShare > 0 && mixture.pool.isPresent) {
    const relative = system.activity.relativeUncertainty(mixture.pool.molalities)
    parts.push({
      kind: 'pool',
      relative,
      key: '',
      input: 'ion-interaction model',
      osmolalityMilliosmPerKg: total * mixture.poolShare * relative,
    })
  }
  for (const solute of solutes) {
    const share = shares.find(({ key }) => key === solute.key)
    const relative = curveUncertainty(solute)
    if (!share || relative === null) continue
    const input = `osmotic curve of ${solute.ingredient.name}`
    parts.push({
      kind: 'curve',
      relative,
      key: solute.key,
      input,
      osmolalityMilliosmPerKg: share.osmolalityOsmPerKg * 1000 * relative,
    })
  }
  parts.push({
    kind: 'every-amount',
    relative: water.relativeUncertainty,
    key: '',
    input: 'water per litre',
    osmolalityMilliosmPerKg: total * water.relativeUncertainty,
  })
  return parts
}

/** Relative standard uncertainty of a solute's own curve; null for the pool. */
export function curveUncertainty(solute: Solute): number | null {
  if (solute.kind === 'pool') return null
  if (solute.kind === 'table') return uncertaintyAt(solute.table, solute.molality)
  const { freezing } = solute.curve
  const beyond = Math.max(0, Math.log(solute.molality / freezing.maximumMolality))
  return Math.hypot(freezing.relativeUncertainty, beyond * 0.05)
}
