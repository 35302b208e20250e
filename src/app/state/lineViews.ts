import type { LineAnswer } from '../../evaluation/types.ts'
import type { FormulaLine } from '../../formula/types.ts'
import type { Library } from '../../library/library.ts'
import { groupLines, summed, type LineGroup } from '../../evaluation/stocks/group.ts'
import { lineKeyOf } from '../../evaluation/stocks/keys.ts'
import type { Stock } from '../../library/stocks.ts'
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
      state.formula.stocks,
    ] as const,
  (lines, evaluation, findings, typing, drafts, library, stocks): readonly LineView[] => {
    const groups = evaluation?.status === 'ok' ? groupLines(evaluation.lines) : []
    return lines.map((line, order) => {
      const cell = cellId({ kind: 'amount', key: line.key })
      const group = groups.find(({ key }) => key === line.key)
      const answer = group?.stock ? undefined : group?.lines[0]
      const refusals = typing === cell ? [] : refusalsOf(line, drafts[cell], findings)
      return {
        key: line.key,
        order,
        ...naming(line, library, stocks),
        amount: drafts[cell] ?? line.amount,
        amountRefused: typing !== cell && (drafts[cell] !== undefined || amountRefusal(line.amount) !== null),
        isAdjuster: answer?.isAdjuster ?? false,
        refusals,
        figures: group?.stock ? stockFigures(group) : answer ? figuresOf(answer) : null,
      }
    })
  },
)

const tooLong = 'This is far too long to be an amount. Write the amount alone, such as 50 mg or 1 %.'

/** What the evaluation found; before it could look, what the reading of the amount alone says. */
function refusalsOf(
  line: FormulaLine,
  draft: string | undefined,
  findings: readonly FindingView[],
): readonly string[] {
  if (draft !== undefined) return [tooLong]
  const blocking = findings.filter(
    (finding) => finding.blocks && finding.lineKeys.some((key) => lineKeyOf(key) === line.key),
  )
  if (blocking.length > 0) return blocking.map(({ message, wayOut }) => `${message} ${wayOut}`.trim())
  const own = amountRefusal(line.amount)
  return own === null ? [] : [own]
}

function naming(
  line: FormulaLine,
  library: Library,
  stocks: readonly Stock[] | undefined,
): Pick<LineView, 'name' | 'known' | 'facts' | 'fromMemory'> {
  const ingredient =
    typeof line.ingredient === 'string' ? library.ingredients.get(line.ingredient) : line.ingredient
  if (!ingredient) {
    const id = String(line.ingredient)
    const stock = stocks?.find((own) => own.id === id) ?? library.stocks.get(id)
    if (!stock) return { name: id, known: false, facts: '', fromMemory: false }
    return {
      name: stock.name,
      known: true,
      facts: holdsFact(stock, library),
      fromMemory: stock.contains.some(({ gramsPerLitre }) => gramsPerLitre.fromMemory),
    }
  }
  return {
    name: ingredient.tallManName ?? ingredient.name,
    known: true,
    facts: factsOf(ingredient),
    fromMemory: equivalentFromMemory(ingredient),
  }
}

/** What a stock holds, in few words. */
const holdsFact = ({ contains }: Stock, library: Library): string =>
  `holds ${contains
    .map(
      ({ ingredient, gramsPerLitre }) =>
        `${library.ingredients.get(ingredient)?.name.toLowerCase() ?? ingredient} ${significant(gramsPerLitre.value, 4)} g/L`,
    )
    .join(', ')}`

/** Volume to measure and the sums of what it brings. */
function stockFigures(group: LineGroup): readonly (FigureView | null)[] {
  const millilitres = group.lines[0]?.millilitres ?? null
  return [
    millilitres === null
      ? null
      : { text: volumeToMeasure(millilitres), beneath: group.stock?.fills ? 'to volume' : '' },
    written(
      summed(group, (line) => line.millimoles),
      (value) => significant(value, 3),
    ),
    null,
    written(
      summed(group, (line) => line.shareOfParticlesPercent),
      percentOfParticles,
    ),
    written(
      summed(group, (line) => line.osmolalityShareMilliosmPerKg),
      wholeNumber,
    ),
  ]
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

function weighed(answer: LineAnswer): FigureView | null {
  const { grams, gramsExact, articleGrams, millilitres, belowLeastWeighable, ordered, certified } = answer
  if (millilitres !== null) return { text: volumeToMeasure(millilitres), beneath: '' }
  if (grams === null) return null
  if (certified && articleGrams !== null) {
    const content = `${significant(certified.content * 100, 4)} %`
    return { text: massToWeigh(articleGrams), beneath: `of the lot (${content}) for ${exactMass(grams)}` }
  }
  const exact = gramsExact === null ? '' : exactMass(gramsExact)
  const text = massToWeigh(grams)
  const notes = [
    ...(belowLeastWeighable ? ['by aliquot'] : []),
    ...(ordered ? [`× ${significant(ordered.factor, 5)} from ${ordered.orderedName}`] : []),
    ...(exact === '' || exact === text ? [] : [`exactly ${exact}`]),
  ]
  return { text, beneath: notes.join('; ') }
}
