import type { Evaluation, LineAnswer } from '../evaluation/types.ts'
import { identity, nameOf } from './names.ts'
import { massText, volumeText } from './say.ts'
import { cell, figures, names, words } from './sections.ts'
import { orderedText } from './strength.ts'
import type { SheetCell, SheetSection } from './types.ts'

/** Every ingredient with its amount in one container and per mL, unrounded: the recipe. */
export function amountsSection(evaluation: Evaluation): SheetSection {
  const { volumeMl, formula } = evaluation
  const hasVehicle = evaluation.lines.some(({ ingredient }) => ingredient.roles[0] === 'vehicle')
  const vehicle = [
    cell(formula.vehicle ?? 'water for injection', 'vehicle'),
    cell('q.s.'),
    cell(volumeMl === null ? '' : `to ${volumeText(volumeMl)}`),
    cell(''),
    cell(''),
  ]
  return {
    kind: 'table',
    heading: volumeMl === null ? 'Ingredients' : `Ingredients of ${volumeText(volumeMl)}`,
    columns: [
      names('Ingredient'),
      words('Ordered'),
      figures('In one container'),
      figures('Per mL'),
      words('Purpose'),
    ],
    rows: [...evaluation.lines.map((line) => row(line, volumeMl)), ...(hasVehicle ? [] : [vehicle])],
    note: 'Amounts before any rounding to a balance, of the form and hydrate named. Acid or base for the pH, gas or filter aid: only where a line names it.',
  }
}

function row(line: LineAnswer, volumeMl: number | null): readonly SheetCell[] {
  const { ingredient, gramsExact, millilitres, stock } = line
  const perMl = gramsExact === null || volumeMl === null ? null : gramsExact / volumeMl
  const form = [identity(line), ingredient.state].filter((part) => part !== undefined).join(', ')
  const whole = millilitres === null || stock ? massText(gramsExact, 5) : volumeText(millilitres, 5)
  return [
    cell(nameOf(line), form),
    cell(orderedText(line)),
    cell(gramsExact === null ? '' : whole),
    cell(perMl === null ? '' : massText(perMl, 4)),
    cell(ingredient.roles.join(', ')),
  ]
}
