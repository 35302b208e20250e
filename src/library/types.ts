export type DatumKind = 'measured' | 'tabulated' | 'derived' | 'estimate'
export type Confidence = 'high' | 'medium' | 'low'
/** Key into data/sources.json. */
export type SourceKey = string

/** One figure of one source. */
export interface SingleDatum<T = number> {
  readonly value: T
  readonly unit: string
  readonly kind: DatumKind
  readonly source: SourceKey
  readonly confidence: Confidence
  /** True where the figure is recalled, not read: shown as "from memory" wherever it is used. */
  readonly fromMemory: boolean
  /** Standard uncertainty in the unit of the value. */
  readonly uncertainty?: number
  readonly note?: string
}

/** The chosen figure; `note` says why it was chosen where sources differ. */
export interface Datum<T = number> extends SingleDatum<T> {
  /** What other sources say about the same quantity, agreeing or not, kept as found. */
  readonly alternatives?: readonly SingleDatum<T>[]
}

export interface Source {
  readonly key: SourceKey
  readonly title: string
  readonly kind: 'publication' | 'pharmacopoeia' | 'label' | 'common-practice' | 'from-memory' | 'project'
  readonly note?: string
}

/** Ionic classes of the L_iso method. */
export type ElectrolyteClass =
  | 'non-electrolyte'
  | 'weak-electrolyte'
  | 'di-divalent'
  | 'uni-univalent'
  | 'uni-divalent'
  | 'di-univalent'
  | 'uni-trivalent'
  | 'tri-univalent'
  | 'tetraborate'

export interface ReleasedSpecies {
  /** Species id of data/species, or a name of the ingredient's own ion, e.g. "pilocarpineH+". */
  readonly species: string
  readonly count: number
  readonly charge: number
}

export interface TabulatedEquivalent {
  /** Concentration at which E was tabulated, % w/v. */
  readonly atPercent: number
  /** Gram NaCl per gram. */
  readonly e: Datum
}

export interface MeasuredOsmolality {
  /** % w/v of the ingredient alone in water. */
  readonly atPercent: number
  /** mOsm/kg. */
  readonly osmolality: Datum
}

/** The liquid on the shelf where it is not the pure substance, e.g. phosphoric acid 85 % w/w. */
export interface Article {
  /** Mass fraction of the named substance. */
  readonly massFraction: Datum
  /** g/mL of the article. */
  readonly density: Datum
}

/** One ionisation step of the ingredient's own drug ion, most acidic first. */
export interface OwnIonisation {
  readonly pKa: Datum
  /** Charge of the acid form. */
  readonly acidCharge: number
  readonly enthalpyKilojoulePerMole?: Datum
}

export interface Ingredient {
  /** Generic name in lower case, other characters as single hyphens. */
  readonly id: string
  readonly name: string
  readonly tallManName?: string
  readonly synonyms: readonly string[]
  readonly cas?: Datum<string>
  /** Molecular formula with crystal water, e.g. "C11H16N2O2·HCl", absent for polymers and mixtures. */
  readonly formula?: string
  readonly crystalWaters: number
  /** g/mol, with crystal water. */
  readonly molarMass?: Datum
  readonly state: 'solid' | 'liquid'
  /** What a bare "%" means. */
  readonly percentBasis: 'w/v' | 'v/v'
  readonly roles: readonly string[]
  readonly tags: readonly string[]
  /** Ions and molecules that one formula unit gives in water, as labelled (before speciation). Absent: unknown. */
  readonly releases?: readonly ReleasedSpecies[]
  readonly electrolyteClass?: ElectrolyteClass
  /** Which of `releases` the steps of `ownIonisation` belong to. */
  readonly ionisingSpecies?: string
  readonly ownIonisation?: readonly OwnIonisation[]
  /**
   * Moles of water one formula unit gives to the solution, where dissolving takes up or sets free water
   * (borax 3, not 10; sodium metabisulfite -1). Absent: `crystalWaters`.
   */
  readonly waterReleased?: number
  readonly sodiumChlorideEquivalents: readonly TabulatedEquivalent[]
  /** % w/v that is iso-osmotic with 0.9 % sodium chloride. */
  readonly isoOsmoticPercent?: Datum
  readonly measuredOsmolality?: readonly MeasuredOsmolality[]
  /** K for a 1 % w/v solution. */
  readonly freezingPointDepression1Percent?: Datum
  /** Measured van 't Hoff factor. */
  readonly measuredI?: Datum
  /** Share of its osmotic effect that holds water out of a red cell: 1 stays out, 0 walks through. */
  readonly reflection?: Datum
  /** Percent haemolysis at the iso-osmotic concentration. */
  readonly haemolysisPercent?: Datum
  /** mL per g. */
  readonly displacement?: Datum
  /** g/mL of the pure liquid. */
  readonly density?: Datum
  readonly article?: Article
  readonly usualStrength?: string
  readonly routeNotes?: string
  readonly handling?: string
  /** Other forms of the same active part: hydrates, salts, base. */
  readonly family?: string
  /** What could not be given and why, and traps of this ingredient's data. */
  readonly notes?: readonly string[]
}

export interface SpeciesRecord {
  /** Charge written last: "Na+", "HPO4-2", "B(OH)3". */
  readonly id: string
  readonly charge: number
  /** Mass-balance component, e.g. "phosphate"; a strong ion is its own component. */
  readonly component: string
  /** How many of the component one species holds (B3O3(OH)4-: 3 boron). */
  readonly count: number
  /** A complex draws on further balances: CaCitrate- holds one "citrate" and, here, one "Ca+2". */
  readonly partners?: readonly { readonly component: string; readonly count: number }[]
  /** g/mol. */
  readonly molarMass: number
  /** cm³/mol, conventional (V°(H+) = 0), 25 °C. */
  readonly volume?: Datum
}
