import type { Stock } from '../library/stocks.ts'
import type { Ingredient } from '../library/types.ts'

export const routeIds = [
  'ophthalmic',
  'ophthalmic-irrigation',
  'intracameral',
  'intravitreal',
  'nasal',
  'otic',
  'inhaled',
  'intravenous-peripheral',
  'intravenous-central',
  'intramuscular',
  'subcutaneous',
  'intrathecal',
  'epidural',
  'irrigation',
  'enteral',
] as const
export type RouteId = (typeof routeIds)[number]

export const targetQuantities = [
  'osmolality',
  'effective-osmolality',
  'sodium-chloride-equivalent',
  'freezing-point-depression',
] as const
export type TargetQuantity = (typeof targetQuantities)[number]

export interface FormulaTarget {
  readonly quantity: TargetQuantity
  /** As typed: "290 mOsm/kg", "0.9 %", "0.52 K". */
  readonly value: string
}

export interface FormulaLine {
  /** Stable within the document; given by whoever adds the line. */
  readonly key: string
  /** Library id, or the line's own record. */
  readonly ingredient: string | Ingredient
  /** As typed. */
  readonly amount: string
  /** Two lines marked q.s.: mass ratio in which they are sized together (default 1). */
  readonly share?: number
  /** Largest strength allowed for a q.s. line, as typed. */
  readonly cap?: string
  readonly note?: string
  /** What the amount means where it is not the article weighed: a moiety ("timolol-base") or another of its forms. */
  readonly orderedAs?: string
  readonly certificate?: Certificate
}

/** What the certificate of the lot says, in percent; absent figures are as the article should be. */
export interface Certificate {
  /** Content found, 100 for a perfect article. */
  readonly assayPercent?: number
  /** What the assay is reckoned on. */
  readonly assayBasis?: 'as-is' | 'anhydrous' | 'dried'
  /** Water found, or loss on drying, in the article as it lies on the shelf. */
  readonly waterPercent?: number
  readonly unitsPerMg?: number
}

/** The saved document. Text is kept as typed; nothing computed is stored. */
export interface Formula {
  readonly format: 'evenwater.formula'
  readonly version: 1
  readonly title: string
  readonly route: RouteId
  readonly finalVolume: string
  readonly target?: FormulaTarget
  readonly pH?: number
  readonly temperature?: string
  readonly lines: readonly FormulaLine[]
  /** Solutions of one's own, measured by lines that name their ids. */
  readonly stocks?: readonly Stock[]
  /** Readability of the balance, e.g. "1 mg". Absent: amounts are not rounded. */
  readonly balance?: string
  /** Balances and measures of one's own; `balance` above is one more of them. */
  readonly bench?: Bench
  readonly batch?: Batch
  readonly order?: OrderData
  readonly patient?: PatientData
  readonly vehicle?: string
  readonly notes?: string
  /** Codes of stops that a person accepted, with the written reason that goes on the sheet. */
  readonly acknowledgements?: readonly { readonly code: string; readonly reason: string }[]
}

export interface Batch {
  readonly units: number
  /** Extra volume beyond units × finalVolume, as typed ("10 mL"). */
  readonly excess?: string
  /** Excess in each container so that the label volume can be drawn out; absent: none. */
  readonly overfill?: 'mobile' | 'viscous'
  /** What stays in filter and tubing, as typed. */
  readonly holdUp?: string
  /** What is taken for tests, as typed. */
  readonly samples?: string
}

export const measureKinds = ['flask', 'graduate', 'pipette', 'syringe'] as const
export type MeasureKind = (typeof measureKinds)[number]

/** What there is to weigh and to measure with; kept with the formula, so that its figures can be found again. */
export interface Bench {
  readonly balances?: readonly BenchBalance[]
  readonly measures?: readonly BenchMeasure[]
}

/** Masses as typed: "0.1 mg". */
export interface BenchBalance {
  readonly name: string
  readonly readability: string
  /** Standard deviation of ten or more weighings. */
  readonly repeatability?: string
  /** With `allowedErrorPercent`: the least weighable quantity of a prescription balance. */
  readonly sensitivity?: string
  readonly allowedErrorPercent?: number
  readonly capacity?: string
}

/** Volumes as typed: "10 mL". */
export interface BenchMeasure {
  readonly name: string
  readonly kind: MeasureKind
  readonly capacity: string
  /** Step of its marks; absent: it measures its capacity alone. */
  readonly graduation?: string
  /** Largest error of a measure; absent: what its kind is known to keep. */
  readonly tolerance?: string
}

export interface OrderData {
  readonly orderNumber?: string
  readonly lot?: string
  readonly masterRecord?: string
  readonly container?: string
  readonly preparedFor?: string
}

export interface PatientData {
  readonly ageYears?: number
  readonly weightKg?: number
  readonly doseVolume?: string
  readonly infusionRate?: string
}
