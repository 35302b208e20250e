import { useLayoutEffect, useRef, type FocusEvent, type KeyboardEvent, type RefObject } from 'react'
import { usePage, usePageActions } from '../state/context.tsx'
import { wishOf, type Column, type GridWish } from './gridKeys.ts'

interface Place {
  readonly row: number
  readonly column: Column
}

function placeOf(target: EventTarget): Place | null {
  if (!(target instanceof HTMLElement)) return null
  const { row, column } = target.dataset
  if (row === undefined || (column !== 'ingredient' && column !== 'amount' && column !== 'remove'))
    return null
  return { row: Number(row), column }
}

function focusPlace(table: HTMLTableElement, { row, column }: Place): boolean {
  const cell = table.querySelector<HTMLElement>(`[data-row="${row}"][data-column="${column}"]`)
  cell?.focus()
  return cell !== null
}

/** Focus that must wait until the table has been drawn again. */
function useLaterFocus(table: RefObject<HTMLTableElement | null>) {
  const wanted = useRef<Place | null>(null)
  useLayoutEffect(() => {
    if (wanted.current && table.current && focusPlace(table.current, wanted.current)) wanted.current = null
  })
  return (place: Place) => {
    if (!table.current || !focusPlace(table.current, place)) wanted.current = place
  }
}

/** Walking and working the table with the keyboard. */
export function useGrid(table: RefObject<HTMLTableElement | null>, lineCount: number) {
  const actions = usePageActions()
  const keys = usePage((state) => state.formula.lines).map((line) => line.key)
  const editing = useRef(false)
  const later = useLaterFocus(table)

  const afterChange = (place: Place) => requestAnimationFrame(() => later(place))
  const removeLine = (row: number, key: string) => {
    actions.removeLine(key)
    afterChange({ row, column: row < lineCount - 1 ? 'amount' : 'ingredient' })
  }
  const carryOut = (wish: GridWish, place: Place, target: HTMLElement) => {
    const key = keys[place.row]
    if (wish.kind === 'go') later(wish)
    else if (wish.kind === 'edit-text') putCaret(target)
    else if (wish.kind === 'restore') {
      actions.restoreCell()
      requestAnimationFrame(() => target instanceof HTMLInputElement && target.select())
    } else if (key !== undefined && wish.kind === 'move-line') {
      actions.moveLine(key, wish.by)
      afterChange({ ...place, row: Math.min(Math.max(place.row + wish.by, 0), lineCount - 1) })
    } else if (key !== undefined) removeLine(place.row, key)
    editing.current = wish.kind === 'edit-text'
  }
  const onKeyDown = (event: KeyboardEvent) => {
    const place = placeOf(event.target)
    if (!place || !(event.target instanceof HTMLElement)) return
    if (event.altKey && event.key === 'Enter') {
      event.preventDefault()
      table.current?.querySelector<HTMLElement>(`[data-more="${place.row}"]`)?.click()
      return
    }
    const wish = wishOf(event, { ...place, lastRow: lineCount, editing: editing.current })
    if (!wish) return
    event.preventDefault()
    carryOut(wish, place, event.target)
  }
  const onFocus = (event: FocusEvent) => {
    editing.current = false
    if (event.target instanceof HTMLInputElement) event.target.select()
  }
  const onInput = () => {
    editing.current = true
  }
  const onDoubleClick = () => {
    editing.current = true
  }
  const goToAmount = (row: number) => afterChange({ row, column: 'amount' })
  return { onKeyDown, onFocus, onInput, onDoubleClick, goToAmount, removeLine }
}

function putCaret(target: HTMLElement) {
  if (target instanceof HTMLInputElement) target.setSelectionRange(target.value.length, target.value.length)
}
