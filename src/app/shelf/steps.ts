import type { Exchange, KeptFormula } from '../storage/formulas.ts'
import type { Origin } from './origin.ts'

/** One thing done to the shelf with one intention, and what takes it back. */
export interface ShelfStep {
  /** What was done, in a sentence. */
  readonly sentence: string
  readonly exchanges: readonly Exchange[]
  /** Where the sheet on the desk came from before and after. */
  readonly origin?: {
    readonly lineage: string
    readonly before: Origin | null
    readonly after: Origin | null
  }
}

export const reversed = (exchanges: readonly Exchange[]): readonly Exchange[] =>
  exchanges.map(({ before, after }) => ({ before: after, after: before }))

/** The shelf with the exchanges done, in no order of its own. */
export function exchanged(
  formulas: readonly KeptFormula[],
  exchanges: readonly Exchange[],
): readonly KeptFormula[] {
  const touched = new Set(exchanges.map(({ before, after }) => (after ?? before)?.id))
  return [
    ...formulas.filter(({ id }) => !touched.has(id)),
    ...exchanges.flatMap(({ after }) => (after ? [after] : [])),
  ]
}
