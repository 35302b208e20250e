import type { SolutionState, UncertaintyPart } from '../chemistry/types.ts'
import type { Formula } from '../formula/types.ts'
import type { Plan } from './adjusting/plan.ts'
import { electrolytesOf } from './answers/electrolytes.ts'
import type { Standing } from './blocked.ts'
import { inOrder } from './finding.ts'
import type { AdditiveAnswer } from './methods/answer.ts'
import { portionsOf } from './model.ts'
import { remarksOn } from './remarks/remarks.ts'
import type { Evaluation, Finding, LineAnswer, MethodAnswer, SolutionAnswer } from './types.ts'
import { aliquotsOf } from './weighing/aliquots.ts'
import { weighingPlanOf } from './weighing/plan.ts'
import { weighingTrace } from './weighingTrace.ts'

export interface Question {
  readonly formula: Formula
  readonly plan: Plan
  readonly standing: Standing
  readonly findings: readonly Finding[]
}

export interface Answered {
  readonly headline: Evaluation['headline']
  readonly solution: SolutionAnswer
  readonly state: SolutionState | null
  readonly lines: readonly LineAnswer[]
  readonly methods: readonly MethodAnswer[]
  readonly additive: readonly AdditiveAnswer[]
  readonly uncertainty: readonly UncertaintyPart[]
}

/** Puts an answered formula together and adds what is worth saying about it. */
export function assembled(question: Question, answered: Answered): Evaluation {
  const { formula, plan, standing } = question
  const { headline, solution, state, lines, methods, uncertainty } = answered
  const { volumeMl, batchFactor, lowered, adjuster } = standing
  const electrolytes = electrolytesOf(portionsOf(plan, lowered), plan.setting.volumeMl, plan.library)
  const partial = {
    status: 'ok',
    formula,
    volumeMl,
    batchVolumeMl: volumeMl === null ? null : volumeMl * batchFactor,
    batchFactor,
    headline,
    solution,
    state,
    methods,
    lines,
    adjuster,
    electrolytes,
    aliquots: aliquotsOf(lowered, batchFactor),
    weighingPlan: weighingPlanOf(plan, lowered, uncertainty, formula),
    uncertainty,
    routeSpan: null,
    trace: weighingTrace(plan, lowered),
    libraryVersion: plan.library.version,
  } as const
  const remarks = remarksOn(question, answered)
  return {
    ...partial,
    findings: inOrder(
      [...question.findings, ...remarks],
      formula.lines.map(({ key }) => key),
    ),
  }
}
