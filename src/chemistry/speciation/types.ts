import type { Equilibria } from '../../library/equilibria.ts'
import type { SpeciesRecord } from '../../library/types.ts'

/** All that speciation asks of an activity model. Molalities and logarithms are in the order of `species`. */
export interface ActivityCoefficients {
  readonly species: readonly SpeciesRecord[]
  lnGamma(molalities: Float64Array, out: Float64Array): void
}

/** Makes the activity model of one set of species at one temperature. */
export type ActivityOf = (species: readonly SpeciesRecord[], celsius: number) => ActivityCoefficients

/**
 * What "pH" means. `operational`: what a meter set with the primary standards reads, p(a_H γ_Cl) with the
 * conventional activity of chloride. `hydrogen-activity`: -log of the model's own hydrogen ion activity.
 */
export type PHScale = 'operational' | 'hydrogen-activity'

/** One ionisation of a drug's own ion, most acidic first. */
export interface BackgroundStep {
  /** At 25 °C and zero ionic strength. */
  readonly pKa: number
  readonly acidCharge: number
  /** Absent: unknown; an assumed value is used away from 25 °C and said so. */
  readonly enthalpyKilojoulePerMole?: number
}

/** A drug's own ion: counted in charge and ionic strength, with Debye–Hückel activity only. */
export interface BackgroundIon {
  readonly id: string
  /** Charge as released. */
  readonly charge: number
  readonly steps: readonly BackgroundStep[]
  /** g/mol. */
  readonly molarMass?: number
}

export type CarbonDioxide =
  { readonly kind: 'closed' } | { readonly kind: 'open'; readonly partialPressureAtm: number }

/** What may be present, apart from how much. */
export interface SpeciationSystem {
  readonly celsius: number
  /** Mass-balance components of data/species; the order does not matter. */
  readonly components: readonly string[]
  readonly background?: readonly BackgroundIon[]
  readonly carbonDioxide?: CarbonDioxide
  readonly pHScale?: PHScale
  /** Ions that come with the acid or base which sets a given pH. Default hydrochloric acid, sodium hydroxide. */
  readonly adjuster?: { readonly acidAnion: string; readonly baseCation: string }
}

export interface SpeciationParts {
  readonly species: readonly SpeciesRecord[]
  readonly equilibria: Equilibria
  readonly activity: ActivityOf
  /** Debye–Hückel slope of the osmotic coefficient at a temperature, kg^½ mol^-½. */
  readonly debyeHueckelSlope: (celsius: number) => number
}

export type ProtonCondition =
  { readonly kind: 'electroneutral' } | { readonly kind: 'pH'; readonly pH: number }

export interface SpeciationFailure {
  readonly status: 'not-converged' | 'impossible'
  /** Key of data/findings. */
  readonly code: string
  readonly values: Readonly<Record<string, string | number>>
}

/** A remark that goes with a converged answer. `code` is a key of data/findings. */
export interface SpeciationRemark {
  readonly code: string
  readonly values: Readonly<Record<string, string | number>>
}

export interface Speciated {
  readonly status: 'converged'
  readonly species: readonly SpeciesRecord[]
  /** mol per kg of water, in the order of `species`, the ions of an implied adjuster included. */
  readonly molalities: Float64Array
  readonly lnGamma: Float64Array
  readonly pH: number
  readonly lnHydrogenActivity: number
  readonly ionicStrength: number
  /** Strong acid or base, mol/kg, that the given pH takes and the composition does not name; 0 when solved. */
  readonly impliedAcidMolPerKg: number
  readonly impliedBaseMolPerKg: number
  readonly iterations: number
  readonly residuals: {
    /** Largest |found - total| / total over the components. */
    readonly massBalance: number
    /** |Σ z m|, mol/kg. */
    readonly charge: number
    /** Largest change of ln γ in the last step. */
    readonly activity: number
  }
  readonly remarks: readonly SpeciationRemark[]
}

export type SpeciationResult = Speciated | SpeciationFailure

/** mol per kg of water by component, background ions by their id. */
export type Totals = Readonly<Record<string, number>>
