import { useDeferredValue, useMemo } from 'react'
import { usePage, useShelf } from '../state/context.tsx'
import { standingOf, type Standing } from './standing.ts'

/** How the sheet on the desk stands to the shelf; a moment behind the hand that types. */
export function useStanding(): Standing {
  const page = useDeferredValue(usePage((state) => state))
  const formulas = useShelf((state) => state.formulas)
  return useMemo(() => standingOf(page, formulas), [page, formulas])
}
