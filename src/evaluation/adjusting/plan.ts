import type { Conventions } from '../../library/conventions.ts'
import type { Library } from '../../library/library.ts'
import type { Balance, ReadLine } from '../lowering.ts'
import type { SodiumChlorideScale } from '../methods/scale.ts'
import type { Setting } from '../model.ts'
import type { Target } from './target.ts'

/** Everything that is understood of a formula before any solution is solved. */
export interface Plan {
  readonly library: Library
  readonly conventions: Conventions
  readonly scale: SodiumChlorideScale
  readonly setting: Setting
  readonly solutes: readonly ReadLine[]
  readonly adjusters: readonly ReadLine[]
  /** The vehicle that fills up to the final volume, by what it holds; empty: water. */
  readonly fills: readonly ReadLine[]
  readonly balance: Balance
  readonly target: Target | null
}
