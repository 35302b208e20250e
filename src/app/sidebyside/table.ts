import type { Interval } from '../../quantity/interval.ts'
import type { LineAnswer, SolutionAnswer } from '../../evaluation/types.ts'
import { alignLines, type AlignedLine } from '../../formula/align.ts'
import { compareAmounts } from '../../formula/difference.ts'
import type { Library } from '../../library/library.ts'
import { routeNames } from '../../worksheet/routes.ts'
import {
  comparedMass,
  decimals,
  percentOfParticles,
  significant,
  volumeToMeasure,
  wholeNumber,
} from '../words/figures.ts'
import { quantityWords } from '../words/order.ts'
import type { Column } from './columns.ts'

/** How a cell stands to the first column that says something: by a sign, a word and a weight, never by colour alone. */
export type CellMark = 'same' | 'differs' | 'within'

export interface Cell {
  readonly text: string
  /** In small print under it. */
  readonly beneath: string
  readonly mark: CellMark
}

export interface ComparedRow {
  readonly key: string
  readonly label: string
  readonly cells: readonly Cell[]
}

const noFigure = '—'

const marked = (texts: readonly (string | null)[]): readonly Cell[] =>
  texts.map((text, index) => ({
    text: text ?? noFigure,
    beneath: '',
    mark: index > 0 && text !== texts[0] ? 'differs' : 'same',
  }))

const row = (key: string, label: string, cells: readonly Cell[]): ComparedRow => ({ key, label, cells })

/** What was ordered and what came out, a row for each quantity. */
export function resultRows(columns: readonly Column[]): readonly ComparedRow[] {
  const of = (label: string, write: (column: Column) => string | null) =>
    row(label, label, marked(columns.map(write)))
  const figure = (label: string, write: (solution: SolutionAnswer) => string | null) =>
    of(label, ({ evaluation }) => (evaluation?.solution ? write(evaluation.solution) : null))
  const interval = (label: string, pick: (solution: SolutionAnswer) => Interval) =>
    row(
      label,
      label,
      intervalCells(columns.map(({ evaluation }) => evaluation?.solution && pick(evaluation.solution))),
    )
  return [
    of('route', ({ formula }) => routeNames[formula.route]),
    of('final volume', ({ formula }) => formula.finalVolume),
    of('sized to', ({ formula: { target } }) =>
      target ? `${target.value}, ${quantityWords[target.quantity]}` : 'nothing',
    ),
    interval('osmolality, mOsm/kg', (solution) => solution.osmolality),
    interval('effective osmolality, mOsm/kg', (solution) => solution.effectiveOsmolality),
    figure('pH at 25 °C', ({ pH25 }) => known(pH25, 2)),
    figure('pH at 5 and 37 °C', ({ pH5, pH37 }) => `${known(pH5, 2)} · ${known(pH37, 2)}`),
    figure('freezing point, °C', (solution) => decimals(-solution.freezingPointDepressionK, 3)),
    figure('label osmolarity, mOsm/L', ({ labelOsmolarityMilliosmPerL: label }) => known(label, 0)),
    figure('ionic strength, mol/kg', ({ ionicStrength }) =>
      ionicStrength === null ? 'not known' : significant(ionicStrength, 3),
    ),
    figure('density, g/mL', ({ densityGPerMl }) => known(densityGPerMl, 4)),
  ]
}

const known = (value: number | null, places: number) =>
  value === null ? 'not known' : decimals(value, places)

/** Two values whose intervals overlap differ by less than either is known to. */
function intervalCells(intervals: readonly (Interval | null | undefined)[]): readonly Cell[] {
  const first = intervals[0]
  return intervals.map((interval, index) => {
    if (!interval) return { text: noFigure, beneath: '', mark: index > 0 && first ? 'differs' : 'same' }
    const text = wholeNumber(interval.value)
    const beneath = `${wholeNumber(interval.low)} to ${wholeNumber(interval.high)}`
    return { text, beneath, mark: index === 0 ? 'same' : intervalMark(first ?? null, interval) }
  })
}

function intervalMark(first: Interval | null, other: Interval): CellMark {
  if (!first) return 'differs'
  if (wholeNumber(first.value) === wholeNumber(other.value)) return 'same'
  return other.low <= first.high && first.low <= other.high ? 'within' : 'differs'
}

/** One row for each ingredient, with what each formula has of it. */
export function ingredientRows(columns: readonly Column[], library: Library): readonly ComparedRow[] {
  return alignLines(columns.map(({ formula }) => formula)).map((aligned, index) => ({
    key: `${nameIn(aligned, library)} ${index}`,
    label: nameIn(aligned, library),
    cells: columns.map((column, place) => lineCell(aligned, column, place)),
  }))
}

function nameIn({ ingredient }: AlignedLine, library: Library): string {
  const record = typeof ingredient === 'string' ? library.ingredients.get(ingredient) : ingredient
  return record ? (record.tallManName ?? record.name) : String(ingredient)
}

function lineCell({ lines }: AlignedLine, { evaluation }: Column, place: number): Cell {
  const line = lines[place] ?? null
  const first = lines[0] ?? null
  const differs = place > 0 && (line === null) !== (first === null)
  if (line === null) return { text: 'not in it', beneath: '', mark: differs ? 'differs' : 'same' }
  const isOtherAmount = first !== null && compareAmounts(first.amount, line.amount) === 'changed'
  const answer = evaluation?.lines.find(({ key }) => key === line.key)
  return {
    text: line.amount.trim() === '' ? 'no amount' : line.amount,
    beneath: answer ? figuresOf(answer) : '',
    mark: differs || isOtherAmount ? 'differs' : 'same',
  }
}

/** Mass or volume for the final volume, share of the particles, share of the osmolality. */
function figuresOf(answer: LineAnswer): string {
  const { grams, articleGrams, millilitres } = answer
  const { shareOfParticlesPercent: share, osmolalityShareMilliosmPerKg: osmolality } = answer
  const mass = articleGrams ?? grams
  const amount = millilitres === null ? massText(mass) : volumeToMeasure(millilitres)
  return [
    amount,
    share === null ? 'particles not known' : `${percentOfParticles(share)} of particles`,
    osmolality === null ? 'mOsm/kg not known' : `${wholeNumber(osmolality)} mOsm/kg`,
  ].join(' · ')
}

const massText = (grams: number | null) => (grams === null ? 'mass not known' : comparedMass(grams))
