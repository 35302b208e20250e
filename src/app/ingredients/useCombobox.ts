import { useState, type KeyboardEvent } from 'react'

interface Options<T> {
  readonly find: (text: string) => readonly T[]
  /** Enter on the highlighted candidate, or a click. */
  readonly onChoose: (candidate: T) => void
  /** What the arrow down offers in an empty cell. */
  readonly recent?: (() => readonly T[]) | undefined
}

/**
 * The typing state of one search cell. Closed: the cell shows what is chosen and its keys belong to the table.
 * Open: arrows walk the candidates, Enter takes the highlighted one, Escape drops the text.
 */
export function useCombobox<T>({ find, onChoose, recent }: Options<T>) {
  const [typed, setTyped] = useState<string | null>(null)
  const [active, setActive] = useState(0)
  const offered = (text: string) => (text.trim() === '' ? (recent?.() ?? []) : find(text))
  const candidates = typed === null ? [] : offered(typed)
  const open = candidates.length > 0

  const close = () => {
    setTyped(null)
    setActive(0)
  }
  const choose = (candidate: T) => {
    close()
    onChoose(candidate)
  }
  /** True when the key was used here. */
  const onKey = (event: KeyboardEvent): boolean => {
    if (event.altKey || event.ctrlKey || event.metaKey) return false
    if (event.key === 'Escape' && typed !== null) {
      close()
      return true
    }
    if (!open && typed === null && event.key === 'ArrowDown' && recent && recent().length > 0) {
      setTyped('')
      return true
    }
    if (!open) return false
    if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      const by = event.key === 'ArrowDown' ? 1 : candidates.length - 1
      setActive((active + by) % candidates.length)
      return true
    }
    const chosen = candidates[active]
    if (event.key === 'Enter' && chosen) {
      choose(chosen)
      return true
    }
    return false
  }
  const type = (text: string) => {
    setTyped(text)
    setActive(0)
  }
  return { typed, candidates, active, open, type, close, choose, onKey }
}
