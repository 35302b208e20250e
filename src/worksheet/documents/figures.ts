import type { Evaluation } from '../../evaluation/types.ts'
import type { Library } from '../../library/library.ts'
import { arithmeticSections } from '../arithmetic.ts'
import { noteSection, sourceSection } from '../attention.ts'
import { errorSection } from '../errors.ts'
import { methodSection } from '../methods.ts'
import { contributionSection } from '../results.ts'
import { present } from '../sections.ts'
import { verificationSection } from '../standing.ts'
import type { SheetSection } from '../types.ts'

/** The appendix: where every figure comes from, so that it can be found again by hand. */
export const howTheFiguresWereFound = (evaluation: Evaluation, library: Library): readonly SheetSection[] => [
  ...present(
    contributionSection(evaluation),
    methodSection(evaluation),
    errorSection(evaluation),
    sourceSection(evaluation, library),
    noteSection(evaluation, library),
  ),
  ...arithmeticSections(evaluation),
  verificationSection(evaluation),
]
