import { evaluate } from '../../evaluation/evaluate.ts'
import type { Evaluation } from '../../evaluation/types.ts'
import type { Formula } from '../../formula/types.ts'
import type { Library } from '../../library/library.ts'

export type EvaluatedOnce =
  | { readonly evaluation: Evaluation; readonly failure: null }
  | { readonly evaluation: null; readonly failure: string }

const known = new WeakMap<Library, WeakMap<Formula, EvaluatedOnce>>()

/** The evaluation of a formula that is not on the desk, made once; when it breaks that is said. */
export function evaluationOf(formula: Formula, library: Library): EvaluatedOnce {
  const ofLibrary = known.get(library) ?? new WeakMap<Formula, EvaluatedOnce>()
  known.set(library, ofLibrary)
  const before = ofLibrary.get(formula)
  if (before) return before
  const made = attempt(formula, library)
  ofLibrary.set(formula, made)
  return made
}

function attempt(formula: Formula, library: Library): EvaluatedOnce {
  try {
    return { evaluation: evaluate(formula, library), failure: null }
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error)
    return { evaluation: null, failure: `The calculation broke and gives no number: ${reason}` }
  }
}
