import type { Evaluation, LineAnswer } from '../evaluation/types.ts'
import { groupLines, type LineGroup } from '../evaluation/stocks/group.ts'
import type { StockShare } from '../evaluation/stocks/stock.ts'
import type { LineWeighing } from '../evaluation/weighing/plan.ts'
import { balancesText, leastText, shortErrorText } from './bench.ts'
import { identity, nameOf } from './names.ts'
import { massText, numberText, volumeText } from './say.ts'
import { blankCells, box, cell, figures, names, words } from './sections.ts'
import { orderedText } from './strength.ts'
import type { SheetCell, SheetSection } from './types.ts'

export { nameOf } from './names.ts'

/**
 * What to weigh or measure for the batch. The rounded mass is what was evaluated; the exact one stands beside it.
 * Scaling goes by the batch factor: a batch is the evaluated volume times that factor.
 */
export function weighingTable(evaluation: Evaluation): SheetSection {
  const { batchVolumeMl, volumeMl, weighingPlan } = evaluation
  const batch = batchVolumeMl ?? volumeMl
  const plans = new Map(weighingPlan?.lines.map((plan) => [plan.key, plan]))
  return {
    kind: 'table',
    heading: batch === null ? 'Weigh and measure' : `Weigh and measure for ${volumeText(batch)}`,
    columns: [
      names('Ingredient'),
      words('Ordered'),
      figures('Calculated'),
      figures('Weigh or measure', 'much'),
      box('Measured (slip)', 'some'),
      box('Maker, lot, expiry', 'much'),
      box('Assay factor'),
      box('Done'),
      box('Check'),
    ],
    rows: [
      ...groupLines(evaluation.lines).flatMap((group) =>
        group.stock
          ? [stockRow(group, group.stock, evaluation, plans.get(group.lines[0]?.key ?? ''))]
          : group.lines.map((line) => weighingRow(line, evaluation, plans.get(line.key))),
      ),
      ...adjustmentRows(evaluation, batch),
    ],
    note: `${balancesText(evaluation)} Every figure on this sheet belongs to the rounded masses. Where the certificate gives another assay or water than 100 %, divide by its factor, write it down and ask before weighing.`,
  }
}

/** What is added by reading or to a mark, not by mass. */
function adjustmentRows(evaluation: Evaluation, batch: number | null): readonly (readonly SheetCell[])[] {
  const { formula, lines, findings } = evaluation
  const acid = findings.some(({ code }) => code === 'implied-ph-adjuster')
    ? [
        [
          cell('Acid or base for the pH', 'not named by a line; name, strength and mL'),
          cell('by reading'),
          cell(''),
          cell('mL added'),
          ...blankCells(5),
        ],
      ]
    : []
  if (lines.some(({ ingredient: { roles } }) => roles.length === 1 && roles[0] === 'vehicle')) return acid
  if (lines.some(({ stock }) => stock?.fills)) return acid
  const vehicle = [
    cell(formula.vehicle ?? 'water for injection', 'vehicle'),
    cell('q.s.'),
    cell(''),
    cell(batch === null ? '' : `to ${volumeText(batch)}`),
    ...blankCells(5),
  ]
  return [...acid, vehicle]
}

/** A solution from the shelf: one volume, and beneath it what it brings. */
function stockRow(
  { lines }: LineGroup,
  { stock, fills }: StockShare,
  { batchFactor }: Evaluation,
  plan: LineWeighing | undefined,
): readonly SheetCell[] {
  const [first] = lines
  const holds = lines
    .map((line) => `${nameOf(line)} ${massText((line.grams ?? 0) * batchFactor, 5)}`)
    .join(', ')
  const measure = plan?.measured ? `${plan.measured.measure.name}; ` : ''
  const volume = first?.millilitres == null ? '' : volumeText(first.millilitres * batchFactor, 5)
  return [
    cell(stock.name, `brings ${holds}`),
    cell(fills || !first ? 'q.s. to volume' : orderedText(first)),
    cell(''),
    cell(fills ? `about ${volume}, to the mark` : volume, `${measure}${shortErrorText(plan)}`),
    ...blankCells(5),
  ]
}

function weighingRow(
  line: LineAnswer,
  { batchFactor, aliquots }: Evaluation,
  plan: LineWeighing | undefined,
): readonly SheetCell[] {
  const isAliquot = aliquots.some(({ key, plan: dilution }) => key === line.key && dilution !== null)
  return [
    cell(nameOf(line), identity(line)),
    cell(orderedText(line), formText(line)),
    cell(line.gramsExact === null ? '' : massText(line.gramsExact * batchFactor, 5)),
    weighed(line, batchFactor, plan, isAliquot),
    ...blankCells(5),
  ]
}

/** What the order means and by which factor it became the article. */
const formText = ({ ordered }: LineAnswer): string | undefined =>
  ordered ? `as ${ordered.orderedName}, × ${numberText(ordered.factor, 5)} for the article` : undefined

const basisWords = { 'as-is': 'as it is', anhydrous: 'anhydrous basis', dried: 'dried basis' }

const basisText = ({ certified }: LineAnswer): string =>
  `assay ${basisWords[certified?.certificate.assayBasis ?? 'as-is']}`

function weighed(
  line: LineAnswer,
  factor: number,
  plan: LineWeighing | undefined,
  isAliquot: boolean,
): SheetCell {
  const error = shortErrorText(plan)
  if (plan?.trituration) return cell('by trituration, below', error)
  if (isAliquot)
    return cell(
      'by aliquot, below',
      `holds ${massText((line.articleGrams ?? line.grams ?? 0) * factor, 5)}; ${error}`,
    )
  if (line.millilitres !== null) {
    const mass = line.grams === null ? '' : `or ${massText(line.grams * factor, 5)}`
    const measure = plan?.measured ? `; ${plan.measured.measure.name}` : ''
    return cell(volumeText(line.millilitres * factor, 5), `${mass}${measure}; ${error}`)
  }
  if (line.grams === null) return cell('')
  if (line.articleGrams !== null) {
    const lot = line.certified
      ? ` (lot holds ${numberText(line.certified.content * 100, 4)} %, ${basisText(line)})`
      : ''
    const pure = `${massText(line.grams * factor, 5)} of the pure substance${lot}`
    return cell(`${massText(line.articleGrams * factor, 7)} of the article`, `${pure}; ${error}`)
  }
  const exact = massText(line.grams * factor, 7)
  return cell(exact, [leastText(plan), error].filter(Boolean).join('; '))
}
