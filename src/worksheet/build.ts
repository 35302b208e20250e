import type { Evaluation } from '../evaluation/types.ts'
import type { Library } from '../library/library.ts'
import { shutReasons } from './attention.ts'
import { batchRecord } from './documents/batch.ts'
import { checkersPage } from './documents/checker.ts'
import { howTheFiguresWereFound } from './documents/figures.ts'
import { masterRecord } from './documents/master.ts'
import { documentKinds, usualDocuments } from './kinds.ts'
import { labelSection } from './label.ts'
import { verificationSection } from './standing.ts'
import type { DocumentId, Paper, SheetSection, Worksheet } from './types.ts'

type SectionMaker = (evaluation: Evaluation, library: Library) => readonly SheetSection[]

const makers: Readonly<Record<DocumentId, SectionMaker>> = {
  batch: batchRecord,
  checker: checkersPage,
  master: masterRecord,
  label: (evaluation) => [labelSection(evaluation), verificationSection(evaluation)],
  figures: howTheFiguresWereFound,
}

/** So that the foot of a page holds the mark. */
const longestMark = 60

/**
 * The finished documents of one evaluation: every string made once, nothing calculated again. Preview and paper show
 * exactly these.
 */
export function buildWorksheet(
  evaluation: Evaluation,
  library: Library,
  paper: Paper,
  wanted: readonly DocumentId[] = usualDocuments,
): Worksheet {
  const { formula } = evaluation
  const title = formula.title || 'Untitled formula'
  const version = formula.order?.masterRecord ?? '________'
  const batch = `batch ${formula.order?.lot ?? '____________'}; `
  const shortTitle = title.length > longestMark ? `${title.slice(0, longestMark)}…` : title
  return {
    title,
    paper,
    shutBecause: shutReasons(evaluation, library),
    documents: wanted.map((id) => {
      const { name, purpose } = documentKinds[id]
      return {
        id,
        name,
        purpose,
        pageMark: `${name}: ${shortTitle}; ${id === 'master' ? '' : batch}master record ${version}; library ${evaluation.libraryVersion}`,
        sections: makers[id](evaluation, library),
      }
    }),
  }
}
