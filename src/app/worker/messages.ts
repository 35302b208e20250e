import type { Formula } from '../../formula/types.ts'
import type { Sampled } from '../../numeric/sample.ts'

export interface SamplingOrder {
  readonly formula: Formula
  readonly draws: number
  /** Of the repeatable generator: the same seed, the same draws. */
  readonly seed: number
}

export type SamplingReport =
  | { readonly kind: 'progress'; readonly done: number }
  | { readonly kind: 'done'; readonly result: Sampled }
  | { readonly kind: 'impossible' }
