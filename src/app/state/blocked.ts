import { fieldLabels, type FieldId } from './fields.ts'
import { currentEvaluation, type PageState } from './store.ts'
import { joined } from '../words/join.ts'

const isField = (cell: string): cell is FieldId => cell in fieldLabels

const labelOf = (cell: string) => (isField(cell) ? fieldLabels[cell] : 'an amount')

/** Why there are no numbers, in one sentence; null when there are. Where it is mended stands at the cells and under What to watch. */
export function blockedSentence(state: PageState): string | null {
  if (state.failure !== null) return state.failure
  const unreadable = Object.keys(state.drafts).map((cell) => labelOf(cell))
  if (unreadable.length > 0) return `Blocked: ${joined(unreadable)} cannot be read, so there are no numbers.`
  const evaluation = currentEvaluation(state)
  if (evaluation?.status !== 'blocked') return null
  return state.typing === null
    ? 'Blocked: no numbers until what is marked here is mended.'
    : 'No numbers while this is being written.'
}
