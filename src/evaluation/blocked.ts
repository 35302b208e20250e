import type { Library } from '../library/library.ts'
import type { Formula } from '../formula/types.ts'
import { bareLine } from './answers/lines.ts'
import { inOrder } from './finding.ts'
import type { Lowered, ReadLine } from './lowering.ts'
import type { AdjusterAnswer, Evaluation, Finding, MethodAnswer } from './types.ts'

export interface Standing {
  readonly volumeMl: number | null
  readonly batchFactor: number
  readonly read: readonly ReadLine[]
  readonly lowered: readonly Lowered[]
  readonly adjuster: AdjusterAnswer | null
  /** Answers of single methods where none of them carries the headline. */
  readonly methods?: readonly MethodAnswer[]
}

/** An evaluation without a solution: the findings say why, and no number stands in for one that is missing. */
export function blockedEvaluation(
  formula: Formula,
  library: Library,
  { volumeMl, batchFactor, read, lowered, adjuster, methods = [] }: Standing,
  findings: readonly Finding[],
): Evaluation {
  const masses = new Map(lowered.map((line) => [line.key, line]))
  return {
    status: 'blocked',
    formula,
    volumeMl,
    batchVolumeMl: volumeMl === null ? null : volumeMl * batchFactor,
    batchFactor,
    headline: 'electrolyte',
    solution: null,
    state: null,
    methods,
    lines: read.map((line) => bareLine(line, masses.get(line.key))),
    adjuster,
    electrolytes: [],
    aliquots: [],
    findings: inOrder(
      findings,
      formula.lines.map(({ key }) => key),
    ),
    uncertainty: [],
    routeSpan: null,
    trace: [],
    libraryVersion: library.version,
  }
}
