import type { BatchParts } from '../evaluation/weighing/batchParts.ts'
import type { Evaluation } from '../evaluation/types.ts'
import { readTarget } from '../quantity/readMeasure.ts'
import { dosageForms, routeNames } from './routes.ts'
import { numberText, volumeText } from './say.ts'
import { field, fields, wide } from './sections.ts'
import { strengthsText } from './strength.ts'
import type { SheetField, SheetSection } from './types.ts'

export const vehicleOf = ({ formula, lines }: Evaluation): string =>
  lines.find(({ stock }) => stock?.fills)?.stock?.stock.name ?? formula.vehicle ?? 'water for injection'

/** What the preparation is, in either record. */
export function identityFields(evaluation: Evaluation): readonly SheetField[] {
  const { formula, volumeMl } = evaluation
  return [
    wide('Strength', strengthsText(evaluation)),
    field('Route', routeNames[formula.route]),
    field('Dosage form', dosageForms[formula.route]),
    field('One container holds', volumeMl === null ? null : volumeText(volumeMl)),
    field('Vehicle', vehicleOf(evaluation)),
    field('Container and closure', formula.order?.container ?? null),
    field('Target', targetText(evaluation)),
  ]
}

/** What is ordered, and for whom. */
export function orderSection(evaluation: Evaluation): SheetSection {
  const { order } = evaluation.formula
  return fields('The order', [
    field('Preparation', evaluation.formula.title || null),
    field('Prepared for', order?.preparedFor ?? null),
    ...identityFields(evaluation),
    field('Order number', order?.orderNumber ?? null),
    field('Lot of this batch', order?.lot ?? null),
    field('Master record and version', order?.masterRecord ?? null),
    field('Prepared, date and time', null),
    field('Beyond-use date and time', null),
    field('Storage', null),
    wide('Batch', batchText(evaluation)),
  ])
}

/** Each part of the batch printed; the extra apart. */
export function batchText({ weighingPlan, batchVolumeMl }: Evaluation): string | null {
  const parts = weighingPlan?.batch
  if (!parts || batchVolumeMl === null) return null
  const apart = parts.excessMl > 0 ? ` + ${volumeText(parts.excessMl)} extra for losses, apart` : ''
  return `${containersText(parts)}${part(parts.holdUpMl, 'hold-up of filter and tubing')}${part(
    parts.samplesMl,
    'samples for tests',
  )}${apart} = ${volumeText(batchVolumeMl)}. No overage of any ingredient.`
}

function containersText({ units, labelMl, overfillMl, overfillKind }: BatchParts): string {
  const containers = `${numberText(units, 6)} ${units === 1 ? 'container' : 'containers'}`
  if (overfillKind === null) return `${containers} of ${volumeText(labelMl)} (no excess volume asked)`
  return `${containers} of ${volumeText(labelMl)} + ${volumeText(overfillMl, 4)} excess each (USP <1151>, ${overfillKind} liquid)`
}

const part = (millilitres: number, words: string) =>
  millilitres > 0 ? ` + ${volumeText(millilitres)} ${words}` : ''

const targetNames = {
  osmolality: ['osmolality', 'mOsm/kg'],
  'effective-osmolality': ['effective osmolality', 'mOsm/kg'],
  'sodium-chloride-equivalent': ['sodium chloride equivalent', '% w/v'],
  'freezing-point-depression': ['freezing-point depression', 'K'],
} as const

export function targetText({ formula: { target } }: Evaluation): string {
  if (!target) return 'none set'
  const [name, unit] = targetNames[target.quantity]
  const read = readTarget(target.quantity, target.value)
  return read.ok ? `${name} ${numberText(read.value, 6)} ${unit}` : `${name}: cannot be read`
}
