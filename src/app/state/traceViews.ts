import type { Figure, TraceStep } from '../../evaluation/types.ts'
import { significant } from '../words/figures.ts'

export interface TraceView {
  readonly key: string
  readonly rule: string
  readonly subject: string
  readonly inputs: readonly { readonly text: string; readonly fromMemory: boolean }[]
  readonly result: string
}

const written = ({ value, unit }: Figure) =>
  value === null ? 'unknown' : `${significant(value, 5)} ${unit === '1' ? '' : unit}`.trim()

export const traceViews = (steps: readonly TraceStep[]): readonly TraceView[] =>
  steps.map((step, index) => ({
    key: `${step.key} ${index}`,
    rule: step.rule,
    subject: step.subject ?? '',
    inputs: step.inputs.map((input) => ({
      text: `${input.name} = ${written(input)}${input.source ? ` (${input.source})` : ''}`,
      fromMemory: input.fromMemory ?? false,
    })),
    result: written(step.result),
  }))
