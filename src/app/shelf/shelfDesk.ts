import { createStore, type StoreApi } from 'zustand/vanilla'
import type { KeptFormula } from '../storage/formulas.ts'
import type { ShelfActions } from './actions.ts'
import type { ShelfStep } from './steps.ts'

export type ShelfStatus =
  | { readonly kind: 'unread' }
  | { readonly kind: 'ready' }
  | { readonly kind: 'refused'; readonly sentence: string }

/** A file that did not come in, and why. */
export interface NotImported {
  readonly name: string
  readonly reason: string
}

export interface ImportState {
  readonly kind: 'running' | 'done' | 'cancelled'
  readonly done: number
  readonly total: number
  readonly imported: number
  readonly refused: readonly NotImported[]
}

/** The sheet on the desk among the columns side by side; every other one goes by its id. */
export const deskColumn = 'desk'
export const mostColumns = 4

export interface ShelfState {
  readonly open: boolean
  readonly status: ShelfStatus
  readonly formulas: readonly KeptFormula[]
  readonly unreadable: number
  /** False where the browser may clear what is kept. */
  readonly lasting: boolean
  /** What was done last, in a sentence. */
  readonly said: string
  /** The formula that another window changed since it was put on this desk. */
  readonly conflict: string | null
  readonly past: readonly ShelfStep[]
  readonly future: readonly ShelfStep[]
  /** What stands side by side, from left to right. */
  readonly columns: readonly string[]
  readonly importing: ImportState | null
}

export type ShelfStore = StoreApi<ShelfState>

export interface ShelfDesk {
  readonly store: ShelfStore
  readonly actions: ShelfActions
}

export const createShelfStore = (): ShelfStore =>
  createStore<ShelfState>(() => ({
    open: false,
    status: { kind: 'unread' },
    formulas: [],
    unreadable: 0,
    lasting: true,
    said: '',
    conflict: null,
    past: [],
    future: [],
    columns: [deskColumn],
    importing: null,
  }))

export const formulaById = ({ formulas }: Pick<ShelfState, 'formulas'>, id: string) =>
  formulas.find((formula) => formula.id === id)
