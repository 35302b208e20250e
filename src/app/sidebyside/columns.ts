import type { Evaluation } from '../../evaluation/types.ts'
import type { Formula } from '../../formula/types.ts'
import type { Library } from '../../library/library.ts'
import { tellFinding } from '../../worksheet/tell.ts'
import { evaluationOf } from '../state/evaluationOf.ts'

/** A formula among those compared. */
export interface Column {
  readonly id: string
  /** A, B, C, D: how the axis and the marks refer to it. */
  readonly letter: string
  readonly name: string
  readonly formula: Formula
  /** Null while there are no numbers. */
  readonly evaluation: Evaluation | null
  /** Why there are no numbers; null when there are. */
  readonly blocked: string | null
}

export interface Chosen {
  readonly id: string
  readonly name: string
  readonly formula: Formula
  /** For the sheet on the desk, whose fields may hold text that cannot be read. */
  readonly unreadable: boolean
}

const letters = ['A', 'B', 'C', 'D']

export function columnsOf(chosen: readonly Chosen[], library: Library): readonly Column[] {
  return chosen.map(({ id, name, formula, unreadable }, index) => {
    const { evaluation, failure } = evaluationOf(formula, library)
    const isShown = evaluation?.status === 'ok' && !unreadable
    return {
      id,
      name,
      formula,
      letter: letters[index] ?? String(index + 1),
      evaluation: isShown ? evaluation : null,
      blocked: isShown ? null : blockedSentence(evaluation, failure, unreadable, library),
    }
  })
}

function blockedSentence(
  evaluation: Evaluation | null,
  failure: string | null,
  unreadable: boolean,
  library: Library,
): string {
  if (failure !== null) return failure
  if (unreadable) return 'No numbers: a field of the sheet cannot be read.'
  const first = evaluation?.findings.find(({ blocks }) => blocks)
  return `No numbers: ${first ? tellFinding(first, library).message : 'it is blocked.'}`
}
