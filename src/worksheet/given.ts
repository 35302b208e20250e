import type { Evaluation, LineAnswer } from '../evaluation/types.ts'
import { stepText } from './bench.ts'
import { identity, nameOf } from './names.ts'
import { targetText, vehicleOf } from './order.ts'
import { routeNames } from './routes.ts'
import { numberText, volumeText } from './say.ts'
import { cell, field, figures, names, words } from './sections.ts'
import { orderedText } from './strength.ts'
import type { SheetField, SheetSection } from './types.ts'

/* What the checker starts from. Nothing that was worked out may stand here. */

export function givenFields(evaluation: Evaluation): readonly SheetField[] {
  const { formula, volumeMl, weighingPlan } = evaluation
  const parts = weighingPlan?.batch
  return [
    field('Preparation', formula.title || null),
    field('Route', routeNames[formula.route]),
    field('One container holds', volumeMl === null ? null : volumeText(volumeMl)),
    field('Vehicle', vehicleOf(evaluation)),
    field('Target', targetText(evaluation)),
    field('pH', formula.pH === undefined ? 'not given' : numberText(formula.pH, 4)),
    field('Containers', parts ? numberText(parts.units, 6) : null),
    field('Excess volume of each', parts ? volumeText(parts.overfillMl, 4) : null),
    field('Hold-up of filter and tubing', parts ? volumeText(parts.holdUpMl) : null),
    field('Samples for tests', parts ? volumeText(parts.samplesMl) : null),
    field('Extra for losses', parts ? volumeText(parts.excessMl) : null),
    field('Balances', scalesText(evaluation)),
  ]
}

function scalesText({ weighingPlan }: Evaluation): string {
  const steps = new Set(
    weighingPlan?.lines.flatMap(({ scale }) => (scale ? [stepText(scale.readabilityG)] : [])),
  )
  return steps.size === 0 ? 'none named' : `reading to ${[...steps].join(' and ')}`
}

/** Ingredients with the constants that the hand calculation needs. */
export const givenSection = (evaluation: Evaluation): SheetSection => ({
  kind: 'table',
  heading: 'Ingredients and constants',
  columns: [names('Ingredient'), words('Ordered'), figures('g NaCl per g'), figures('Content or density')],
  rows: evaluation.lines.map((line) => [
    cell(nameOf(line), identity(line)),
    cell(orderedText(line)),
    cell(...equivalentText(line, evaluation)),
    cell(contentText(line)),
  ]),
})

/** The equivalent that the sum took, with its table concentration. */
function equivalentText(line: LineAnswer, { methods }: Evaluation): [string, string?] {
  const method = methods.find(({ method: id }) => id === 'sodium-chloride-equivalent')
  const step = method?.trace.find(({ key }) => key === line.key)
  const input = step?.inputs.find(({ name }) => name.startsWith('E'))
  if (!input) return ['not known']
  const at = /\(at (.+) %\)/.exec(input.name)?.[1]
  const remark = [at ? `at ${at} %` : '', input.fromMemory ? 'from memory' : ''].filter(Boolean).join(', ')
  return remark === '' ? [numberText(input.value, 4)] : [numberText(input.value, 4), remark]
}

function contentText({ ingredient: { article, density } }: LineAnswer): string {
  if (article)
    return `${numberText(article.massFraction.value * 100, 4)} % w/w, ${numberText(article.density.value, 4)} g per mL`
  return density ? `${numberText(density.value, 4)} g per mL` : ''
}
