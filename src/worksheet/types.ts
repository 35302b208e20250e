import type { Severity } from '../evaluation/types.ts'

export type Paper = 'A4' | 'Letter'

/** What can be printed of one evaluation. */
export const documentIds = ['batch', 'checker', 'master', 'label', 'figures'] as const
export type DocumentId = (typeof documentIds)[number]

/** A printed field; null is a blank to be filled in by hand. */
export interface SheetField {
  readonly label: string
  readonly value: string | null
  /** Stands beside a blank: what the entry is held against. */
  readonly limit?: string
  /** Takes the whole width. */
  readonly wide?: boolean
}

export interface SheetColumn {
  readonly label: string
  readonly align: 'start' | 'end'
  /** A box to write in. */
  readonly blank?: boolean
  /** Names in bold. */
  readonly strong?: boolean
  /** How much room it asks for beyond its own words. */
  readonly room?: 'some' | 'much'
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

export interface SheetTable {
  readonly kind: 'table'
  readonly heading: string
  readonly columns: readonly SheetColumn[]
  readonly rows: readonly (readonly SheetCell[])[]
  readonly note?: string
}

export type SheetSection =
  | { readonly kind: 'fields'; readonly heading: string; readonly fields: readonly SheetField[] }
  | SheetTable
  | {
      readonly kind: 'steps'
      readonly heading: string
      readonly steps: readonly SheetStep[]
      /** A tick box and a place for time and initials beside each. */
      readonly ticked: boolean
    }
  | { readonly kind: 'cautions'; readonly heading: string; readonly cautions: readonly SheetCaution[] }
  | { readonly kind: 'arithmetic'; readonly heading: string; readonly lines: readonly string[] }
  | { readonly kind: 'text'; readonly heading: string; readonly paragraphs: readonly string[] }
  | {
      readonly kind: 'label'
      readonly heading: string
      readonly name: string
      readonly lines: readonly string[]
    }

/** One of the documents: every string that preview and paper show, made once. */
export interface SheetDocument {
  readonly id: DocumentId
  readonly name: string
  /** What it is for, beside the title. */
  readonly purpose: string
  /** What each page carries at its foot. */
  readonly pageMark: string
  readonly sections: readonly SheetSection[]
}

/** What is printed of one evaluation. */
export interface Worksheet {
  readonly title: string
  readonly paper: Paper
  /** Why it may not be printed; empty when it may. */
  readonly shutBecause: readonly string[]
  readonly documents: readonly SheetDocument[]
}
