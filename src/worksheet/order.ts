import { field, fields } from './sections.ts'
import { routeNames } from './routes.ts'
import { numberText, volumeText } from './say.ts'
import type { Evaluation } from '../evaluation/types.ts'
import type { SheetSection } from './types.ts'

/** What is ordered. */
export function orderSection(evaluation: Evaluation): SheetSection {
  const { formula } = evaluation
  return fields('The order', [
    field('Preparation', formula.title || null),
    field('Route', routeNames[formula.route]),
    field(
      'Final volume of one container',
      evaluation.volumeMl === null ? null : volumeText(evaluation.volumeMl),
    ),
    field('Batch', batchText(evaluation)),
    field('Vehicle', formula.vehicle ?? 'water for injection'),
    field('Target', targetText(evaluation)),
    field('Order number', formula.order?.orderNumber ?? null),
    field('Prepared for', formula.order?.preparedFor ?? null),
    field('Lot of this batch', formula.order?.lot ?? null),
    field('Master formulation record and version', formula.order?.masterRecord ?? null),
    field('Container and closure', formula.order?.container ?? null),
    field('Date and time of preparation', null),
  ])
}

function batchText({ formula, batchVolumeMl, volumeMl }: Evaluation): string | null {
  if (volumeMl === null || batchVolumeMl === null) return null
  const units = formula.batch?.units ?? 1
  const excess = formula.batch?.excess
  const containers = `${numberText(units, 4)} ${units === 1 ? 'container' : 'containers'} of ${volumeText(volumeMl)}`
  return `${containers}${excess ? ` and ${excess} extra` : ''} = ${volumeText(batchVolumeMl)}`
}

const targetNames = {
  osmolality: 'osmolality',
  'effective-osmolality': 'effective osmolality',
  'sodium-chloride-equivalent': 'sodium chloride equivalent',
  'freezing-point-depression': 'freezing-point depression',
} as const

const targetText = ({ formula: { target } }: Evaluation): string =>
  target ? `${targetNames[target.quantity]} ${target.value}` : 'none set'

/** What a record needs and only the bench can fill. */
export function recordSection(evaluation: Evaluation): SheetSection {
  return fields('Record of this batch', [
    field(
      'Balance (id, readability)',
      evaluation.formula.balance ? `____________ ${evaluation.formula.balance}` : null,
    ),
    field('pH meter (id, buffers used today)', null),
    field('Osmometer (id, reference reading)', null),
    field('Filter (pore size, lot, integrity limit and result)', null),
    field('Containers (type, lot)', null),
    field('Line clearance and cleaning', null),
    field('Yield: containers filled, rejected, samples', null),
    field('Deviations and what was done', null),
  ])
}
