import type { Speciated } from '../speciation/types.ts'
import type { Solute } from './solutes.ts'

/** Totals with the chloride or sodium that a given pH brings along. */
export function impliedIons(
  totals: Readonly<Record<string, number>>,
  answer: Speciated,
): Readonly<Record<string, number>> {
  const { impliedAcidMolPerKg: acid, impliedBaseMolPerKg: base } = answer
  const more: Record<string, number> = { ...totals }
  if (acid > 0) more['Cl-'] = (more['Cl-'] ?? 0) + acid
  if (base > 0) more['Na+'] = (more['Na+'] ?? 0) + base
  return more
}

/**
 * Whether charge balance decides the pH: every ion of its own that a solute brings must be permanent (a quaternary
 * cation, no hydrogen in its name) or have its ionisation steps.
 */
export const pHIsKnown = (solutes: readonly Pick<Solute, 'ingredient'>[]): boolean =>
  unknownAcidity(solutes).length === 0

/** Solutes whose own ions may take or give protons nobody knows how. */
export function unknownAcidity<Item extends Pick<Solute, 'ingredient'>>(
  solutes: readonly Item[],
): readonly Item[] {
  return solutes.filter(({ ingredient }) => {
    if (ingredient.ownIonisation?.length) return false
    if (ingredient.tags.includes('ionisation-not-given')) return true
    return false
  })
}
