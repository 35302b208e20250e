import { describe, expect, it } from 'vitest'
import { wishOf, type Column } from '../../../src/app/ingredients/gridKeys.ts'

const key = (
  name: string,
  more: Partial<Record<'altKey' | 'ctrlKey' | 'metaKey' | 'shiftKey', boolean>> = {},
) => ({
  key: name,
  altKey: false,
  ctrlKey: false,
  metaKey: false,
  shiftKey: false,
  ...more,
})
const at = (row: number, column: Column, editing = false) => ({ row, column, lastRow: 3, editing })

describe('keys in the table', () => {
  it('Enter goes to the next line in the same column, Shift+Enter back', () => {
    expect(wishOf(key('Enter'), at(0, 'amount'))).toEqual({ kind: 'go', row: 1, column: 'amount' })
    expect(wishOf(key('Enter', { shiftKey: true }), at(1, 'amount'))).toEqual({
      kind: 'go',
      row: 0,
      column: 'amount',
    })
  })

  it('below the last line is the row for adding', () => {
    expect(wishOf(key('Enter'), at(2, 'amount'))).toEqual({ kind: 'go', row: 3, column: 'ingredient' })
    expect(wishOf(key('ArrowDown'), at(3, 'ingredient'))).toBeNull()
    expect(wishOf(key('ArrowUp'), at(0, 'amount'))).toBeNull()
  })

  it('arrows go sideways between cells, but not while the caret is at work in the text', () => {
    expect(wishOf(key('ArrowRight'), at(1, 'ingredient'))).toEqual({ kind: 'go', row: 1, column: 'amount' })
    expect(wishOf(key('ArrowLeft'), at(1, 'amount'))).toEqual({ kind: 'go', row: 1, column: 'ingredient' })
    expect(wishOf(key('ArrowLeft'), at(1, 'amount', true))).toBeNull()
  })

  it('Alt with an arrow moves the line, Ctrl+Delete removes it, and neither touches the row for adding', () => {
    expect(wishOf(key('ArrowUp', { altKey: true }), at(1, 'amount'))).toEqual({ kind: 'move-line', by: -1 })
    expect(wishOf(key('Delete', { ctrlKey: true }), at(1, 'amount'))).toEqual({ kind: 'delete-line' })
    expect(wishOf(key('Delete', { metaKey: true }), at(1, 'amount'))).toEqual({ kind: 'delete-line' })
    expect(wishOf(key('ArrowUp', { altKey: true }), at(3, 'ingredient'))).toBeNull()
    expect(wishOf(key('Delete', { ctrlKey: true }), at(3, 'ingredient'))).toBeNull()
  })

  it('leaves typing, Tab and a bare Delete to the browser', () => {
    for (const name of ['a', 'Tab', 'Delete', 'Backspace', 'Home']) {
      expect(wishOf(key(name), at(1, 'amount')), name).toBeNull()
    }
  })
})
