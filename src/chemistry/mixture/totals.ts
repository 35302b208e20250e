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
export function soluteTotals(solutes: readonly Solute[]): SoluteTotals {
  const all: Record<string, number> = {}
  const outsidePool: Record<string, number> = {}
  let charge = 0
  let size = 0
  for (const { molality, kind, facts } of solutes) {
    charge += facts.charge * molality
    size += facts.chargeSize * molality
    for (const { component, count } of facts.given) {
      const amount = molality * count
      all[component] = (all[component] ?? 0) + amount
      if (kind !== 'pool') outsidePool[component] = (outsidePool[component] ?? 0) + amount
    }
  }
  return { all, outsidePool, charge: Math.abs(charge) <= size * 1e-6 ? 0 : charge }
}
