import { wholeNumber } from '../words/figures.ts'
import { joined } from '../words/join.ts'
import { findingViews } from './findingViews.ts'
import { viewOf } from './memo.ts'
import { currentEvaluation } from './store.ts'

export interface RunningAnswer {
  readonly number: string
  readonly words: string
  readonly watch: string
}

const words = { stop: 'stop', warn: 'warning', note: 'note' } as const

/** The answer in one line, for the masthead. */
export const runningAnswer = viewOf(
  (state) =>
    [
      currentEvaluation(state),
      findingViews(state),
      state.calculation === 'coming' && state.failure === null,
    ] as const,
  (evaluation, findings, isComing): RunningAnswer => {
    if (isComing) return { number: '—', words: 'calculating', watch: '' }
    const counted = (['stop', 'warn', 'note'] as const).flatMap((severity) => {
      const count = findings.filter((finding) => finding.severity === severity).length
      return count === 0 ? [] : [`${count} ${words[severity]}${count === 1 ? '' : 's'}`]
    })
    const watch = joined(counted)
    const solution = evaluation?.solution
    if (!solution) return { number: '—', words: 'no figure: blocked', watch }
    const { value, low, high } = solution.osmolality
    return {
      number: `${wholeNumber(value)} mOsm/kg`,
      words: `(${wholeNumber(low)} to ${wholeNumber(high)}), effective ${wholeNumber(solution.effectiveOsmolality.value)}`,
      watch,
    }
  },
)
