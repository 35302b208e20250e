import { aliquotSection } from './aliquots.ts'
import { arithmeticSections } from './arithmetic.ts'
import { attentionSection, noteSection, shutReasons } from './attention.ts'
import { methodSection } from './methods.ts'
import { orderSection, recordSection } from './order.ts'
import { contributionSection, electrolyteSection, readingSection, resultSection } from './results.ts'
import { volumeText } from './say.ts'
import { beyondUseSection, signOffSection, verificationSection } from './standing.ts'
import { mixingSteps } from './steps.ts'
import { nameOf, weighingTable } from './weighings.ts'
import { sterileRoutes } from './routes.ts'
import type { Library } from '../library/library.ts'
import type { Evaluation } from '../evaluation/types.ts'
import type { Paper, SheetSection, Worksheet } from './types.ts'

/**
 * The finished sheet of one evaluation: every string made once, nothing calculated again. Preview and paper show
 * exactly this.
 */
export function buildWorksheet(evaluation: Evaluation, library: Library, paper: Paper): Worksheet {
  const { formula } = evaluation
  const lot = formula.order?.lot
  return {
    title: formula.title || 'Untitled formula',
    pageMark: `${formula.title || 'Untitled formula'}; lot ${lot ?? '____________'}; library ${evaluation.libraryVersion}`,
    paper,
    shutBecause: shutReasons(evaluation, library),
    sections: sectionsOf(evaluation, library),
  }
}

function sectionsOf(evaluation: Evaluation, library: Library): readonly SheetSection[] {
  const optional = [
    methodSection(evaluation),
    contributionSection(evaluation),
    electrolyteSection(evaluation),
  ].filter((section) => section !== null)
  const notes = noteSection(evaluation, library)
  const aliquots = aliquotSection(evaluation)
  return [
    orderSection(evaluation),
    attentionSection(evaluation, library),
    weighingTable(evaluation),
    ...(aliquots ? [aliquots] : []),
    stepSection(evaluation, library),
    resultSection(evaluation),
    readingSection(evaluation),
    ...optional,
    recordSection(evaluation),
    beyondUseSection(),
    signOffSection(),
    ...(notes ? [notes] : []),
    ...arithmeticSections(evaluation),
    verificationSection(evaluation),
  ]
}

function stepSection(evaluation: Evaluation, library: Library): SheetSection {
  const volume = evaluation.batchVolumeMl ?? evaluation.volumeMl
  return {
    kind: 'steps',
    heading: 'Steps',
    steps: mixingSteps(library.steps, {
      lines: evaluation.lines,
      vehicle: evaluation.formula.vehicle ?? 'water for injection',
      volume: volume === null ? 'the final volume' : volumeText(volume),
      sterile: sterileRoutes.has(evaluation.formula.route),
      nameOf,
    }),
  }
}
