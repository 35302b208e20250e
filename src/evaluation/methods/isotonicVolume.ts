import { datumFigure, figure } from './figures.ts'
import type { TraceStep } from '../types.ts'
import type { AdditiveMethod, MethodContext, MethodLine } from './common.ts'
import type { LineContribution } from './sum.ts'

export interface IsotonicVolume {
  /** mL that the solutes make isotonic; null when a datum is missing. */
  readonly millilitres: number | null
  readonly trace: readonly TraceStep[]
}

/**
 * Volume that each solute makes isotonic by itself, and all of them: V = w·E·111.1 where the method has an
 * equivalent, else the evaluated volume × sum / isotonic value. mL.
 */
export function isotonicVolume(
  method: AdditiveMethod,
  lines: readonly LineContribution[],
  context: MethodContext,
): IsotonicVolume {
  const trace: TraceStep[] = []
  let total = 0
  for (const { line, contribution } of lines) {
    if (contribution.status === 'missing') return { millilitres: null, trace: [] }
    const step = stepFor(method, line, contribution.value, context)
    total += step.result.value ?? 0
    trace.push(step)
  }
  const result = figure('isotonic volume', total, 'mL')
  return { millilitres: total, trace: [...trace, { key: 'volume-sum', rule: 'Σ V', inputs: [], result }] }
}

function stepFor(method: AdditiveMethod, line: MethodLine, value: number, context: MethodContext): TraceStep {
  const { conventions, volumeMl } = context
  const key = `volume-${line.key}`
  const subject = line.ingredient.name
  const equivalent = equivalentGrams(method, value, context)
  if (equivalent !== null) {
    const perGram = conventions.isotonicVolumePerGramMl
    const e = line.grams > 0 ? equivalent / line.grams : 0
    const inputs = [
      figure('w', line.grams, 'g'),
      figure('E', e, 'g NaCl/g'),
      datumFigure('per gram', perGram),
    ]
    return {
      key,
      subject,
      rule: 'V = w·E·111.1',
      inputs,
      result: figure('V', equivalent * perGram.value, 'mL'),
    }
  }
  const isotonic = method.isotonic(context)
  const inputs = [
    figure('volume', volumeMl, 'mL'),
    figure('share', value, method.unit),
    figure('isotonic', isotonic, method.unit),
  ]
  const result = figure('V', (volumeMl * value) / isotonic, 'mL')
  return { key, subject, rule: 'V = volume × share / isotonic', inputs, result }
}

/** Grams of sodium chloride that a solute counts for in the whole volume, where the method speaks of equivalents. */
function equivalentGrams(
  method: AdditiveMethod,
  value: number,
  { conventions, volumeMl }: MethodContext,
): number | null {
  if (method.id === 'sodium-chloride-equivalent') return (value * volumeMl) / 100
  if (method.id === 'l-iso') return (conventions.equivalentPerLiso.value * value * volumeMl) / 1000
  return null
}
