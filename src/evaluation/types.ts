import type { Interval } from '../quantity/interval.ts'
import type { Amount } from '../quantity/amount.ts'
import type { Ingredient, SourceKey } from '../library/types.ts'
import type { Formula } from '../formula/types.ts'
import type { FormFactor } from '../library/forms.ts'
import type { Certified } from './forms/certificate.ts'
import type { StockShare } from './stocks/stock.ts'
import type { AliquotPlan } from './weighing/aliquot.ts'
import type { WeighingPlan } from './weighing/plan.ts'
import type { SolutionState, UncertaintyPart } from '../chemistry/types.ts'

export type Severity = 'stop' | 'warn' | 'note'

/** Code and values; the words are in data/findings and data/cautions and are put together by the worksheet room. */
export interface Finding {
  readonly code: string
  readonly severity: Severity
  readonly values: Readonly<Record<string, string | number>>
  /** Ingredient ids. */
  readonly ingredients: readonly string[]
  readonly lineKeys: readonly string[]
  readonly source: SourceKey
  readonly evidence?: string
  /** True: no number may be printed until it is cleared. */
  readonly blocks: boolean
}

export interface Figure {
  readonly name: string
  readonly value: number | null
  readonly unit: string
  readonly source?: SourceKey
  readonly fromMemory?: boolean
}

/** One printable line of arithmetic: rule in symbols, what went in, what came out. */
export interface TraceStep {
  readonly key: string
  readonly rule: string
  readonly subject?: string
  readonly inputs: readonly Figure[]
  readonly result: Figure
}

export const methodIds = [
  'sodium-chloride-equivalent',
  'freezing-point',
  'l-iso',
  'vant-hoff',
  'electrolyte',
] as const
export type MethodId = (typeof methodIds)[number]

export interface MethodAnswer {
  readonly method: MethodId
  readonly osmolalityMilliosmPerKg: number | null
  /** Size of the q.s. line by this method, grams in the evaluated volume; null without q.s. or when it cannot. */
  readonly adjusterGrams: number | null
  readonly isotonicVolumeMl: number | null
  /** Line key of the ingredient that makes the largest difference against the headline method. */
  readonly differsBy: { readonly key: string; readonly milliosmPerKg: number; readonly reason: string } | null
  /** Codes of why a number is missing. */
  readonly missing: readonly { readonly code: string; readonly key: string }[]
  readonly trace: readonly TraceStep[]
}

export interface LineAnswer {
  readonly key: string
  readonly ingredient: Ingredient
  readonly amount: Amount
  readonly isAdjuster: boolean
  /** Exact, before rounding to the balance. */
  readonly gramsExact: number | null
  /** What is weighed; everything downstream belongs to this. */
  readonly grams: number | null
  /** Mass of the article on the shelf where it is not the pure substance (phosphoric acid 85 %). */
  readonly articleGrams: number | null
  /** For liquids measured by volume. */
  readonly millilitres: number | null
  readonly millimoles: number | null
  readonly particlesFormal: number | null
  readonly particlesCounted: number | null
  readonly effectiveI: number | null
  readonly shareOfParticlesPercent: number | null
  readonly shareFormalPercent: number | null
  readonly osmolalityShareMilliosmPerKg: number | null
  readonly effectiveOsmolalityShareMilliosmPerKg: number | null
  readonly belowLeastWeighable: boolean
  /** Measured as a solution from the shelf; its line of the formula is `stock.lineKey`. */
  readonly stock?: StockShare
  /** What the amount means, where it is not the article. */
  readonly ordered?: FormFactor
  readonly certified?: Certified
}

export interface SolutionAnswer {
  readonly osmolality: Interval
  /* Null where only the electrolyte model could tell and it refused. */
  readonly osmolality25: number | null
  readonly osmolality37: number | null
  readonly osmolarityMilliosmPerL: number | null
  readonly effectiveOsmolality: Interval
  readonly freezingPointDepressionK: number
  /** By the trade's convention 0.52 K = 0.9 % NaCl. */
  readonly conventionalDepressionK: number | null
  /** Null beyond the strongest sodium chloride solution. */
  readonly sodiumChlorideEquivalentPercent: number | null
  /** Null for pure water too. */
  readonly osmoticCoefficient: number | null
  readonly waterActivity: number | null
  readonly osmoticPressureKPa37: number | null
  readonly labelOsmolarityMilliosmPerL: number | null
  readonly ionicStrength: number | null
  readonly pH: number | null
  readonly pH5: number | null
  readonly pH25: number | null
  readonly pH37: number | null
  readonly pHIsSolved: boolean
  readonly densityGPerMl: number | null
  readonly waterKgPerL: number | null
  /** Red-cell volume relative to plasma, and haemolysis onset; null when outside the relation's range. */
  readonly redCellRelativeVolume: number | null
}

export interface AdjusterAnswer {
  readonly status: 'found' | 'already-above' | 'unreachable' | 'cannot-size' | 'not-converged'
  readonly lineKeys: readonly string[]
  readonly gramsByKey: Readonly<Record<string, number>>
  readonly target: { readonly quantity: string; readonly value: number; readonly unit: string }
  /** Value without any adjuster, in the target's unit. */
  readonly without: number | null
  /** Largest common factor on the other solutes that still fits the target, and dilution needed. */
  readonly largestFractionThatFits: number | null
  readonly dilutionToVolumeMl: number | null
}

export interface IonAnswer {
  readonly ion: string
  readonly mmolPerMl: number
  readonly mEqPerMl: number | null
}

/** A mass below the least weighable one, in the whole batch; null where no two dilutions reach it. */
export interface LineAliquot {
  readonly key: string
  readonly neededGrams: number
  readonly plan: AliquotPlan | null
}

export interface Evaluation {
  readonly status: 'ok' | 'blocked'
  readonly formula: Formula
  readonly volumeMl: number | null
  readonly batchVolumeMl: number | null
  readonly batchFactor: number
  readonly headline: 'electrolyte' | 'sodium-chloride-equivalent'
  readonly solution: SolutionAnswer | null
  readonly state: SolutionState | null
  readonly methods: readonly MethodAnswer[]
  readonly lines: readonly LineAnswer[]
  readonly adjuster: AdjusterAnswer | null
  readonly electrolytes: readonly IonAnswer[]
  readonly aliquots: readonly LineAliquot[]
  /** How each line is weighed or measured, and what the batch is made of; absent while blocked. */
  readonly weighingPlan?: WeighingPlan
  readonly findings: readonly Finding[]
  readonly uncertainty: readonly UncertaintyPart[]
  readonly routeSpan: {
    readonly low: number
    readonly high: number
    readonly evidence: string
    readonly source: SourceKey
  } | null
  readonly trace: readonly TraceStep[]
  readonly libraryVersion: string
}
