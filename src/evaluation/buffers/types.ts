import type { BufferSystem, BufferWay } from '../../library/buffers.ts'
import type { Formula } from '../../formula/types.ts'
import type { Evaluation, Finding } from '../types.ts'

/** How much of a buffer is wanted: its strength, or the capacity it has to give. */
export type BufferSize =
  | { readonly kind: 'strength'; readonly millimolesPerLitre: number }
  | { readonly kind: 'capacity'; readonly millimolesPerLitrePerPH: number }

export interface BufferWish {
  readonly system: BufferSystem
  readonly way: BufferWay
  /** Ids of the forms on the shelf; absent: the usual one. */
  readonly acidForm?: string
  readonly baseForm?: string
  readonly pH: number
  readonly size: BufferSize
}

/** One line of a designed buffer, in the evaluated volume. */
export interface BufferPart {
  readonly ingredient: string
  readonly grams: number
  readonly millimolesPerLitre: number
  readonly part: 'acid-form' | 'base-form' | 'strong-acid' | 'strong-base'
}

export interface BufferDesign {
  readonly status: 'designed'
  readonly system: string
  readonly way: BufferWay
  readonly pH: number
  readonly millimolesPerLitre: number
  /** mmol of strong base per litre and pH, of the whole formula with the buffer in it. */
  readonly capacityMillimolesPerLitrePerPH: number
  readonly parts: readonly BufferPart[]
  /** Keys of the lines whose place it takes. */
  readonly replaces: readonly string[]
  /** The formula with the buffer in it. */
  readonly formula: Formula
  readonly evaluation: Evaluation
  readonly findings: readonly Finding[]
}

export interface BufferRefusal {
  readonly status: 'refused'
  readonly system: string
  readonly findings: readonly Finding[]
}

export type BufferResult = BufferDesign | BufferRefusal
