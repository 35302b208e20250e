import { useEffect } from 'react'
import { usePageActions } from '../state/context.tsx'

/** Ctrl/⌘+Z, Shift+Z and Y work on the sheet from wherever the hand is, in place of the field's own undo. */
export function useUndoKeys(): void {
  const actions = usePageActions()
  useEffect(() => {
    const keys = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey) return
      const key = event.key.toLowerCase()
      if (key === 'z' && !event.shiftKey) actions.undo()
      else if (key === 'z' || (key === 'y' && !event.shiftKey)) actions.redo()
      else return
      event.preventDefault()
    }
    document.addEventListener('keydown', keys)
    return () => document.removeEventListener('keydown', keys)
  }, [actions])
}
