import type { Evaluation } from '../../evaluation/types.ts'
import type { Formula } from '../../formula/types.ts'
import type { Library } from '../../library/library.ts'
import type { PageStore } from './store.ts'

export type Evaluate = (formula: Formula, library: Library) => Evaluation

export interface Clock {
  now(): number
  nextFrame(run: () => void): void
}

/** Within one frame the answer is there before the keystroke is painted. */
const frameMs = 16

/**
 * Keeps the evaluation in step with the document: at once as long as that takes less than a frame, else once
 * for each frame. A result is taken only for the revision it was made from.
 */
export function keepEvaluated(store: PageStore, evaluate: Evaluate, clock: Clock): () => void {
  let lastMs = 0
  let waiting = false

  const run = () => {
    waiting = false
    const { formula, library, revision, drafts } = store.getState()
    if (Object.keys(drafts).length > 0) return
    const start = clock.now()
    const outcome = attempt(evaluate, formula, library)
    lastMs = clock.now() - start
    if (store.getState().revision !== revision) return
    store.setState({ ...outcome, evaluatedRevision: revision })
  }
  const request = () => {
    if (waiting) return
    if (lastMs < frameMs) run()
    else {
      waiting = true
      clock.nextFrame(run)
    }
  }
  request()
  return store.subscribe((state, before) => {
    if (state.revision !== before.revision) request()
  })
}

function attempt(
  evaluate: Evaluate,
  formula: Formula,
  library: Library,
): { readonly evaluation: Evaluation | null; readonly failure: string | null } {
  try {
    return { evaluation: evaluate(formula, library), failure: null }
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error)
    return { evaluation: null, failure: `The calculation broke and gives no number: ${reason}` }
  }
}
