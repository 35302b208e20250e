import { equivalentAt } from '../../../src/evaluation/methods/equivalentAt.ts'
import { loadConventions } from '../../../src/library/conventions.ts'
import type { Ingredient } from '../../../src/library/types.ts'
import { library, solute } from '../support/salts.ts'
import { stateOf, type Measured } from './measured.ts'

/** The ingredient whose tabulated equivalents stand for each solute of the literature tables. */
const ingredients: Readonly<Record<string, string>> = {
  KCl: 'potassium-chloride',
  NH4Cl: 'ammonium-chloride',
  NaBr: 'sodium-bromide',
  NaI: 'sodium-iodide',
  KI: 'potassium-iodide',
  NaNO3: 'sodium-nitrate',
  KNO3: 'potassium-nitrate',
  AgNO3: 'silver-nitrate',
  NaH2PO4: 'sodium-phosphate-monobasic-anhydrous',
  KH2PO4: 'potassium-phosphate-monobasic',
  Na2HPO4: 'sodium-phosphate-dibasic-anhydrous',
  K2HPO4: 'potassium-phosphate-dibasic',
  CaCl2: 'calcium-chloride-dihydrate',
  MgCl2: 'magnesium-chloride-hexahydrate',
  Na2SO4: 'sodium-sulfate-anhydrous',
  K2SO4: 'potassium-sulfate',
  MgSO4: 'magnesium-sulfate-heptahydrate',
  CuSO4: 'cupric-sulfate-pentahydrate',
  Na2CO3: 'sodium-carbonate-anhydrous',
  NaHCO3: 'sodium-bicarbonate',
  Na2S2O3: 'sodium-thiosulfate-pentahydrate',
  NaAcetate: 'sodium-acetate-anhydrous',
  Na3Citrate: 'sodium-citrate-dihydrate',
  Na2H2EDTA: 'edetate-disodium-dihydrate',
  Na2B4O7: 'sodium-borate-decahydrate',
  H3BO3: 'boric-acid',
  tris: 'tromethamine',
  sucrose: 'sucrose',
  glycerol: 'glycerin',
  urea: 'urea',
  ethanol: 'ethanol',
  glucose: 'dextrose-anhydrous',
  mannitol: 'mannitol',
  'citric acid': 'citric-acid-monohydrate',
  'lactic acid': 'lactic-acid',
}

const conventions = loadConventions()

/** g NaCl per 100 mL that the tabulated equivalent makes of the solution; null where the trade has no equivalent. */
function sodiumChloridePercent({ solute: name, molality }: Measured): number | null {
  const id = ingredients[name]
  const ingredient = id === undefined ? undefined : library.ingredients.get(id)
  if (id !== undefined && !ingredient) throw new Error(`${id} is no ingredient`)
  if (!ingredient?.molarMass) return null
  const percent = (molality * waterKgPerLitre(ingredient, molality) * ingredient.molarMass.value) / 10
  const reading = equivalentAt(ingredient.sodiumChlorideEquivalents, percent)
  if (!reading) throw new Error(`${id} has no equivalent`)
  return percent * reading.e
}

const waterKgPerLitre = (ingredient: Ingredient, molality: number) =>
  stateOf(ingredient, { kind: 'per-water', molPerKg: molality }, '25').waterKgPerLitre

/**
 * What the textbook says of a measured row: 0.52 K for 0.9 % where a freezing point was measured, else the osmolality
 * of the sodium chloride solution that is said to be its equal. Null where the solute is sodium chloride itself, or
 * has no equivalent.
 */
export function byEquivalents(row: Measured): number | null {
  const percent = sodiumChloridePercent(row)
  if (percent === null) return null
  if (row.table === 'freezing points') {
    const { isotonicDepressionKelvin, isotonicSodiumChloridePercent } = conventions
    return (isotonicDepressionKelvin.value * percent) / isotonicSodiumChloridePercent.value
  }
  const grams = { kind: 'mass', g: percent * 10 } as const
  return stateOf(solute('NaCl'), grams, '25').states['25'].osmolalityOsmPerKg
}
