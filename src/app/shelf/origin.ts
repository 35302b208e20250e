import { mostSteps, type Desk } from '../state/history.ts'

/** Where on the shelf the sheet on the desk comes from. */
export interface Origin {
  readonly id: string
  /** Stamp of the version that was the newest one then. */
  readonly version: string
}

/** By the step that put the document on the desk, so that undo and redo bring the right one back. */
export type Origins = Readonly<Record<string, Origin | null>>

interface OnDesk extends Pick<Desk, 'past'> {
  readonly origins: Origins
}

/** The document that was there when the page was opened. */
export const firstLineage = 'start'

const replaces = (intention: string) => intention.startsWith('replace ')

/** Names the document on the desk: the step in which a whole document was last put there. */
export const lineageOf = ({ past }: Pick<Desk, 'past'>): string =>
  past.findLast(({ intention }) => replaces(intention))?.intention ?? firstLineage

export const originOf = (state: OnDesk): Origin | null => state.origins[lineageOf(state)] ?? null

/** Steps beyond the longest past are forgotten; the document of a forgotten step is then the first one. */
export function originsAfter(state: OnDesk, before: OnDesk): Origins {
  const [forgotten] = before.past
  const isFull = before.past.length >= mostSteps && state.past.length >= mostSteps
  if (!isFull || !forgotten || state.past[0] === forgotten || !replaces(forgotten.intention))
    return state.origins
  return { ...state.origins, [firstLineage]: state.origins[forgotten.intention] ?? null }
}
