import { isQuantitySufficient } from '../../quantity/readAmount.ts'
import { cellsOf, longestPaste, type Separator } from './pastedCells.ts'
import { headingOf, type Heading } from './pastedHeadings.ts'

/** One line of a pasted table: what stood in it, nothing guessed. */
export interface PastedLine {
  readonly name: string
  readonly amount: string
}

export interface PastedTable {
  readonly lines: readonly PastedLine[]
  /** What of the table makes no lines, in words. */
  readonly leftOut: readonly string[]
}

const mostRows = 1000
const rowsBeforeHeadings = 5

/** True where a paste should become lines of the table and not text of one cell. */
export const isTable = (text: string) => /\t|\r|\n/.test(text.trim())

/**
 * Reads rows that were copied from a spreadsheet. Where they have headings of their own, these say which column
 * is the name, the amount, the unit, in any order; without headings the first column is the name and what
 * follows is the amount, so that "1" and "%" in two columns are "1 %". What contradicts itself is kept as it
 * stood, in a form that no reading of amounts takes.
 */
export function readPastedTable(text: string): PastedTable {
  const part = text.slice(0, longestPaste)
  const tooLong = part.length < text.length ? ['what came after a million characters'] : []
  for (const separator of separatorsOf(part)) {
    const rows = cellsOf(part, separator)
    const headed = withHeadings(rows)
    if (headed) return { ...headed, leftOut: [...tooLong, ...headed.leftOut] }
  }
  const rows = cellsOf(part, '\t')
  const body = headingOf(rows[0]?.[0] ?? '').kind === 'name' ? rows.slice(1) : rows
  return { lines: body.slice(0, mostRows).map(plainLine), leftOut: tooLong }
}

const separatorsOf = (text: string): readonly Separator[] => (text.includes('\t') ? ['\t'] : [';', ','])

const plainLine = ([name = '', ...rest]: readonly string[]): PastedLine => ({
  name,
  amount: rest.filter((cell) => cell !== '').join(' '),
})

interface AmountColumn {
  readonly at: number
  readonly unit: string
  readonly per: string
  readonly unitAt: number | null
}

function withHeadings(rows: readonly (readonly string[])[]): PastedTable | null {
  const first = rows.slice(0, rowsBeforeHeadings).findIndex((cells) => isHeadingRow(cells.map(headingOf)))
  const titles = rows[first]
  if (!titles) return null
  const headings = titles.map(headingOf)
  const nameAt = headings.findIndex(({ kind }) => kind === 'name')
  const amounts = amountColumns(headings)
  const used = new Set([
    nameAt,
    ...amounts.flatMap(({ at, unitAt }) => (unitAt === null ? [at] : [at, unitAt])),
  ])
  const columnsLeft = titles.flatMap((title, at) =>
    used.has(at) || title === '' ? [] : [`the column “${title}”`],
  )
  const rowsLeft = rows.slice(0, first).map((cells) => `the row “${cells.filter(Boolean).join(' ')}”`)
  return {
    lines: rows.slice(first + 1, first + 1 + mostRows).map((cells) => ({
      name: cells[nameAt] ?? '',
      amount: [...new Set(amounts.map((column) => amountIn(cells, column)).filter(Boolean))].join(' | '),
    })),
    leftOut: [...rowsLeft, ...columnsLeft],
  }
}

const isHeadingRow = (headings: readonly Heading[]) =>
  headings.some(({ kind }) => kind === 'name') && headings.some(({ kind }) => kind === 'amount')

/** Each column of units belongs to the amounts before it, or else to those after it. */
function amountColumns(headings: readonly Heading[]): readonly AmountColumn[] {
  const amountPlaces = headings.flatMap(({ kind }, at) => (kind === 'amount' ? [at] : []))
  const owners = new Map<number, number>()
  headings.forEach(({ kind }, at) => {
    if (kind !== 'unit') return
    const owner = amountPlaces.findLast((place) => place < at) ?? amountPlaces.find((place) => place > at)
    if (owner !== undefined && !owners.has(owner)) owners.set(owner, at)
  })
  return headings.flatMap((heading, at) =>
    heading.kind === 'amount'
      ? [{ at, unit: heading.unit, per: heading.per, unitAt: owners.get(at) ?? null }]
      : [],
  )
}

/** Digits, marks and signs of reckoning: an amount that lacks nothing but its unit. */
const bare = /^[\d.,\s+*×xX]+$/
const leadingNumber = /^[\d.,\s+*×xX]*/

function amountIn(cells: readonly string[], { at, unit, per, unitAt }: AmountColumn): string {
  const cell = cells[at] ?? ''
  if (cell === '' || isQuantitySufficient(cell)) return cell
  const ownUnit = unitAt === null ? '' : (cells[unitAt] ?? '')
  const withUnits = [ownUnit, unit].reduce(
    (amount, told) => (told === '' ? amount : withUnit(amount, told)),
    cell,
  )
  return per === '' ? withUnits : `${withUnits} ${per}`
}

/** A unit that stands there already is not said twice; one that contradicts it is put behind, to be judged. */
function withUnit(amount: string, unit: string): string {
  if (bare.test(amount)) return `${amount} ${unit}`
  const told = amount.replace(leadingNumber, '')
  if (told === unit) return amount
  if (told === '%' && unit.startsWith('%')) return `${amount.slice(0, -1).trim()} ${unit}`
  return `${amount} [column: ${unit}]`
}
