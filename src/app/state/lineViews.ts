import type { LineAnswer } from '../../evaluation/types.ts'
import type { FormulaLine } from '../../formula/types.ts'
import type { Library } from '../../library/library.ts'
import type { Ingredient } from '../../library/types.ts'
import {
  decimals,
  exactMass,
  massToWeigh,
  percentOfParticles,
  significant,
  volumeToMeasure,
  wholeNumber,
} from '../words/figures.ts'
import { equivalentFact, equivalentFromMemory, formulaFact } from '../words/ingredient.ts'
import { cellId } from './cells.ts'
import { amountRefusal } from './fields.ts'
import { findingViews, type FindingView } from './findingViews.ts'
import { viewOf } from './memo.ts'
import { currentEvaluation } from './store.ts'

export interface FigureView {
  readonly text: string
  /** In small print under it. */
  readonly beneath: string
}

export interface LineView {
  readonly key: string
  readonly order: number
  readonly name: string
  readonly known: boolean
  readonly facts: string
  readonly fromMemory: boolean
  readonly amount: string
  readonly amountRefused: boolean
  readonly isAdjuster: boolean
  /** Why the line blocks, each with its way out; held back while a hand is at work in the cell. */
  readonly refusals: readonly string[]
  /** weigh, mmol, particles, share, mOsm/kg; null while there is no evaluation. */
  readonly figures: readonly (FigureView | null)[] | null
}

export const lineViews = viewOf(
  (state) =>
    [
      state.formula.lines,
      currentEvaluation(state),
      findingViews(state),
      state.typing,
      state.drafts,
      state.library,
    ] as const,
  (lines, evaluation, findings, typing, drafts, library): readonly LineView[] =>
    lines.map((line, order) => {
      const cell = cellId({ kind: 'amount', key: line.key })
      const answer =
        evaluation?.status === 'ok' ? evaluation.lines.find(({ key }) => key === line.key) : undefined
      const refusals = typing === cell ? [] : refusalsOf(line, drafts[cell], findings)
      return {
        key: line.key,
        order,
        ...naming(line, library),
        amount: drafts[cell] ?? line.amount,
        amountRefused: typing !== cell && (drafts[cell] !== undefined || amountRefusal(line.amount) !== null),
        isAdjuster: answer?.isAdjuster ?? false,
        refusals,
        figures: answer ? figuresOf(answer) : null,
      }
    }),
)

const tooLong = 'This is far too long to be an amount. Write the amount alone, such as 50 mg or 1 %.'

/** What the evaluation found; before it could look, what the reading of the amount alone says. */
function refusalsOf(
  line: FormulaLine,
  draft: string | undefined,
  findings: readonly FindingView[],
): readonly string[] {
  if (draft !== undefined) return [tooLong]
  const blocking = findings.filter((finding) => finding.blocks && finding.lineKeys.includes(line.key))
  if (blocking.length > 0) return blocking.map(({ message, wayOut }) => `${message} ${wayOut}`.trim())
  const own = amountRefusal(line.amount)
  return own === null ? [] : [own]
}

function naming(
  line: FormulaLine,
  library: Library,
): Pick<LineView, 'name' | 'known' | 'facts' | 'fromMemory'> {
  const ingredient =
    typeof line.ingredient === 'string' ? library.ingredients.get(line.ingredient) : line.ingredient
  if (!ingredient) return { name: String(line.ingredient), known: false, facts: '', fromMemory: false }
  return {
    name: ingredient.tallManName ?? ingredient.name,
    known: true,
    facts: factsOf(ingredient),
    fromMemory: equivalentFromMemory(ingredient),
  }
}

const factsOf = (ingredient: Ingredient) =>
  [formulaFact(ingredient), equivalentFact(ingredient)].filter((fact) => fact !== undefined).join(' · ')

const written = (value: number | null, write: (value: number) => string): FigureView | null =>
  value === null ? null : { text: write(value), beneath: '' }

function figuresOf(answer: LineAnswer): readonly (FigureView | null)[] {
  const { particlesFormal: formal, particlesCounted: counted } = answer
  const particles =
    counted === null ? null : `${formal === null ? '?' : decimals(formal, 0)} · ${decimals(counted, 2)}`
  return [
    weighed(answer),
    written(answer.millimoles, (value) => significant(value, 3)),
    particles === null ? null : { text: particles, beneath: '' },
    written(answer.shareOfParticlesPercent, percentOfParticles),
    written(answer.osmolalityShareMilliosmPerKg, wholeNumber),
  ]
}

function weighed({ grams, gramsExact, millilitres, belowLeastWeighable }: LineAnswer): FigureView | null {
  if (millilitres !== null) return { text: volumeToMeasure(millilitres), beneath: '' }
  if (grams === null) return null
  const exact = gramsExact === null ? '' : exactMass(gramsExact)
  const text = massToWeigh(grams)
  const notes = [
    ...(belowLeastWeighable ? ['by aliquot'] : []),
    ...(exact === '' || exact === text ? [] : [`exactly ${exact}`]),
  ]
  return { text, beneath: notes.join('; ') }
}
