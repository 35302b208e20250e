import { loadEstimates } from '../../library/estimates.ts'
import type { Ingredient, SpeciesRecord } from '../../library/types.ts'

/** Apparent volume of one formula unit without its crystal water, and its standard uncertainty, cm³/mol. */
export interface PartialVolume {
  readonly cm3PerMol: number
  readonly uncertainty: number
  /** Σ ν z² over its ions, for the Debye–Hückel part. */
  readonly chargeSquares: number
  readonly basis: 'species' | 'displacement' | 'estimate'
}

/** Pitzer's volumetric slope at 25 °C, cm³ kg^½ mol^-3/2, and b. */
const volumetricSlope = 1.874
const b = 1.2
export const waterMolarMass = 18.0153

/**
 * Volume that a formula unit adds: the sum over its species where all are tabulated, else its displacement, else a
 * typical specific volume. Crystal water is counted as water, not here.
 */
export function partialVolume(
  ingredient: Ingredient,
  species: ReadonlyMap<string, SpeciesRecord>,
): PartialVolume | null {
  const tabulated = fromSpecies(ingredient, species)
  if (tabulated) return tabulated
  const molarMass = ingredient.molarMass?.value
  if (molarMass === undefined) return null
  const water = waterOf(ingredient)
  const { displacement } = ingredient
  if (displacement) {
    return {
      cm3PerMol: displacement.value * molarMass - water * waterMolarMass,
      uncertainty: molarMass * (displacement.uncertainty ?? 0.03),
      chargeSquares: 0,
      basis: 'displacement',
    }
  }
  const anhydrous = molarMass - water * waterMolarMass
  return {
    cm3PerMol: anhydrous * typical().value,
    uncertainty: anhydrous * typical().uncertainty,
    chargeSquares: 0,
    basis: 'estimate',
  }
}

/** Moles of water that one formula unit gives to the solution. */
export const waterOf = ({ waterReleased, crystalWaters }: Ingredient): number =>
  waterReleased ?? crystalWaters

/** mL per gram of an ingredient without a molar mass. */
export const specificVolume = ({ displacement }: Ingredient) =>
  displacement ? { value: displacement.value, uncertainty: displacement.uncertainty ?? 0.03 } : typical()

function typical() {
  const { value, uncertainty = value } = loadEstimates().typicalSpecificVolume
  return { value, uncertainty }
}

function fromSpecies(
  ingredient: Ingredient,
  species: ReadonlyMap<string, SpeciesRecord>,
): PartialVolume | null {
  let [sum, variance, squares] = [0, 0, 0]
  for (const { species: id, count, charge } of ingredient.releases ?? []) {
    const volume = species.get(id)?.volume
    if (!volume) return null
    sum += count * volume.value
    variance += (count * (volume.uncertainty ?? 1)) ** 2
    squares += count * charge * charge
  }
  if (!ingredient.releases?.length) return null
  return { cm3PerMol: sum, uncertainty: Math.sqrt(variance), chargeSquares: squares, basis: 'species' }
}

/** Debye–Hückel growth of the apparent volume with ionic strength, cm³ per mol and unit of Σ ν z². */
export const volumeGrowth = (ionicStrength: number): number =>
  (volumetricSlope / (2 * b)) * Math.log1p(b * Math.sqrt(ionicStrength))
