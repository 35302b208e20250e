import type { SolutionState } from '../../chemistry/types.ts'
import type { Plan } from '../adjusting/plan.ts'
import type { AdditiveAnswer } from '../methods/answer.ts'
import type { Lowered, ReadLine } from '../lowering.ts'
import type { LineAnswer, MethodAnswer, SolutionAnswer } from '../types.ts'

/** What the program's own remarks look at. */
export interface RemarkContext {
  readonly plan: Plan
  readonly read: readonly ReadLine[]
  readonly lowered: readonly Lowered[]
  readonly lines: readonly LineAnswer[]
  readonly solution: SolutionAnswer
  readonly state: SolutionState | null
  readonly additive: readonly AdditiveAnswer[]
  readonly methods: readonly MethodAnswer[]
}
