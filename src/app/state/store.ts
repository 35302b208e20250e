import { createStore, type StoreApi } from 'zustand/vanilla'
import type { BufferOption } from '../../evaluation/buffers/compare.ts'
import type { Evaluation } from '../../evaluation/types.ts'
import type { Library } from '../../library/library.ts'
import type { Desk } from './history.ts'
import type { Origins } from '../shelf/origin.ts'
import type { ShelfDesk } from '../shelf/shelfDesk.ts'
import type { Autosave } from '../storage/autosave.ts'
import type { OwnActions } from '../own/actions.ts'
import { emptyOwn, type OwnContent } from '../storage/ownShelf.ts'
import { noCopy, type OfflineState } from '../offline/keepOffline.ts'
import type { ComparisonActions } from '../worker/comparison.ts'
import type { OutActions } from '../transfer/outActions.ts'
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

export interface ComparisonState {
  readonly kind: 'idle' | 'running' | 'done' | 'failed'
  readonly options: readonly BufferOption[]
  readonly total: number
  /** The revision that was compared. */
  readonly revision: number
}

export interface PageState extends Desk {
  readonly library: Library
  /** Where on the shelf the documents of this desk come from. */
  readonly origins: Origins
  /** Grows with every change of the document or of a draft. */
  readonly revision: number
  /** Text in fields of numbers that could not be read; it stays in sight and blocks. By field. */
  readonly drafts: Readonly<Record<string, string>>
  /** The cell in which a hand is at work; its refusal is held back until the hand has left. */
  readonly typing: string | null
  /** The calculating part arrives after the page; until then there is nothing to show, and that is said. */
  readonly calculation: 'coming' | 'here'
  readonly evaluation: Evaluation | null
  /** The revision the evaluation belongs to; any other one is out of date and not shown. */
  readonly evaluatedRevision: number
  /** Set when the evaluation itself broke: said, never hidden. */
  readonly failure: string | null
  readonly notice: string | null
  readonly keeping: Keeping
  readonly paper: Paper
  readonly sampling: SamplingState
  readonly comparison: ComparisonState
  readonly offline: OfflineState
  /** Ingredients and solutions of one's own. */
  readonly own: OwnContent
}

export type PageStore = StoreApi<PageState>

/** The state, what can be done to it, and the search over the library. */
export interface Page {
  readonly store: PageStore
  readonly actions: Actions &
    Pick<Autosave, 'keepThis' | 'takeOther'> &
    SamplingActions &
    OutActions &
    ComparisonActions &
    OwnActions
  readonly search: (text: string) => readonly Candidate[]
  readonly shelf: ShelfDesk
}

export const idleComparison: ComparisonState = { kind: 'idle', options: [], total: 0, revision: -1 }
export const idleSampling: SamplingState = { kind: 'idle', done: 0, total: 0, sentence: '' }

export function createPageStore(
  start: Pick<PageState, 'library' | 'formula' | 'drafts' | 'paper'> &
    Partial<Pick<PageState, 'origins' | 'calculation'>>,
): PageStore {
  return createStore<PageState>(() => ({
    origins: {},
    calculation: 'here',
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
    comparison: idleComparison,
    offline: noCopy,
    own: emptyOwn,
  }))
}

/** The evaluation, only while it belongs to what is on the screen and nothing unreadable stands in a field. */
export function currentEvaluation(state: PageState): Evaluation | null {
  const unreadable = Object.keys(state.drafts).length > 0
  return state.evaluatedRevision === state.revision && !unreadable ? state.evaluation : null
}
