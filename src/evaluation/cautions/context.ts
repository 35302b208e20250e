import type { Interval } from '../../quantity/interval.ts'
import type { RouteLimits } from '../../library/routes.ts'
import type { Ingredient } from '../../library/types.ts'
import type { UsualStrength } from '../../library/usual-strengths.ts'
import type { Formula, RouteId } from '../../formula/types.ts'

/** One line of the formula as the caution rules see it; null where it is not known. */
export interface CautionLine {
  readonly key: string
  readonly ingredient: Ingredient
  readonly grams: number | null
  readonly mmol: number | null
  readonly concentrations: {
    readonly percentWV: number | null
    readonly mmolPerL: number | null
    readonly mEqPerL: number | null
  }
  /** Sized by the solver, so that its strength is not something a person wrote. */
  readonly isAdjuster: boolean
}

/** What is known about the patient and the dose; what was not given is absent. */
export interface CautionPatient {
  readonly ageYears?: number
  readonly weightKg?: number
  readonly doseVolumeMl?: number
  readonly infusionRateMlPerH?: number
}

export interface CautionSolution {
  /** mOsm/kg */
  readonly osmolality: number
  /** mOsm/kg held outside of red cells */
  readonly effectiveOsmolality: number
  /** Both with the interval within which a reading may lie. */
  readonly intervals: { readonly osmolality: Interval; readonly effectiveOsmolality: Interval }
  readonly freezingPointDepressionK: number
  /** mOsm/L, from the solved solution. */
  readonly osmolarity: number | null
  /** mOsm/L, the ideal sum that labels print. */
  readonly labelOsmolarity: number | null
  readonly sodiumChlorideEquivalentPercent: number | null
  readonly pH: number | null
  /** mol/L per pH, solved when a rule asks for it; null where it cannot be. */
  readonly bufferCapacity: () => number | null
}

/** Everything that the caution rules may look at. */
export interface CautionContext {
  readonly formula: Formula
  readonly routeId: RouteId
  readonly limits: RouteLimits
  readonly patient: CautionPatient
  readonly lines: readonly CautionLine[]
  /** Null while the formula is blocked. */
  readonly solution: CautionSolution | null
  /** mmol/L by ion or mass-balance component as put in, "Na+" or "phosphate"; null where it is not known. */
  readonly ionTotals: Readonly<Record<string, number | null>>
  readonly volumeMl: number | null
  readonly usualStrengths: readonly UsualStrength[]
}
