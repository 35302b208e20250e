import type { Library } from '../../library/library.ts'
import { keepEvaluated, type Clock, type Evaluate } from '../state/evaluateNow.ts'
import type { PageStore } from '../state/store.ts'

export interface Calculation {
  readonly evaluate: Evaluate
  readonly loadLibrary: () => Library
}

/**
 * Brings the calculating part to a page that can be typed into already. From then on every change is evaluated,
 * what was typed meanwhile first of all. If it cannot be had the page says so and gives no number.
 */
export async function bringCalculation(
  store: PageStore,
  clock: Clock,
  load: () => Promise<Calculation>,
): Promise<void> {
  try {
    const { evaluate, loadLibrary } = await load()
    store.setState({ library: loadLibrary(), calculation: 'here' })
    keepEvaluated(store, evaluate, clock)
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error)
    store.setState({
      failure: `The calculating part could not be loaded, so there are no numbers (${reason}). What is written stays here; reload the page to try again.`,
    })
  }
}
