import { shutReasons } from '../../worksheet/attention.ts'
import { blockedSentence } from './blocked.ts'
import { viewOf } from './memo.ts'
import { currentEvaluation, type PageState } from './store.ts'

/** Why the sheet may not be printed now, in a sentence; null when it may. */
export const printRefusal = viewOf(
  (state: PageState) =>
    [currentEvaluation(state), blockedSentence(state), state.formula.lines.length, state.library] as const,
  (evaluation, blocked, lineCount, library): string | null => {
    if (blocked !== null) return blocked
    if (!evaluation) return 'The figures are being worked out.'
    if (lineCount === 0) return 'There is nothing on the sheet yet: add an ingredient.'
    const reasons = shutReasons(evaluation, library)
    return reasons.length === 0 ? null : `Not printed while this stands: ${reasons.join(' ')}`
  },
)
