import type { Interval } from '../../quantity/interval.ts'
import type { Evaluation, SolutionAnswer } from '../../evaluation/types.ts'
import { decimals, significant, wholeNumber } from '../words/figures.ts'
import { joined } from '../words/join.ts'
import { blockedSentence } from './blocked.ts'
import { viewOf } from './memo.ts'
import { currentEvaluation, type PageState } from './store.ts'

export interface HeadlineView {
  readonly name: string
  readonly value: string | null
  readonly interval: string
  readonly meaning: string
}

interface FigureRow {
  readonly label: string
  readonly note: string
  readonly value: string | null
}

export interface SolutionView {
  readonly blocked: string | null
  readonly total: HeadlineView
  readonly effective: HeadlineView
  readonly rows: readonly FigureRow[]
  /** What a red cell does in it. */
  readonly cells: string
  /** Which inputs make the interval as wide as it is. */
  readonly dominated: string
}

export const solutionView = viewOf(
  (state: PageState) => [currentEvaluation(state), blockedSentence(state)] as const,
  (evaluation, blocked): SolutionView => {
    const solution = evaluation?.solution ?? null
    return {
      blocked,
      total: totalHeadline(evaluation, solution),
      effective: effectiveHeadline(solution),
      rows: rowsOf(solution),
      cells: cellsSentence(solution),
      dominated: dominatedSentence(evaluation),
    }
  },
)

const between = ({ low, high }: Interval) => `${wholeNumber(low)} to ${wholeNumber(high)}`

function totalHeadline(evaluation: Evaluation | null, solution: SolutionAnswer | null): HeadlineView {
  const name = 'osmolality'
  if (!solution) return { name, value: null, interval: '', meaning: '' }
  const meaning =
    evaluation?.headline === 'electrolyte'
      ? 'What a freezing-point osmometer reads; 95 of 100 readings lie in this interval.'
      : 'Reckoned from sodium chloride equivalents, not from the electrolyte model.'
  return {
    name,
    value: wholeNumber(solution.osmolality.value),
    interval: between(solution.osmolality),
    meaning,
  }
}

function effectiveHeadline(solution: SolutionAnswer | null): HeadlineView {
  const name = 'effective osmolality'
  if (!solution) return { name, value: null, interval: '', meaning: '' }
  const passes = solution.osmolality.value - solution.effectiveOsmolality.value
  return {
    name,
    value: wholeNumber(solution.effectiveOsmolality.value),
    interval: between(solution.effectiveOsmolality),
    meaning:
      passes < 0.5
        ? 'The same: nothing in it passes the cell membrane.'
        : 'What holds water out of cells; the rest passes their membrane.',
  }
}

/** Null and its unit stay null: a figure that is missing is not shown as a number. */
const figure = (value: number | null, write: (value: number) => string, unit = '') =>
  value === null ? null : `${write(value)} ${unit}`.trim()

const known = (value: number | null, write: (value: number) => string) =>
  value === null ? 'unknown' : write(value)
const places = (count: number) => (value: number) => decimals(value, count)

type Row = readonly [label: string, note: string, value: string | null]

function rowsOf(solution: SolutionAnswer | null): readonly FigureRow[] {
  return (solution ? figureRows(solution) : blankRows).map(([label, note, value]) => ({ label, note, value }))
}

const labels = {
  freezing: 'freezing point',
  equivalent: 'sodium chloride equivalent',
  label: 'label osmolarity',
  osmolarity: 'osmolarity',
  warm: 'osmolality at 25 and 37 °C',
  acidity: 'pH at 5, 25 and 37 °C',
  strength: 'ionic strength',
  coefficient: 'osmotic coefficient',
  density: 'density',
  water: 'water',
}

const blankRows: readonly Row[] = Object.values(labels).map((label) => [label, '', null])

function figureRows(s: SolutionAnswer): readonly Row[] {
  const acidity = [s.pH5, s.pH25, s.pH37].map((value) => known(value, places(2)))
  const warm = [s.osmolality25, s.osmolality37].map((value) => known(value, wholeNumber))
  return [
    [labels.freezing, '', figure(-s.freezingPointDepressionK, places(3), '°C')],
    [labels.equivalent, '', figure(s.sodiumChlorideEquivalentPercent, places(3), '%')],
    [labels.label, '(ideal sum)', figure(s.labelOsmolarityMilliosmPerL, wholeNumber, 'mOsm/L')],
    [labels.osmolarity, '', figure(s.osmolarityMilliosmPerL, wholeNumber, 'mOsm/L')],
    [labels.warm, '', warm.join(' · ')],
    [labels.acidity, s.pHIsSolved ? '(from the balance of charges)' : '', acidity.join(' · ')],
    [labels.strength, '', figure(s.ionicStrength, (value) => significant(value, 3), 'mol/kg')],
    [labels.coefficient, '', figure(s.osmoticCoefficient, places(3))],
    [labels.density, '', figure(s.densityGPerMl, places(4), 'g/mL')],
    [labels.water, '', figure(s.waterKgPerL, places(4), 'kg/L')],
  ]
}

function cellsSentence(solution: SolutionAnswer | null): string {
  if (!solution) return ''
  const volume = solution.redCellRelativeVolume
  if (volume === null) return 'Red cells in it burst, or no volume can be given for them.'
  const percent = Math.round((volume - 1) * 100)
  if (percent === 0) return 'A red cell in it keeps the volume it has in plasma.'
  return percent > 0
    ? `A red cell in it swells by ${percent} % of the volume it has in plasma.`
    : `A red cell in it shrinks by ${-percent} % of the volume it has in plasma.`
}

function dominatedSentence(evaluation: Evaluation | null): string {
  const parts = [...(evaluation?.uncertainty ?? [])]
    .sort((one, other) => other.osmolalityMilliosmPerKg - one.osmolalityMilliosmPerKg)
    .slice(0, 3)
    .map((part) => `${part.input} (±${significant(part.osmolalityMilliosmPerKg, 2)})`)
  return parts.length === 0 ? '' : `The interval is as wide as it is chiefly because of ${joined(parts)}.`
}
