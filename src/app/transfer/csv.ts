import type { Evaluation, LineAnswer, SolutionAnswer } from '../../evaluation/types.ts'
import type { Library } from '../../library/library.ts'
import { notKnown } from '../../quantity/express.ts'
import { tellFinding } from '../../worksheet/tell.ts'

type Cell = string | number | null

/** Text that a spreadsheet would take for a formula, also after blanks and in full-width signs. */
const isFormulaText = /^\s*[=+\-@＝＋－＠]/

/** One cell: text in quotes where it must be, never read as a formula; numbers plain, with a decimal point. */
export function csvCell(cell: Cell): string {
  if (cell === null) return notKnown
  if (typeof cell === 'number') return Number.isFinite(cell) ? String(Number(cell.toPrecision(7))) : notKnown
  const safe = isFormulaText.test(cell) || /^[\t\r\n]/.test(cell) ? `'${cell}` : cell
  return /[",;\t\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe
}

const lineTitles = [
  'line',
  'ingredient',
  'id',
  'as ordered',
  'q.s.',
  'substance, g',
  'article to weigh, g',
  'measure, mL',
  'mmol',
  'particles, formal',
  'particles, counted',
  'of all particles, %',
  'osmolality share, mOsm/kg',
]

const lineCells = (line: LineAnswer, index: number): readonly Cell[] => [
  index + 1,
  line.ingredient.name,
  line.ingredient.id,
  line.amount.text,
  line.isAdjuster ? 'yes' : 'no',
  line.grams,
  line.millilitres === null ? (line.articleGrams ?? line.grams) : 'by volume',
  line.millilitres === null ? 'by mass' : line.millilitres,
  line.millimoles,
  line.particlesFormal,
  line.particlesCounted,
  line.shareOfParticlesPercent,
  line.osmolalityShareMilliosmPerKg,
]

const plain = (name: string, value: number | null, unit: string): readonly Cell[] => [
  name,
  value,
  unit,
  '',
  '',
]

const resultRows = (s: SolutionAnswer): readonly (readonly Cell[])[] => [
  ['osmolality', s.osmolality.value, 'mOsm/kg', s.osmolality.low, s.osmolality.high],
  [
    'effective osmolality',
    s.effectiveOsmolality.value,
    'mOsm/kg',
    s.effectiveOsmolality.low,
    s.effectiveOsmolality.high,
  ],
  plain('osmolality at 25 °C', s.osmolality25, 'mOsm/kg'),
  plain('osmolality at 37 °C', s.osmolality37, 'mOsm/kg'),
  plain('osmolarity', s.osmolarityMilliosmPerL, 'mOsm/L'),
  plain('label osmolarity (ideal sum)', s.labelOsmolarityMilliosmPerL, 'mOsm/L'),
  plain('freezing-point depression', s.freezingPointDepressionK, 'K'),
  plain('sodium chloride equivalent', s.sodiumChlorideEquivalentPercent, '%'),
  plain('pH at 5 °C', s.pH5, ''),
  plain('pH at 25 °C', s.pH25, ''),
  plain('pH at 37 °C', s.pH37, ''),
  plain('ionic strength', s.ionicStrength, 'mol/kg'),
  plain('osmotic coefficient', s.osmoticCoefficient, ''),
  plain('density', s.densityGPerMl, 'g/mL'),
  plain('water', s.waterKgPerL, 'kg/L'),
]

/**
 * Lines, results and findings of an evaluation as comma-separated values. Null while it is blocked: there are no
 * numbers then.
 */
export function csvOf(evaluation: Evaluation, library: Library): string | null {
  const { status, solution, formula, lines, findings } = evaluation
  if (status !== 'ok' || !solution) return null
  const rows: readonly (readonly Cell[])[] = [
    ['formula', formula.title],
    ['final volume', formula.finalVolume],
    ['amounts of the lines are for, mL', evaluation.volumeMl],
    ['whole batch, mL', evaluation.batchVolumeMl],
    ['library', evaluation.libraryVersion],
    ['not a batch worksheet'],
    [],
    lineTitles,
    ...lines.map(lineCells),
    [],
    ['result', 'value', 'unit', 'low', 'high'],
    ...resultRows(solution),
    [],
    ['finding', 'message', 'way out'],
    ...findings.map((finding) => {
      const { message, wayOut } = tellFinding(finding, library)
      return [finding.severity, message, wayOut]
    }),
  ]
  return `\uFEFF${rows.map((cells) => cells.map(csvCell).join(',')).join('\r\n')}\r\n`
}
