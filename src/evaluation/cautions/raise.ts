import { type Caution, loadCautions } from '../../library/cautions.ts'
import type { Finding } from '../types.ts'
import { judge } from './condition.ts'
import type { CautionContext } from './context.ts'
import { dailyLoads } from './loads.ts'
import { missedTarget } from './missedTarget.ts'
import type { Outcome } from './outcome.ts'
import { unansweredChecks } from './unanswered.ts'

/** What one caution came to. */
export interface Judged {
  readonly caution: Caution
  readonly outcome: Outcome
}

const rank = { stop: 0, warn: 1, note: 2 } as const

/**
 * What the rules of the trade say about a formula: stops first, each caution once with all the lines it is about, and
 * last what could not be checked for want of figures.
 */
export function raiseCautions(
  context: CautionContext,
  cautions: readonly Caution[] = loadCautions(),
): Finding[] {
  const judged = cautions.map((caution): Judged => ({ caution, outcome: judge(caution.when, context) }))
  const raised = judged.filter(({ outcome }) => outcome.truth === true)
  const ids = new Set(raised.map(({ caution }) => caution.id))
  const spoken = raised.filter(({ caution }) => !caution.yieldsTo?.some((louder) => ids.has(louder)))
  return [
    ...spoken
      .toSorted((a, b) => rank[a.caution.severity] - rank[b.caution.severity])
      .map(({ caution, outcome }) => findingOf(caution, outcome)),
    ...missedTarget(context),
    ...dailyLoads(context),
    ...unansweredChecks(judged, context),
  ]
}

const findingOf = (caution: Caution, { values, lines }: Outcome): Finding => ({
  code: caution.id,
  severity: caution.severity,
  values,
  ingredients: [...new Set(lines.map(({ ingredient }) => ingredient.id))],
  lineKeys: lines.map(({ key }) => key),
  source: caution.source,
  evidence: caution.evidence,
  blocks: false,
})
