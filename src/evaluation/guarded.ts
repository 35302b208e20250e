import type { Library } from '../library/library.ts'
import { cautionContextOf } from './cautions/contextOf.ts'
import { readPatient } from './cautions/patient.ts'
import { raiseCautions } from './cautions/raise.ts'
import { inOrder } from './finding.ts'
import type { Evaluation } from './types.ts'

/** An evaluation with the route's tolerated span and everything that the rules of the trade say about it. */
export function guarded(evaluation: Evaluation, library: Library): Evaluation {
  const { formula } = evaluation
  const { patient, findings: unread } = readPatient(formula, library)
  const cautions = raiseCautions(cautionContextOf(evaluation, patient, library), library.cautions)
  const span = library.routes.get(formula.route)?.span
  return {
    ...evaluation,
    routeSpan: span ? { low: span.low, high: span.high, evidence: span.evidence, source: span.source } : null,
    findings: inOrder(
      [...evaluation.findings, ...unread, ...cautions],
      formula.lines.map(({ key }) => key),
    ),
  }
}
