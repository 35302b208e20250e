import type { Conventions } from '../../library/conventions.ts'
import type { Ingredient } from '../../library/types.ts'
import type { MethodId, TraceStep } from '../types.ts'
import type { SodiumChlorideScale } from './scale.ts'

/** One solute as the classical methods see it. */
export interface MethodLine {
  readonly key: string
  readonly ingredient: Ingredient
  readonly grams: number
}

/** What one solute adds on the scale of a method, and how it was reckoned. */
export type Contribution =
  | {
      readonly status: 'known'
      readonly value: number
      readonly step: TraceStep
      /** Code of why this method may differ here. */
      readonly reason: string
      /** The datum was tabulated far from the concentration in use. */
      readonly outsideTable?: boolean
      readonly fromMemory: boolean
    }
  | { readonly status: 'missing'; readonly code: string }

export interface MethodContext {
  readonly conventions: Conventions
  readonly scale: SodiumChlorideScale
  readonly volumeMl: number
}

/** The wanted value as the formula's target or its equal by the trade's conventions. */
export interface MethodTarget {
  readonly quantity: 'osmolality' | 'sodium-chloride-equivalent' | 'freezing-point-depression'
  readonly value: number
}

/** A method that adds up what each solute brings by itself. */
export interface AdditiveMethod {
  readonly id: MethodId
  readonly unit: string
  /** Name of the sum in the trace. */
  readonly sumName: string
  contribution(line: MethodLine, context: MethodContext): Contribution
  /** mOsm/kg from the sum; null where the convention has no answer. */
  osmolality(sum: number, context: MethodContext): number | null
  closing(sum: number, context: MethodContext): readonly TraceStep[]
  /** The target on the scale of the method; null where it has no equal. */
  targetOnScale(target: MethodTarget, context: MethodContext): number | null
  /** The isotonic solution on the scale of the method. */
  isotonic(context: MethodContext): number
}

/** % w/v. */
export const percentOf = (line: MethodLine, context: MethodContext) => (line.grams / context.volumeMl) * 100

/** mol/L, or null where the molar mass is unknown. */
export function molarityOf(line: MethodLine, context: MethodContext): number | null {
  const molarMass = line.ingredient.molarMass
  return molarMass ? line.grams / molarMass.value / (context.volumeMl / 1000) : null
}
