import type { Datum, Ingredient } from '../library/types.ts'

/** One ingredient in the solution. Moles count formula units as weighed, crystal water included in the unit. */
export interface Dissolved {
  readonly key: string
  readonly ingredient: Ingredient
  readonly amount:
    | { readonly kind: 'moles'; readonly mol: number }
    | { readonly kind: 'mass'; readonly g: number }
    | { readonly kind: 'per-water'; readonly molPerKg: number }
}

export interface Composition {
  readonly volumeLitres: number
  readonly dissolved: readonly Dissolved[]
  /** A measured or wanted pH at `temperatureCelsius`, or solved from charge balance. */
  readonly pH: number | 'solve'
  readonly temperatureCelsius: number
}

/** A named, visible problem. `code` is a key of data/findings. */
export interface ChemistryProblem {
  readonly code: string
  readonly values: Readonly<Record<string, string | number>>
  readonly keys: readonly string[]
  /** Without these the answer cannot be given at all. */
  readonly fatal: boolean
}

export type Temperature = 'freezing' | '5' | '25' | '37'

/** The solution at one temperature. Molal scale. */
export interface ThermalState {
  readonly celsius: number
  /** Osmol per kg of water: -ln(a_w) / 0.0180153. */
  readonly osmolalityOsmPerKg: number
  readonly waterActivity: number
  /** Over all solute species after speciation. */
  readonly osmoticCoefficient: number
  readonly ionicStrength: number
  readonly pH: number | null
  /** mol per kg of water, by species id. */
  readonly species: Readonly<Record<string, number>>
  readonly activityCoefficients: Readonly<Record<string, number>>
}

export interface SoluteShare {
  readonly key: string
  /** mol per kg of water of formula units. */
  readonly molality: number
  readonly particlesFormal: number | null
  /** After speciation and pairing, per formula unit; for a solute known only by a table: its apparent count. */
  readonly particlesCounted: number
  /** φ·ν at this composition: osmolality share / molality. */
  readonly effectiveI: number
  readonly osmolalityOsmPerKg: number
  readonly reflection: Datum | null
  /** How its osmotic effect was obtained. */
  readonly basis: 'ion-interaction' | 'tabulated-curve' | 'class-estimate'
}

/** A standard uncertainty of the headline that comes from one named input, mOsm/kg. */
export interface UncertaintyPart {
  /** What an error of it moves: a solute's curve, the pool's model, an amount, or all amounts at once. */
  readonly kind: 'curve' | 'pool' | 'amount' | 'every-amount'
  /** Standard uncertainty of what it moves, relative. */
  readonly relative: number
  readonly key: string
  readonly input: string
  readonly osmolalityMilliosmPerKg: number
}

export interface SolutionState {
  readonly waterKgPerLitre: number
  readonly waterUncertainty: number
  readonly densityGPerMl: number
  readonly waterKg: number
  readonly states: Readonly<Record<Temperature, ThermalState>>
  /** Shares of the freezing-point osmolality; they sum to it. */
  readonly shares: readonly SoluteShare[]
  readonly pHSolved: boolean
  readonly uncertainty: readonly UncertaintyPart[]
  readonly problems: readonly ChemistryProblem[]
}

export type SolutionResult =
  | { readonly status: 'solved'; readonly state: SolutionState }
  | { readonly status: 'refused'; readonly problems: readonly ChemistryProblem[] }
