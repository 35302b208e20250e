import type { SheetCell, SheetField, SheetSection } from './types.ts'

/* Small makers, so that the builders read as the sheet does. */

export const field = (label: string, value: string | null): SheetField => ({ label, value })
export const cell = (text: string, small?: string): SheetCell => (small ? { text, small } : { text })
export const blankCell: SheetCell = { text: '' }

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
