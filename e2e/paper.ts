import { execFileSync } from 'node:child_process'
import { mkdtempSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { Page } from '@playwright/test'
import { getDocumentProxy } from 'unpdf'
import type { DocumentId, SheetDocument, SheetSection } from '../src/worksheet/types.ts'

/* Reads a printed page back, and asks the model what it must say. */

export interface Expected {
  readonly documents: readonly SheetDocument[]
  readonly answer: {
    readonly solution: Readonly<Record<string, number | null>>
    readonly lines: readonly Readonly<Record<string, number | string | null>>[]
  }
}

/** A piece of text on paper; in points from the lower left corner. */
export interface Piece {
  readonly text: string
  readonly left: number
  readonly right: number
  readonly bottom: number
  readonly size: number
}

export interface PaperPage {
  readonly width: number
  readonly height: number
  readonly pieces: readonly Piece[]
  readonly text: string
}

export const squeezed = (text: string) => text.replaceAll(/\s+/g, '')

interface TextItem {
  readonly str: string
  readonly width: number
  readonly transform: readonly number[]
}

export async function readPaper(bytes: Uint8Array): Promise<readonly PaperPage[]> {
  const pdf = await getDocumentProxy(bytes)
  const pages: PaperPage[] = []
  for (let number = 1; number <= pdf.numPages; number += 1) {
    const page = await pdf.getPage(number)
    const { items } = (await page.getTextContent()) as unknown as { items: readonly TextItem[] }
    const { width, height } = page.getViewport({ scale: 1 })
    const pieces = items
      .filter(({ str }) => str.trim() !== '')
      .map(({ str, width: wide, transform: [, , , size = 0, left = 0, bottom = 0] }) => ({
        text: str,
        left,
        right: left + wide,
        bottom,
        size: Math.abs(size),
      }))
    pages.push({ width, height, pieces, text: pieces.map(({ text }) => text).join(' ') })
  }
  return pages
}

export const printed = async (page: Page) =>
  readPaper(new Uint8Array(await page.pdf({ preferCSSPageSize: true })))

/** What the documents of the formula that is now on the page must say. */
export async function expectedOf(page: Page, documents: readonly DocumentId[] = []): Promise<Expected> {
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Save as file' }).click(),
  ])
  const file = join(mkdtempSync(join(tmpdir(), 'evenwater-')), 'formula.json')
  await download.saveAs(file)
  const output = execFileSync(
    process.execPath,
    ['--import', 'tsx', 'e2e/expected-sheet.ts', file, ...documents],
    { encoding: 'utf8', maxBuffer: 1 << 26 },
  )
  return JSON.parse(output) as Expected
}

/* A figure with its thousands marked, wherever it stands in a text. */
export const figuresIn = (text: string): ReadonlySet<string> =>
  new Set(text.match(/\d[\d,]*(?:\.\d+)?/g)?.map((token) => token.replace(/,$/, '')) ?? [])

const notShown = new Set(['kind', 'id', 'align', 'room', 'code', 'severity'])

/** Every string that the documents show. */
export function stringsOf(value: unknown): readonly string[] {
  if (typeof value === 'string') return [value]
  if (typeof value !== 'object' || value === null) return []
  return Object.entries(value).flatMap(([key, part]) => (notShown.has(key) ? [] : stringsOf(part)))
}

/** What must not be torn apart by the end of a page: a row, a field, a step, a caution. */
export function wholesOf(section: SheetSection): readonly (readonly string[])[] {
  switch (section.kind) {
    case 'table':
      return section.rows.map((row) => row.flatMap(({ text, small }) => [text, small ?? '']))
    case 'fields':
      return section.fields.map(({ label, value, limit }) => [label, value ?? '', limit ?? ''])
    case 'steps':
      return section.steps.map(({ text, reason }) => [text, reason])
    case 'cautions':
      return section.cautions.map(({ text, wayOut, source }) => [text, wayOut, source])
    case 'label':
      return [[section.name, ...section.lines]]
    default:
      return []
  }
}

/** Keeps a copy of the paper to be looked at, where a folder for it is named. */
export async function keepPaper(page: Page, name: string): Promise<void> {
  const folder = process.env['PAPER_FOLDER']
  if (folder) writeFileSync(join(folder, `${name}.pdf`), await page.pdf({ preferCSSPageSize: true }))
}
