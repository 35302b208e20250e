import type { Library } from '../../library/library.ts'
import type { ReleasedSpecies } from '../../library/types.ts'
import { formalParticles } from '../methods/vantHoff.ts'
import type { Portion } from '../model.ts'
import type { IonAnswer } from '../types.ts'

interface Tally {
  millimoles: number
  /** Null as soon as the component comes with different charges. */
  charge: number | null
}

/* Its charge depends on the pH, and the trade orders it in mmol. */
const withoutEquivalents = new Set(['phosphate'])
const ofWater = new Set(['H+', 'OH-'])

/**
 * Every ion in mmol and mEq per mL, as put in: a weak acid counts as its component whatever it becomes, and has no
 * mEq where its charges differ or where the trade counts it in mmol.
 */
export function electrolytesOf(
  portions: readonly Portion[],
  volumeMl: number,
  library: Library,
): readonly IonAnswer[] {
  const tallies = new Map<string, Tally>()
  for (const { ingredient, grams } of portions) {
    if (!ingredient.molarMass || !ingredient.releases) continue
    const millimoles = (grams / ingredient.molarMass.value) * 1000
    for (const released of ingredient.releases) count(tallies, released, millimoles, library)
  }
  return [...tallies]
    .filter(([, { charge }]) => charge !== 0)
    .map(([ion, { millimoles, charge }]) => ({
      ion,
      mmolPerMl: millimoles / volumeMl,
      mEqPerMl:
        charge === null || withoutEquivalents.has(ion) ? null : (millimoles * Math.abs(charge)) / volumeMl,
    }))
}

function count(
  tallies: Map<string, Tally>,
  { species, count, charge }: ReleasedSpecies,
  millimoles: number,
  library: Library,
): void {
  if (ofWater.has(species)) return
  const record = library.species.get(species)
  const name = record && record.component !== species ? record.component : species
  const amount = millimoles * count * (record?.count ?? 1)
  const known = tallies.get(name)
  if (!known) tallies.set(name, { millimoles: amount, charge })
  else {
    known.millimoles += amount
    if (known.charge !== charge) known.charge = null
  }
}

/**
 * The ideal sum that labels print: Σ ν·c, mOsm/L; null with the keys of what has no molecular formula.
 */
export function labelOsmolarity(
  portions: readonly Portion[],
  volumeMl: number,
): { readonly milliosmPerL: number | null; readonly missing: readonly string[] } {
  const missing: string[] = []
  let milliosmoles = 0
  for (const { key, ingredient, grams } of portions) {
    const particles = formalParticles(ingredient)
    if (particles === null || !ingredient.molarMass) missing.push(key)
    else milliosmoles += (particles * grams * 1000) / ingredient.molarMass.value
  }
  return { milliosmPerL: missing.length > 0 ? null : (milliosmoles / volumeMl) * 1000, missing }
}
