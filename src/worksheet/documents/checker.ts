import type { Evaluation } from '../../evaluation/types.ts'
import { givenSection, givenFields } from '../given.ts'
import { questionSection } from '../checks.ts'
import { fields, text } from '../sections.ts'
import type { SheetSection } from '../types.ts'

/** For a second person: what was given, and nothing of what came out. */
export const checkersPage = (evaluation: Evaluation): readonly SheetSection[] => [
  fields('Given', givenFields(evaluation)),
  givenSection(evaluation),
  questionSection(evaluation),
  text('How to check', [
    'Work from the order and this page alone, by hand or by another tool. Then compare with the answers in the record of the batch and sign there. A page that was filled in by reading the answers checks nothing.',
  ]),
  fields('Checked', [
    { label: 'Name in print, initials', value: null },
    { label: 'Date and time', value: null },
  ]),
]
