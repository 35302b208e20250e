import { blankCell, cell } from './sections.ts'
import { massText, numberText, volumeText } from './say.ts'
import type { Evaluation, LineAnswer } from '../evaluation/types.ts'
import type { SheetCell, SheetSection } from './types.ts'

/** Generic name with its tall-man letters, salt and hydrate as the library writes it. */
export const nameOf = (line: LineAnswer): string => line.ingredient.tallManName ?? line.ingredient.name

/**
 * What to weigh or measure for the batch. The rounded mass is what was evaluated; the exact one stands beside it.
 * Scaling goes by the batch factor: a batch is the evaluated volume times that factor.
 */
export function weighingTable(evaluation: Evaluation): SheetSection {
  const batch = evaluation.batchVolumeMl ?? evaluation.volumeMl
  return {
    kind: 'table',
    heading: batch === null ? 'Weigh and measure' : `Weigh and measure for ${volumeText(batch)}`,
    columns: [
      { label: 'Ingredient', align: 'start' },
      { label: 'As ordered', align: 'start' },
      { label: 'Calculated', align: 'end' },
      { label: 'Weigh or measure', align: 'end' },
      { label: 'Measured', align: 'end', blank: true },
      { label: 'Lot', align: 'start', blank: true },
      { label: 'Expiry', align: 'start', blank: true },
      { label: 'Done', align: 'start', blank: true },
      { label: 'Checked', align: 'start', blank: true },
    ],
    rows: evaluation.lines.map((line) => weighingRow(line, evaluation.batchFactor)),
    note: evaluation.formula.balance
      ? `Masses are rounded to the balance (${evaluation.formula.balance}); every figure on this sheet belongs to the rounded masses.`
      : 'No balance was named: masses are not rounded.',
  }
}

function weighingRow(line: LineAnswer, factor: number): readonly SheetCell[] {
  return [
    cell(nameOf(line), identity(line)),
    cell(line.isAdjuster ? 'to target (q.s.)' : line.amount.text),
    cell(line.gramsExact === null ? '' : massText(line.gramsExact * factor, 5)),
    weighed(line, factor),
    ...Array.from({ length: 5 }, () => blankCell),
  ]
}

function weighed(line: LineAnswer, factor: number): SheetCell {
  if (line.millilitres !== null) {
    const mass = line.grams === null ? undefined : `or ${massText(line.grams * factor, 5)}`
    return cell(volumeText(line.millilitres * factor, 4), mass)
  }
  if (line.grams === null) return cell('')
  if (line.articleGrams !== null) {
    const pure = `${massText(line.grams * factor, 5)} of the pure substance`
    return cell(`${massText(line.articleGrams * factor, 7)} of the article`, pure)
  }
  return cell(massText(line.grams * factor, 7), roundingError(line))
}

/** How far the rounding moves this mass; silent below a hundredth of a percent. */
function roundingError(line: LineAnswer): string | undefined {
  if (line.grams === null || !line.gramsExact) return undefined
  const percent = (line.grams / line.gramsExact - 1) * 100
  if (Math.abs(percent) < 0.01) return undefined
  return `rounding ${percent > 0 ? '+' : '−'}${numberText(Math.abs(percent), 2)} %`
}

function identity({ ingredient }: LineAnswer): string | undefined {
  const parts = [
    ingredient.formula,
    ingredient.molarMass && `${numberText(ingredient.molarMass.value, 5)} g/mol`,
  ].filter((part) => part !== undefined)
  return parts.length > 0 ? parts.join(', ') : undefined
}
