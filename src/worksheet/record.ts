import type { Evaluation } from '../evaluation/types.ts'
import { sterileRoutes } from './routes.ts'
import { numberText } from './say.ts'
import { blankWith, box, field, fields, words } from './sections.ts'
import type { SheetSection } from './types.ts'

const isSterile = ({ formula }: Evaluation) => sterileRoutes.has(formula.route)

const notSterile = 'not sterile by its route: none planned; local policy decides'

/** What a record needs and only the bench can fill. */
export function recordSection(evaluation: Evaluation): SheetSection {
  const units = evaluation.weighingPlan?.batch?.units
  return fields('Record of this batch', [
    field('Balances (id, checked)', null),
    field('pH meter (id, buffers)', null),
    field('Osmometer (id, reference)', null),
    field('Other equipment, supplies', null),
    field('Filter (pore, lot) or cycle', isSterile(evaluation) ? null : notSterile),
    isSterile(evaluation)
      ? blankWith('Bubble point', 'at or above ____ by the maker')
      : field('Endotoxin and bioburden', 'not asked by this route; local policy decides'),
    ...(isSterile(evaluation) ? [field('Endotoxin, if made unsterile', null)] : []),
    field('Room, hood, garb, logs', null),
    field('Line clearance, cleaning', null),
    field('Container, closure lots', null),
    field('Quantity made, density', null),
    units === undefined
      ? field('Filled, rejected, yield %', null)
      : blankWith('Filled, rejected, yield %', `of ${numberText(units, 6)} asked`),
    field('Labels made, used, void', null),
    field('Supplied to (recall trace)', null),
    field('Record kept until', null),
    { ...field('Deviations, signed', null), wide: true },
  ])
}

export const signOffSection = (): SheetSection => ({
  kind: 'table',
  heading: 'Checks and signatures (names in print, initials)',
  columns: [words('Check'), box('Done by', 'some'), box('Checked by', 'some'), box('Date and time', 'some')],
  rows: [
    'Order: patient, route, dose, allergies',
    'Calculation repeated by a second person without reading the first',
    'Name, form, lot and expiry of each ingredient, read from the container',
    'Each weighing and volume, before mixing',
    'Readings within the limits; each unit looked at',
    'Warnings read',
    'Release, by someone who did not prepare it',
  ].map((check) => [{ text: check }, { text: '' }, { text: '' }, { text: '' }]),
})

/** What a master record states and this formula does not hold: blanks, and reasons where there is none. */
export function masterBlanks(evaluation: Evaluation): SheetSection {
  const sterile = isSterile(evaluation)
  return fields('To be stated by whoever approves this record', [
    field('Record number and version', evaluation.formula.order?.masterRecord ?? null),
    field('Approved by, date', null),
    field('Beyond-use date and storage', null),
    field('Reference for stability', null),
    field('Appearance: colour, clarity, viscosity', null),
    field('Grades, particle size, solubility to watch', null),
    field('Equipment and supplies', null),
    field('Sterilisation method and parameters', sterile ? null : notSterile),
    field(
      'Endotoxin and bioburden, if a start is unsterile',
      sterile ? null : 'not asked by this route; local policy decides',
    ),
    field('Risk assessment and added value (reference)', null),
    field('Packaging and label requirements', null),
    field('Retention period of the records', null),
    {
      label: 'Not in this record, because it belongs to one batch',
      value:
        'makers, lots and expiry, assay factors, measured amounts, results, date and time, people, total made, yield, deviations, line clearance, environment, release, recipients: in the record of the batch',
      wide: true,
    },
  ])
}
