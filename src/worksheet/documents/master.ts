import type { Evaluation } from '../../evaluation/types.ts'
import type { Library } from '../../library/library.ts'
import { attentionSection } from '../attention.ts'
import { amountsSection } from '../amounts.ts'
import { labelSection } from '../label.ts'
import { identityFields } from '../order.ts'
import { readingSection } from '../readings.ts'
import { masterBlanks } from '../record.ts'
import { electrolyteSection, resultSection } from '../results.ts'
import { field, fields, present } from '../sections.ts'
import { beyondUseSection, verificationSection } from '../standing.ts'
import { stepSection } from '../steps.ts'
import type { SheetSection } from '../types.ts'

/** The master formulation record: the recipe that batches are made by. */
export const masterRecord = (evaluation: Evaluation, library: Library): readonly SheetSection[] =>
  present(
    fields('The preparation', [
      { ...field('Name', evaluation.formula.title || null), wide: true },
      ...identityFields(evaluation),
    ]),
    amountsSection(evaluation),
    attentionSection(evaluation, library, 'full'),
    stepSection(evaluation, library, false),
    resultSection(evaluation, 'full'),
    readingSection(evaluation, library, 'expected'),
    electrolyteSection(evaluation),
    masterBlanks(evaluation),
    labelSection(evaluation),
    beyondUseSection(evaluation),
    verificationSection(evaluation),
  )
