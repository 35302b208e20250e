import acids from '../../data/equilibria/acids.json'
import assumptions from '../../data/equilibria/assumptions.json'
import formations from '../../data/equilibria/formations.json'
import representation from '../../data/equilibria/representation.json'
import water from '../../data/equilibria/water.json'
import complexes from '../../data/species/complexes.json'
import neutralSolutes from '../../data/species/neutral-solutes.json'
import strongIons from '../../data/species/strong-ions.json'
import weakAcidsAndBases from '../../data/species/weak-acids-and-bases.json'
import { checked } from './checked.ts'
import { equilibriaSchemas, speciesSchema } from './equilibria-schema.ts'
import type { Datum, SpeciesRecord } from './types.ts'

/** An equilibrium constant at 25 °C and zero ionic strength, and what moves it with temperature. */
interface ThermalShift {
  readonly enthalpyKilojoulePerMole: Datum
  /** Absent: unknown and taken as constant enthalpy. */
  readonly heatCapacityJoulePerMoleKelvin?: Datum
}

/** Acid = base + H+, with `watersTaken` molecules of water on the left side. */
export interface IonisationStep extends ThermalShift {
  readonly pKa: Datum
  readonly watersTaken: number
}

/** Species of one mass balance, most protonated first, and the steps between neighbours. */
export interface AcidFamily {
  readonly component: string
  readonly species: readonly string[]
  readonly steps: readonly IonisationStep[]
}

/** Sum of `from` = species + `protonsReleased` H+ + `watersReleased` H2O: complexes and polyborates. */
export interface Formation extends ThermalShift {
  readonly species: string
  readonly from: readonly { readonly species: string; readonly count: number }[]
  readonly protonsReleased: number
  readonly watersReleased: number
  readonly logK: Datum
}

export interface MetalLigand {
  readonly metal: string
  readonly ligand: string
}

/**
 * How the bond of a metal with a ligand is carried. A pair with a formation is a species; a pair in
 * `interaction` has it in the interaction parameters instead, never both; a pair in `negligible` is too weak
 * to matter. Any other pair of the two lists is not known, nor is any in `unknown` (polyols with borate).
 */
export interface Representation {
  readonly metals: readonly string[]
  readonly ligands: readonly string[]
  readonly interaction: readonly MetalLigand[]
  readonly negligible: readonly MetalLigand[]
  readonly unknown: readonly MetalLigand[]
}

export interface Equilibria {
  /** Temperatures for which the constants may be used. */
  readonly celsiusMin: number
  readonly celsiusMax: number
  readonly water: Omit<IonisationStep, 'watersTaken'>
  /** CO2(g) = CO2(aq), mol per kg and atm. */
  readonly carbonDioxideSolubility: ThermalShift & { readonly logK: Datum }
  readonly acids: readonly AcidFamily[]
  readonly formations: readonly Formation[]
  readonly representation: Representation
  /** Enthalpies for a drug's own ionisation where none is known. */
  readonly assumedEnthalpies: {
    readonly protonatedBaseEnthalpyKilojoulePerMole: Datum
    readonly neutralAcidEnthalpyKilojoulePerMole: Datum
  }
}

/** The raw files, for the content mark and the check that every source is known. */
export const equilibriaFiles: Readonly<Record<string, unknown>> = {
  acids,
  assumptions,
  formations,
  representation,
  water,
}

export const speciesFiles: Readonly<Record<string, unknown>> = {
  'strong-ions': strongIons,
  'weak-acids-and-bases': weakAcidsAndBases,
  complexes,
  'neutral-solutes': neutralSolutes,
}

/** Every species that ingredients release or form in water. Ids are unique. */
export function loadSpecies(): readonly SpeciesRecord[] {
  const all: SpeciesRecord[] = []
  const seen = new Set<string>()
  for (const [file, content] of Object.entries(speciesFiles)) {
    for (const record of checked(speciesSchema, content, `species/${file}`)) {
      if (seen.has(record.id)) throw new Error(`data/species/${file}.json: ${record.id} stands twice`)
      seen.add(record.id)
      all.push(record)
    }
  }
  return all
}

/** Acid families, complexes, polyborates, water and carbon dioxide, checked against the species. */
export function loadEquilibria(): Equilibria {
  const known = new Set(loadSpecies().map((record) => record.id))
  const families = checked(equilibriaSchemas.acids, acids, 'equilibria/acids')
  const formed = checked(equilibriaSchemas.formations, formations, 'equilibria/formations')
  const solvent = checked(equilibriaSchemas.water, water, 'equilibria/water')
  const named = [
    ...families.flatMap((family) => family.species),
    ...formed.flatMap((formation) => [formation.species, ...formation.from.map((part) => part.species)]),
  ]
  const stranger = named.find((id) => !known.has(id))
  if (stranger !== undefined) throw new Error(`data/equilibria: ${stranger} is no known species`)
  const uneven = families.find((family) => family.species.length !== family.steps.length + 1)
  if (uneven)
    throw new Error(`data/equilibria/acids.json: ${uneven.component} needs one step per neighbour pair`)
  return {
    ...solvent,
    acids: families,
    formations: formed,
    representation: checked(equilibriaSchemas.representation, representation, 'equilibria/representation'),
    assumedEnthalpies: checked(equilibriaSchemas.assumptions, assumptions, 'equilibria/assumptions'),
  }
}
