import { loadLibrary } from '../../../src/library/library.ts'
import type { Ingredient } from '../../../src/library/types.ts'
import { solveSolution } from '../../../src/chemistry/solution.ts'
import type { SolutionState } from '../../../src/chemistry/types.ts'

/** What one formula unit of each solute of the literature tables gives in water. */
const released: Readonly<Record<string, Readonly<Record<string, number>>>> = {
  NaCl: { 'Na+': 1, 'Cl-': 1 },
  KCl: { 'K+': 1, 'Cl-': 1 },
  LiCl: { 'Li+': 1, 'Cl-': 1 },
  NH4Cl: { 'NH4+': 1, 'Cl-': 1 },
  HCl: { 'H+': 1, 'Cl-': 1 },
  NaBr: { 'Na+': 1, 'Br-': 1 },
  NaI: { 'Na+': 1, 'I-': 1 },
  NaF: { 'Na+': 1, 'F-': 1 },
  KF: { 'K+': 1, 'F-': 1 },
  KBr: { 'K+': 1, 'Br-': 1 },
  KI: { 'K+': 1, 'I-': 1 },
  NaNO3: { 'Na+': 1, 'NO3-': 1 },
  KNO3: { 'K+': 1, 'NO3-': 1 },
  AgNO3: { 'Ag+': 1, 'NO3-': 1 },
  NaH2PO4: { 'Na+': 1, 'H2PO4-': 1 },
  KH2PO4: { 'K+': 1, 'H2PO4-': 1 },
  Na2HPO4: { 'Na+': 2, 'HPO4-2': 1 },
  K2HPO4: { 'K+': 2, 'HPO4-2': 1 },
  Na3PO4: { 'Na+': 3, 'PO4-3': 1 },
  CaCl2: { 'Ca+2': 1, 'Cl-': 2 },
  MgCl2: { 'Mg+2': 1, 'Cl-': 2 },
  'Mg(NO3)2': { 'Mg+2': 1, 'NO3-': 2 },
  Na2SO4: { 'Na+': 2, 'SO4-2': 1 },
  K2SO4: { 'K+': 2, 'SO4-2': 1 },
  Li2SO4: { 'Li+': 2, 'SO4-2': 1 },
  '(NH4)2SO4': { 'NH4+': 2, 'SO4-2': 1 },
  '(trisH)2SO4': { 'TrisH+': 2, 'SO4-2': 1 },
  MgSO4: { 'Mg+2': 1, 'SO4-2': 1 },
  CuSO4: { 'Cu+2': 1, 'SO4-2': 1 },
  K2CO3: { 'K+': 2, 'CO3-2': 1 },
  Na2CO3: { 'Na+': 2, 'CO3-2': 1 },
  NaHCO3: { 'Na+': 1, 'HCO3-': 1 },
  Na2S2O3: { 'Na+': 2, 'S2O3-2': 1 },
  NaAcetate: { 'Na+': 1, 'Acetate-': 1 },
  Na3Citrate: { 'Na+': 3, 'Citrate-3': 1 },
  Na2H2EDTA: { 'Na+': 2, 'H2EDTA-2': 1 },
  Na2B4O7: { 'Na+': 2, 'B(OH)4-': 2, 'B(OH)3': 2 },
  K2B4O7: { 'K+': 2, 'B(OH)4-': 2, 'B(OH)3': 2 },
  H3BO3: { 'B(OH)3': 1 },
  trisHCl: { 'TrisH+': 1, 'Cl-': 1 },
  tris: { Tris: 1 },
  sucrose: { sucrose: 1 },
  glycerol: { glycerol: 1 },
  urea: { urea: 1 },
  ethanol: { ethanol: 1 },
  glucose: { 'D-glucose': 1 },
  mannitol: { 'D-mannitol': 1 },
  'acetic acid': { HAcetate: 1 },
  'citric acid': { H3Citrate: 1 },
  'lactic acid': { HLactate: 1 },
}

export const library = loadLibrary()

/** A solute of a literature table as an ingredient: its ions and nothing else. */
export function solute(name: string): Ingredient {
  const parts = released[name]
  if (!parts) throw new Error(`No ions are named for ${name}`)
  return substance(name, parts)
}

/** A substance of which one formula unit gives these species, by count. */
export function substance(name: string, parts: Readonly<Record<string, number>>): Ingredient {
  const releases = Object.entries(parts).map(([species, count]) => {
    const record = library.species.get(species)
    if (!record) throw new Error(`${species} is not among the species`)
    return { species, count, charge: record.charge }
  })
  const molarMass = releases.reduce(
    (sum, { species, count }) => sum + count * (library.species.get(species)?.molarMass ?? 0),
    0,
  )
  return {
    id: name,
    name,
    synonyms: [],
    crystalWaters: 0,
    molarMass: {
      value: molarMass,
      unit: 'g/mol',
      kind: 'derived',
      source: 'project',
      confidence: 'high',
      fromMemory: false,
    },
    state: 'solid',
    percentBasis: 'w/v',
    roles: [],
    tags: [],
    releases,
    sodiumChlorideEquivalents: [],
  }
}

/** The solution of one solute at a molality, through the whole chemistry. */
export function solutionOf(name: string, molality: number): SolutionState {
  const result = solveSolution(
    {
      volumeLitres: 1,
      pH: 'solve',
      temperatureCelsius: 25,
      dissolved: [{ key: name, ingredient: solute(name), amount: { kind: 'per-water', molPerKg: molality } }],
    },
    library,
  )
  if (result.status === 'refused') throw new Error(`${name}: ${JSON.stringify(result.problems)}`)
  return result.state
}

/** Particles of one formula unit, fully dissociated. */
export const particles = (name: string): number =>
  Object.values(released[name] ?? {}).reduce((sum, count) => sum + count, 0)

export interface Deviation {
  readonly label: string
  readonly percent: number
}

export function statistics(deviations: readonly Deviation[]): {
  readonly median: number
  readonly p95: number
} {
  const sizes = deviations.map(({ percent }) => Math.abs(percent)).toSorted((a, b) => a - b)
  const at = (share: number) =>
    sizes[Math.min(sizes.length - 1, Math.ceil(share * sizes.length) - 1)] ?? Number.NaN
  return { median: at(0.5), p95: at(0.95) }
}
