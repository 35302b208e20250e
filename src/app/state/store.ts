import { createStore, type StoreApi } from 'zustand/vanilla'
import type { Evaluation } from '../../evaluation/types.ts'
import type { Library } from '../../library/library.ts'
import type { Desk } from './history.ts'
import type { Autosave } from '../storage/autosave.ts'
import type { SamplingActions } from '../worker/sampler.ts'
import type { Actions } from './actions.ts'
import type { Candidate } from './search.ts'

export type Paper = 'A4' | 'Letter'

/** Whether this sheet outlives the page. */
export type Keeping =
  | { readonly kind: 'kept' }
  | { readonly kind: 'refused'; readonly sentence: string }
  | { readonly kind: 'elsewhere'; readonly freed: boolean }

export interface SamplingState {
  readonly kind: 'idle' | 'running' | 'done' | 'failed'
  readonly done: number
  readonly total: number
  readonly sentence: string
}

export interface PageState extends Desk {
  readonly library: Library
  /** Grows with every change of the document or of a draft. */
  readonly revision: number
  /** Text in fields of numbers that could not be read; it stays in sight and blocks. By field. */
  readonly drafts: Readonly<Record<string, string>>
  /** The cell in which a hand is at work; its refusal is held back until the hand has left. */
  readonly typing: string | null
  readonly evaluation: Evaluation | null
  /** The revision the evaluation belongs to; any other one is out of date and not shown. */
  readonly evaluatedRevision: number
  /** Set when the evaluation itself broke: said, never hidden. */
  readonly failure: string | null
  readonly notice: string | null
  readonly keeping: Keeping
  readonly paper: Paper
  readonly sampling: SamplingState
}

export type PageStore = StoreApi<PageState>

/** The state, what can be done to it, and the search over the library. */
export interface Page {
  readonly store: PageStore
  readonly actions: Actions & Pick<Autosave, 'keepThis' | 'takeOther'> & SamplingActions
  readonly search: (text: string) => readonly Candidate[]
}

export const idleSampling: SamplingState = { kind: 'idle', done: 0, total: 0, sentence: '' }

export function createPageStore(
  start: Pick<PageState, 'library' | 'formula' | 'drafts' | 'paper'>,
): PageStore {
  return createStore<PageState>(() => ({
    ...start,
    past: [],
    future: [],
    revision: 0,
    typing: null,
    evaluation: null,
    evaluatedRevision: -1,
    failure: null,
    notice: null,
    keeping: { kind: 'kept' },
    sampling: idleSampling,
  }))
}

/** The evaluation, only while it belongs to what is on the screen and nothing unreadable stands in a field. */
export function currentEvaluation(state: PageState): Evaluation | null {
  const unreadable = Object.keys(state.drafts).length > 0
  return state.evaluatedRevision === state.revision && !unreadable ? state.evaluation : null
}
