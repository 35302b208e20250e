import type { NeutralCurve } from '../../library/curves.ts'
import type { Ingredient, SpeciesRecord } from '../../library/types.ts'
import type { Points } from '../curve/points.ts'
import type { TabulatedCurve } from '../curve/tabulated.ts'

/** A mass-balance component, or an ion of its own, that one formula unit gives. */
export interface Given {
  readonly component: string
  readonly count: number
}

/** What follows from an ingredient and the data alone, whatever its amount: made once, asked for at every keystroke. */
export interface SoluteFacts {
  /** Its number among the ingredients seen: the same ingredient, the same mark. */
  readonly mark: number
  readonly curve: NeutralCurve | undefined
  readonly isInPool: boolean
  /** Made of its tabulated values; null where it has none, or needs none. */
  readonly table: { readonly curve: TabulatedCurve; readonly basis: Points['basis'] } | null
  /** Formula units as labelled, fully dissociated; null without a molecular formula. */
  readonly formalCount: number | null
  readonly given: readonly Given[]
  /** Σ z and Σ |z| over what one formula unit releases. */
  readonly charge: number
  readonly chargeSize: number
}

export const held = ({ component, partners = [] }: SpeciesRecord): readonly string[] => [
  component,
  ...partners.map((partner) => partner.component),
]

/** Formula units as labelled, fully dissociated; null without a molecular formula. */
export const formalCountOf = ({ releases, molarMass }: Ingredient): number | null =>
  releases && releases.length > 0 && molarMass ? releases.reduce((sum, { count }) => sum + count, 0) : null

/** Components of data/species, and own ions that count as ions, per formula unit. */
export function givenBy(
  ingredient: Ingredient,
  species: ReadonlyMap<string, SpeciesRecord>,
): readonly Given[] {
  if (!ingredient.molarMass) return []
  return (ingredient.releases ?? []).flatMap(({ species: id, count, charge }): readonly Given[] => {
    const record = species.get(id)
    if (!record) return isIonic(id, charge, ingredient) ? [{ component: id, count }] : []
    if (record.component === 'proton') return []
    const parts = [{ component: record.component, count: record.count }, ...(record.partners ?? [])]
    return parts.map((part) => ({ component: part.component, count: part.count * count }))
  })
}

const isIonic = (id: string, charge: number, { ionisingSpecies, ownIonisation }: Ingredient) =>
  charge !== 0 || (ionisingSpecies === id && (ownIonisation?.length ?? 0) > 0)

/** Σ z and Σ |z| over what one formula unit releases. */
export function chargesOf({ releases, molarMass }: Ingredient): Pick<SoluteFacts, 'charge' | 'chargeSize'> {
  let [charge, chargeSize] = [0, 0]
  for (const { count, charge: z } of (molarMass && releases) || []) {
    charge += z * count
    chargeSize += Math.abs(z) * count
  }
  return { charge, chargeSize }
}
