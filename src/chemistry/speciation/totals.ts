import type { SpeciesRecord } from '../../library/types.ts'
import type { SpeciationFailure } from './types.ts'

export interface ReleasedMolality {
  /** Species id of data/species. */
  readonly species: string
  readonly molPerKg: number
}

export interface GatheredTotals {
  readonly totals: Record<string, number>
  /** Σ z m of what was released, mol/kg: zero for whole salts. */
  readonly charge: number
}

/** An imbalance this small against the charges present is rounding. */
const roundingShare = 1e-9

/**
 * Sums what ingredients release into mol per kg of water by component. A complex counts in each of its
 * components. H+ and OH- enter through the charge alone. Refuses a species that is not known.
 * @example gatherTotals([{ species: 'CaEDTA-2', molPerKg: 0.01 }], species) → edetate 0.01, Ca+2 0.01
 */
export function gatherTotals(
  released: readonly ReleasedMolality[],
  species: ReadonlyMap<string, SpeciesRecord>,
): GatheredTotals | SpeciationFailure {
  const totals: Record<string, number> = {}
  let charge = 0
  let size = 0
  for (const { species: id, molPerKg } of released) {
    const record = species.get(id)
    if (!record) return { status: 'impossible', code: 'species-unknown', values: { species: id } }
    charge += record.charge * molPerKg
    size += Math.abs(record.charge * molPerKg)
    if (record.component === 'proton') continue
    const held = [{ component: record.component, count: record.count }, ...(record.partners ?? [])]
    for (const { component, count } of held) totals[component] = (totals[component] ?? 0) + count * molPerKg
  }
  return { totals, charge: Math.abs(charge) <= roundingShare * size ? 0 : charge }
}

/**
 * Refuses to solve a pH by electroneutrality for ingredients whose ions do not sum to zero: the missing
 * ions are not known, and a strong acid or base would be taken in their place.
 */
export const refuseCharged = (gathered: GatheredTotals): SpeciationFailure | null =>
  gathered.charge === 0
    ? null
    : {
        status: 'impossible',
        code: 'released-ions-unbalanced',
        values: { millimolesPerKg: 1000 * gathered.charge },
      }
