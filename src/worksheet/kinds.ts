import type { DocumentId } from './types.ts'

interface Kind {
  readonly name: string
  /** What it is for and what it is not. */
  readonly purpose: string
}

export const documentKinds: Readonly<Record<DocumentId, Kind>> = {
  batch: { name: 'Batch record', purpose: 'Compounding record of one batch: not a label, not a release' },
  checker: {
    name: 'Checker’s page',
    purpose: 'Recalculation by a second person, without the answers',
  },
  master: { name: 'Master record', purpose: 'Master formulation record: valid once approved' },
  label: { name: 'Label text', purpose: 'Text for the label: check against local and national rules' },
  figures: {
    name: 'How the figures were found',
    purpose: 'Appendix: arithmetic, methods, errors, sources and notes',
  },
}

/** What is printed unless something else is asked for. */
export const usualDocuments: readonly DocumentId[] = ['batch', 'checker']
