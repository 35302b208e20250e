import type { TraceStep } from '../types.ts'
import type { AdditiveMethod, Contribution, MethodContext, MethodLine } from './common.ts'
import { figure } from './figures.ts'

export interface LineContribution {
  readonly line: MethodLine
  readonly contribution: Contribution
}

export interface MethodSum {
  readonly parts: readonly LineContribution[]
  readonly missing: readonly { readonly code: string; readonly key: string }[]
  /** On the scale of the method; null when anything is missing. */
  readonly sum: number | null
  readonly trace: readonly TraceStep[]
}

/** What every solute brings, their sum and the arithmetic; a missing datum is named and leaves no sum. */
export function sumOf(
  method: AdditiveMethod,
  lines: readonly MethodLine[],
  context: MethodContext,
): MethodSum {
  const parts = lines.map((line) => ({ line, contribution: method.contribution(line, context) }))
  const missing: { code: string; key: string }[] = []
  const steps: TraceStep[] = []
  let sum = 0
  for (const { line, contribution } of parts) {
    if (contribution.status === 'missing') missing.push({ code: contribution.code, key: line.key })
    else {
      sum += contribution.value
      steps.push(contribution.step)
    }
  }
  if (missing.length > 0) return { parts, missing, sum: null, trace: steps }
  const total: TraceStep = {
    key: 'sum',
    rule: 'Σ',
    inputs: [],
    result: figure(method.sumName, sum, method.unit),
  }
  return { parts, missing, sum, trace: [...steps, total, ...method.closing(sum, context)] }
}
