import { fields, field, text } from './sections.ts'
import type { Evaluation } from '../evaluation/types.ts'
import type { SheetSection } from './types.ts'

/** The date is never set here. */
export const beyondUseSection = (): SheetSection =>
  fields('Beyond-use date and storage', [
    field('Beyond-use date (set by local policy and stability evidence, never by this sheet)', null),
    field('Storage', null),
    field('Reference that supports it', null),
  ])

export const signOffSection = (): SheetSection => ({
  kind: 'table',
  heading: 'Checks and signatures',
  columns: [
    { label: 'Check', align: 'start' },
    { label: 'Done by', align: 'start', blank: true },
    { label: 'Checked by', align: 'start', blank: true },
    { label: 'Date and time', align: 'start', blank: true },
  ],
  rows: [
    'Order: patient, route, dose, allergies',
    'Calculation repeated by a second person without reading the first',
    'Identity, form and lot of each ingredient, read from the container',
    'Each weighing and volume, before mixing',
    'pH and osmolality within the limits',
    'Labels printed, used, destroyed',
    'Release, by someone who did not prepare it',
  ].map((check) => [{ text: check }, { text: '' }, { text: '' }, { text: '' }]),
})

/** What the figures are and are not. */
export const verificationSection = (evaluation: Evaluation): SheetSection =>
  text('Standing of these figures', [
    'Every result on this sheet needs independent verification before use. Cautions defer to local policy, the product label and licensed practice.',
    `Figures marked from memory were recalled and not read again; verify them. Library ${evaluation.libraryVersion}.`,
  ])
