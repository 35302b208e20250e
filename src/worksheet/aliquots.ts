import { massText, numberText, volumeText } from './say.ts'
import { nameOf } from './weighings.ts'
import type { Evaluation } from '../evaluation/types.ts'
import type { SheetSection } from './types.ts'

/** How the masses below the least weighable one are measured by dilution. */
export function aliquotSection(evaluation: Evaluation): SheetSection | null {
  if (evaluation.aliquots.length === 0) return null
  return {
    kind: 'table',
    heading: 'By aliquot: masses below the least that the balance weighs within 0.1 %',
    columns: [
      { label: 'Ingredient', align: 'start' },
      { label: 'Needed', align: 'end' },
      { label: 'Weigh', align: 'end' },
      { label: 'Bring to volume and draw', align: 'start' },
      { label: 'Error of the dose', align: 'end' },
      { label: 'Done', align: 'start', blank: true },
      { label: 'Checked', align: 'start', blank: true },
    ],
    rows: evaluation.aliquots.flatMap(({ key, neededGrams, plan }) => {
      const line = evaluation.lines.find((candidate) => candidate.key === key)
      if (!line) return []
      const steps = plan
        ? plan.steps
            .map(({ flaskMl, drawMl }) => `to ${volumeText(flaskMl)}, draw ${volumeText(drawMl)}`)
            .join('; then ')
        : 'no two dilutions reach this mass: use a stock of known strength'
      return [
        [
          { text: nameOf(line) },
          { text: massText(neededGrams, 5) },
          { text: plan ? massText(plan.weighGrams, 5) : '' },
          { text: steps },
          { text: plan ? `${numberText(plan.errorPercent, 2)} %` : '' },
          { text: '' },
          { text: '' },
        ],
      ]
    }),
    note: 'The diluent drawn with each aliquot is part of the final volume. It must be the vehicle, and the substance must dissolve in it at that strength.',
  }
}
