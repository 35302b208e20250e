import type { KeyboardEvent } from 'react'

export type Column = 'ingredient' | 'amount' | 'remove'

/** What a key asks of the table. */
export type GridWish =
  | { readonly kind: 'go'; readonly row: number; readonly column: Column }
  | { readonly kind: 'move-line'; readonly by: 1 | -1 }
  | { readonly kind: 'delete-line' }
  | { readonly kind: 'edit-text' }
  | { readonly kind: 'restore' }

interface Place {
  readonly row: number
  readonly column: Column
  /** Last row that can be gone to; the row for adding. */
  readonly lastRow: number
  /** True while the caret is at work inside the text. */
  readonly editing: boolean
}

type Key = Pick<KeyboardEvent, 'key' | 'altKey' | 'ctrlKey' | 'metaKey' | 'shiftKey'>

const columns: readonly Column[] = ['ingredient', 'amount', 'remove']

function sideways({ row, column, lastRow }: Place, by: 1 | -1): GridWish | null {
  const next = columns[columns.indexOf(column) + by]
  return next && row < lastRow ? { kind: 'go', row, column: next } : null
}

function vertical({ row, column, lastRow }: Place, by: 1 | -1): GridWish | null {
  const next = row + by
  if (next < 0 || next > lastRow) return null
  return { kind: 'go', row: next, column: next === lastRow ? 'ingredient' : column }
}

/** Reads one key in a cell; null leaves it to the browser. */
export function wishOf(key: Key, place: Place): GridWish | null {
  const command = key.ctrlKey || key.metaKey
  const inLine = place.row < place.lastRow
  if (key.altKey && !command && inLine) {
    if (key.key === 'ArrowUp') return { kind: 'move-line', by: -1 }
    if (key.key === 'ArrowDown') return { kind: 'move-line', by: 1 }
  }
  if (command && key.key === 'Delete' && inLine) return { kind: 'delete-line' }
  if (command || key.altKey) return null
  switch (key.key) {
    case 'Enter':
      return place.column === 'remove' ? null : vertical(place, key.shiftKey ? -1 : 1)
    case 'ArrowDown':
      return vertical(place, 1)
    case 'ArrowUp':
      return vertical(place, -1)
    case 'ArrowLeft':
      return place.editing ? null : sideways(place, -1)
    case 'ArrowRight':
      return place.editing ? null : sideways(place, 1)
    case 'F2':
      return { kind: 'edit-text' }
    case 'Escape':
      return { kind: 'restore' }
    default:
      return null
  }
}
