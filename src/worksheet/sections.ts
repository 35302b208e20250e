import type { SheetCell, SheetColumn, SheetField, SheetSection } from './types.ts'

/* Small makers, so that the builders read as the sheet does. */

export const field = (label: string, value: string | null): SheetField => ({ label, value })
export const wide = (label: string, value: string | null): SheetField => ({ label, value, wide: true })
/** A blank with what its entry is held against. */
export const blankWith = (label: string, limit: string): SheetField => ({ label, value: null, limit })
export const cell = (text: string, small?: string): SheetCell => (small ? { text, small } : { text })
export const blankCell: SheetCell = { text: '' }
export const blankCells = (count: number): readonly SheetCell[] =>
  Array.from({ length: count }, () => blankCell)

export const words = (label: string): SheetColumn => ({ label, align: 'start' })
export const figures = (label: string, room?: SheetColumn['room']): SheetColumn => ({
  label,
  align: 'end',
  ...(room ? { room } : {}),
})
export const names = (label: string): SheetColumn => ({ label, align: 'start', strong: true })
export const box = (label: string, room?: SheetColumn['room']): SheetColumn => ({
  label,
  align: 'start',
  blank: true,
  ...(room ? { room } : {}),
})

export const fields = (heading: string, list: readonly SheetField[]): SheetSection => ({
  kind: 'fields',
  heading,
  fields: list,
})

export const text = (heading: string, paragraphs: readonly string[]): SheetSection => ({
  kind: 'text',
  heading,
  paragraphs,
})

/** Those that are there. */
export const present = <T>(...list: readonly (T | null)[]): readonly T[] =>
  list.filter((item) => item !== null)
