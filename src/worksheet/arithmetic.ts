import { figureText } from './say.ts'
import type { Evaluation, MethodAnswer, MethodId, TraceStep } from '../evaluation/types.ts'
import type { SheetSection } from './types.ts'

export const methodWords: Readonly<Record<MethodId, string>> = {
  electrolyte: 'Ion-interaction model',
  'sodium-chloride-equivalent': 'Sodium chloride equivalents',
  'freezing-point': 'Freezing-point depression',
  'l-iso': 'Ionic class (L_iso)',
  'vant-hoff': 'van ’t Hoff, ions counted as free',
}

/** The arithmetic of each method, line by line, so that a second person can repeat it by hand. */
export function arithmeticSections(evaluation: Evaluation): readonly SheetSection[] {
  const general =
    evaluation.trace.length > 0 ? [section('How the amounts were obtained', evaluation.trace)] : []
  const methods = evaluation.methods.filter(({ trace }) => trace.length > 0).map(methodSection)
  return [...general, ...methods]
}

const methodSection = (method: MethodAnswer): SheetSection =>
  section(`Arithmetic: ${methodWords[method.method]}`, method.trace)

const section = (heading: string, trace: readonly TraceStep[]): SheetSection => ({
  kind: 'arithmetic',
  heading,
  lines: trace.map(traceLine),
})

/** @example traceLine of c·E with 1 % and 0.24 g/g → "pilocarpine hydrochloride: c·E, c 1 %, E 0.24 g/g (from memory) = 0.24 %" */
export function traceLine(step: TraceStep): string {
  const inputs = step.inputs.map(
    (input) => `${input.name} ${figureText(input)}${input.fromMemory ? ' (from memory)' : ''}`,
  )
  const subject = step.subject ? `${step.subject}: ` : ''
  return `${subject}${step.rule}${inputs.length > 0 ? `; ${inputs.join(', ')}` : ''} = ${figureText(step.result)}`
}
