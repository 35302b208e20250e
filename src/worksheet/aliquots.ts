import type { Evaluation, LineAliquot } from '../evaluation/types.ts'
import type { AliquotPlan } from '../evaluation/weighing/aliquot.ts'
import type { Trituration } from '../evaluation/weighing/plan.ts'
import { vehicleOf } from './order.ts'
import { massText, numberText, volumeText } from './say.ts'
import { box, cell, figures, names, words } from './sections.ts'
import type { SheetCell, SheetSection } from './types.ts'
import { nameOf } from './names.ts'

/** How the masses that cannot be weighed as such are measured: by dilution, or in a solid. */
export function aliquotSection(evaluation: Evaluation): SheetSection | null {
  const rows = evaluation.aliquots.map((aliquot) => row(aliquot, evaluation))
  if (rows.length === 0) return null
  const carried = evaluation.weighingPlan?.carriedMl ?? 0
  const share =
    carried > 0
      ? `${volumeText(carried, 5)} of ${vehicleOf(evaluation)} enter with the aliquots and are part of the final volume. `
      : ''
  return {
    kind: 'table',
    heading: 'By aliquot: masses too small to be weighed as such',
    columns: [
      names('Ingredient'),
      figures('Needed'),
      figures('Weigh'),
      words('Dilute or mix, then take'),
      words('Largest error of the dose'),
      box('Weighed'),
      box('Done'),
      box('Check'),
    ],
    rows,
    note: `Dilute with ${vehicleOf(evaluation)}; check that all has dissolved before drawing. ${share}What is left over is discarded and written down.`,
  }
}

function row({ key, neededGrams, plan }: LineAliquot, evaluation: Evaluation): readonly SheetCell[] {
  const line = evaluation.lines.find((candidate) => candidate.key === key)
  const trituration = evaluation.weighingPlan?.lines.find((weighing) => weighing.key === key)?.trituration
  const start = [cell(line ? nameOf(line) : key), cell(massText(neededGrams, 5))]
  const blanks = [cell(''), cell(''), cell('')]
  if (plan) return [...start, ...dilution(plan), ...blanks]
  if (trituration) return [...start, ...mixing(trituration, evaluation), ...blanks]
  return [
    ...start,
    cell(''),
    cell('no two dilutions reach this mass: use a stock of known strength'),
    cell(''),
    ...blanks,
  ]
}

function dilution({ weighGrams, steps, budget, ...plan }: AliquotPlan): readonly SheetCell[] {
  const taken = steps.map(({ flaskMl, flaskName, drawMl, pipetteName }) => ({
    text: `to ${volumeText(flaskMl)}, draw ${volumeText(drawMl)}`,
    small: `${flaskName}; ${pipetteName}`,
  }))
  return [
    cell(
      massText(weighGrams, 7),
      `${numberText(plan.multiple, 6)} times; ${massText(plan.wastedGrams, 4)} left over`,
    ),
    cell(taken.map(({ text }) => text).join('; of that '), taken.map(({ small }) => small).join('; ')),
    cell(
      `${numberText(plan.errorPercent, 2)} %`,
      `weighing ${numberText(budget.weighingPercent, 2)} %, flasks ${numberText(budget.flasksPercent, 2)} %, draws ${numberText(budget.drawsPercent, 2)} %`,
    ),
  ]
}

function mixing({ steps, errorPercent, ...plan }: Trituration, evaluation: Evaluation): readonly SheetCell[] {
  const line = evaluation.lines.find(({ key }) => key === plan.diluentKey)
  const diluent = line ? nameOf(line) : plan.diluentKey
  const taken = steps.map(
    ({ diluentGrams, portionGrams }) =>
      `mix with ${massText(diluentGrams, 7)} of ${diluent}, take ${massText(portionGrams, 7)}`,
  )
  const carried = massText(plan.carriedGrams, 5)
  return [
    cell(massText(steps[0]?.weighGrams ?? null, 7)),
    cell(
      taken.join('; of that '),
      `${carried} of ${diluent} come with it: weigh that much less of ${diluent}`,
    ),
    cell(`${numberText(errorPercent, 2)} %`, `holds ${massText(plan.doseGrams, 5)}`),
  ]
}
