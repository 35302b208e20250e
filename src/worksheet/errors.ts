import type { Evaluation } from '../evaluation/types.ts'
import { combinedText, errorText, scaleName } from './bench.ts'
import { nameOf } from './names.ts'
import { numberText } from './say.ts'
import { cell, figures, names, words } from './sections.ts'
import type { SheetSection } from './types.ts'

/** The error of each mass, and what all of them do to the osmolality. */
export function errorSection({ weighingPlan, lines, uncertainty }: Evaluation): SheetSection | null {
  if (!weighingPlan) return null
  const called = new Map(lines.map((line) => [line.key, nameOf(line)]))
  const largest = uncertainty
    .slice(0, 4)
    .map((part) => `${part.input} ${numberText(part.osmolalityMilliosmPerKg, 2)}`)
  return {
    kind: 'table',
    heading: 'Errors of weighing and measuring',
    columns: [
      names('Ingredient'),
      words('On or in'),
      words('Rounding and largest error'),
      figures('By root sum of squares'),
    ],
    rows: weighingPlan.lines.map((plan) => [
      cell(called.get(plan.key) ?? plan.key),
      cell(plan.scale ? scaleName(plan.scale) : (plan.measured?.measure.name ?? 'not rounded')),
      cell(errorText(plan)),
      cell(combinedText(plan)),
    ]),
    note: `Weighing, measuring and filling together: standard uncertainty ${numberText(weighingPlan.preparationMilliosmPerKg, 2)} mOsm/kg, by root sum of squares. Largest parts of the interval, mOsm/kg: ${largest.join('; ')}.`,
  }
}
