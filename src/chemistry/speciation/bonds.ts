import type { Equilibria, MetalLigand } from '../../library/equilibria.ts'
import type { SpeciesRecord } from '../../library/types.ts'

/** True when one of the complexes binds this metal to this ligand component. */
function isComplex(pair: MetalLigand, species: readonly SpeciesRecord[]): boolean {
  return species.some(
    (record) =>
      record.component === pair.ligand &&
      (record.partners?.some((partner) => partner.component === pair.metal) ?? false),
  )
}

/**
 * Pairs of a metal and a ligand among the components whose bond is carried neither by a complex nor by an
 * interaction parameter and is not known to be weak, and polyols that bind borate: their pH and particle count are not to be trusted.
 */
export function unknownBonds(
  components: readonly string[],
  equilibria: Equilibria,
  species: readonly SpeciesRecord[],
): MetalLigand[] {
  const { metals, ligands, interaction, negligible, unknown } = equilibria.representation
  const covered = [...interaction, ...negligible]
  const listed = unknown.filter(
    ({ metal, ligand }) => components.includes(metal) && components.includes(ligand),
  )
  const unlisted = components
    .filter((component) => metals.includes(component))
    .flatMap((metal) =>
      components.filter((component) => ligands.includes(component)).map((ligand) => ({ metal, ligand })),
    )
    .filter(
      (pair) =>
        !covered.some((known) => known.metal === pair.metal && known.ligand === pair.ligand) &&
        !isComplex(pair, species),
    )
  return [...listed, ...unlisted]
}
