import { axisContent, type AxisContent } from '../axis/model.ts'
import type { Evaluation } from '../../evaluation/types.ts'
import type { RouteId } from '../../formula/types.ts'
import { toleratedWords } from '../words/order.ts'
import { wholeNumber } from '../words/figures.ts'
import { joined } from '../words/join.ts'
import { viewOf } from './memo.ts'
import { referenceMarks } from './referenceMarks.ts'
import { currentEvaluation } from './store.ts'
import { targetOnAxis } from './fields.ts'

export interface AxisView {
  readonly content: AxisContent
  readonly spanLabel: string
  readonly sentences: readonly Sentence[]
}

export interface Sentence {
  readonly text: string
  /** Said only where the drawing is not seen; the drawing shows it in its labels. */
  readonly spokenOnly: boolean
}

export const axisView = viewOf(
  (state) =>
    [currentEvaluation(state), targetOnAxis(state.formula), state.formula.route, state.library] as const,
  (evaluation, target, route, library): AxisView => {
    const content = axisContent(evaluation, target, referenceMarks(library))
    return {
      content,
      spanLabel: `tolerated ${toleratedWords[route]}${content.span ? ` (${content.span.evidence})` : ''}`,
      sentences: sentencesOf(content, evaluation, route),
    }
  },
)

/** Less than this between the two is less than either is known to. */
const sameWithin = 0.5

function sentencesOf(
  content: AxisContent,
  evaluation: Evaluation | null,
  route: RouteId,
): readonly Sentence[] {
  const { total, effective, target, span } = content
  const sentences: Sentence[] = []
  const say = (text: string, spokenOnly = false) => sentences.push({ text, spokenOnly })
  if (total) {
    const parts = content.shares.map((share) => `${share.name} ${wholeNumber(share.to - share.from)}`)
    say(`Total ${wholeNumber(total.value)} mOsm/kg, ${wholeNumber(total.low)} to ${wholeNumber(total.high)}.`)
    if (parts.length > 0) say(`Laid end to end: ${joined(parts)}.`, true)
  }
  if (total && effective && evaluation) say(heldSentence(total.value, effective.value, evaluation))
  if (target !== null) say(`The flag marks the target, ${wholeNumber(target)}.`, true)
  if (span) {
    say(
      `Hatched: ${wholeNumber(span.low)} to ${wholeNumber(span.high)}, tolerated ${toleratedWords[route]} (${span.evidence}).`,
    )
  }
  return sentences
}

function heldSentence(total: number, effective: number, { lines }: Evaluation): string {
  if (total - effective < sameWithin)
    return 'Cells hold against all of it: nothing here passes their membrane.'
  const passing = lines.flatMap((line) => {
    const share = line.osmolalityShareMilliosmPerKg
    const held = line.effectiveOsmolalityShareMilliosmPerKg
    if (share === null || held === null || share - held < sameWithin) return []
    return [`${line.ingredient.name} (${wholeNumber(share - held)})`]
  })
  return `Cells hold against ${wholeNumber(effective)} of it; through their membrane ${passing.length > 1 ? 'pass' : 'passes'} ${joined(passing)}.`
}
