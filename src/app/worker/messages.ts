import type { BufferOption, ComparisonWish } from '../../evaluation/buffers/compare.ts'
import type { Formula } from '../../formula/types.ts'
import type { Sampled } from '../../numeric/sample.ts'

export interface SamplingOrder {
  readonly kind: 'sample'
  readonly formula: Formula
  readonly draws: number
  /** Of the repeatable generator: the same seed, the same draws. */
  readonly seed: number
}

export type SamplingReport =
  | { readonly kind: 'progress'; readonly done: number }
  | { readonly kind: 'done'; readonly result: Sampled }
  | { readonly kind: 'impossible' }

export interface ComparisonOrder {
  readonly kind: 'compare'
  readonly formula: Formula
  readonly wish: ComparisonWish
}

export type ComparisonReport =
  | { readonly kind: 'compared'; readonly option: BufferOption; readonly total: number }
  | { readonly kind: 'finished' }
  | { readonly kind: 'impossible' }

export type CalculationOrder = SamplingOrder | ComparisonOrder
