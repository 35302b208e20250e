import type { SpeciesRecord } from '../../library/types.ts'
import type { Solute } from './solutes.ts'

/** mol per kg of water by component, drugs' own ions by their id. */
export interface SoluteTotals {
  /** Of everything. */
  readonly all: Readonly<Record<string, number>>
  /** Of what has its own curve and is therefore not counted in the pool. */
  readonly outsidePool: Readonly<Record<string, number>>
  /** Σ z m of all that was released: zero for whole salts. */
  readonly charge: number
}

/** Sums what the solutes release. */
export function soluteTotals(
  solutes: readonly Solute[],
  species: ReadonlyMap<string, SpeciesRecord>,
): SoluteTotals {
  const all: Record<string, number> = {}
  const outsidePool: Record<string, number> = {}
  let charge = 0
  let size = 0
  const add = (component: string, amount: number, solute: Solute) => {
    all[component] = (all[component] ?? 0) + amount
    if (solute.kind !== 'pool') outsidePool[component] = (outsidePool[component] ?? 0) + amount
  }
  for (const solute of solutes) {
    if (!solute.ingredient.molarMass) continue
    for (const { species: id, count, charge: z } of solute.ingredient.releases ?? []) {
      const amount = solute.molality * count
      charge += z * amount
      size += Math.abs(z) * amount
      const record = species.get(id)
      if (!record) {
        if (isIonic(id, z, solute)) add(id, amount, solute)
      } else if (record.component !== 'proton') {
        add(record.component, record.count * amount, solute)
        for (const partner of record.partners ?? []) add(partner.component, partner.count * amount, solute)
      }
    }
  }
  return { all, outsidePool, charge: Math.abs(charge) <= size * 1e-6 ? 0 : charge }
}

const isIonic = (id: string, charge: number, { ingredient }: Solute) =>
  charge !== 0 || (ingredient.ionisingSpecies === id && (ingredient.ownIonisation?.length ?? 0) > 0)
