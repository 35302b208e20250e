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
  /** Readability of the balance, e.g. "1 mg". Absent: amounts are not rounded. */
  readonly balance?: string
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
