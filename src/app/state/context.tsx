import { createContext, useContext, type ReactNode } from 'react'
import { useStore } from 'zustand'
import type { Candidate } from './search.ts'
import type { ShelfActions } from '../shelf/actions.ts'
import type { ShelfState } from '../shelf/shelfDesk.ts'
import type { Page, PageState } from './store.ts'

const PageContext = createContext<Page | null>(null)

export function PageProvider({ page, children }: { readonly page: Page; readonly children: ReactNode }) {
  return <PageContext.Provider value={page}>{children}</PageContext.Provider>
}

function useOwnPage(): Page {
  const page = useContext(PageContext)
  if (!page) throw new Error('A part of the page was drawn outside the page.')
  return page
}

/** A piece of the state; the selector must answer the same object for the same state. */
export const usePage = <T,>(select: (state: PageState) => T): T => useStore(useOwnPage().store, select)

export const usePageActions = (): Page['actions'] => useOwnPage().actions

/** Finds library ingredients by what is typed. */
export const useSearch = (): ((text: string) => readonly Candidate[]) => useOwnPage().search

/** A piece of what is known of the shelf. */
export const useShelf = <T,>(select: (state: ShelfState) => T): T =>
  useStore(useOwnPage().shelf.store, select)

export const useShelfActions = (): ShelfActions => useOwnPage().shelf.actions
