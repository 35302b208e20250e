import type { Severity } from '../evaluation/types.ts'

export type Paper = 'A4' | 'Letter'

/** A printed field; null is a blank to be filled in by hand. */
export interface SheetField {
  readonly label: string
  readonly value: string | null
}

export interface SheetColumn {
  readonly label: string
  readonly align: 'start' | 'end'
  /** A box to write in. */
  readonly blank?: boolean
}

/** One cell: its text and, in smaller print, what explains it. */
export interface SheetCell {
  readonly text: string
  readonly small?: string
}

export interface SheetCaution {
  readonly severity: Severity
  readonly code: string
  readonly text: string
  readonly wayOut: string
  readonly source: string
  /** The written reason with which a stop was accepted. */
  readonly acceptedBecause: string | null
}

export interface SheetStep {
  readonly text: string
  readonly reason: string
}

export type SheetSection =
  | { readonly kind: 'fields'; readonly heading: string; readonly fields: readonly SheetField[] }
  | {
      readonly kind: 'table'
      readonly heading: string
      readonly columns: readonly SheetColumn[]
      readonly rows: readonly (readonly SheetCell[])[]
      readonly note?: string
    }
  | { readonly kind: 'steps'; readonly heading: string; readonly steps: readonly SheetStep[] }
  | { readonly kind: 'cautions'; readonly heading: string; readonly cautions: readonly SheetCaution[] }
  | { readonly kind: 'arithmetic'; readonly heading: string; readonly lines: readonly string[] }
  | { readonly kind: 'text'; readonly heading: string; readonly paragraphs: readonly string[] }

/** The finished sheet: every string that preview and paper show, made once. */
export interface Worksheet {
  readonly title: string
  /** What each page carries at its foot. */
  readonly pageMark: string
  readonly paper: Paper
  /** Why it may not be printed; empty when it may. */
  readonly shutBecause: readonly string[]
  readonly sections: readonly SheetSection[]
}
