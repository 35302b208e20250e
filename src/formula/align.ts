import type { Formula, FormulaLine } from './types.ts'

/** Lines of several formulas that hold the same ingredient; null where a formula has none. */
export interface AlignedLine {
  readonly ingredient: FormulaLine['ingredient']
  readonly lines: readonly (FormulaLine | null)[]
}

interface Row {
  readonly identity: string
  readonly lines: (FormulaLine | null)[]
}

/** The same for the same library id, or for records of their own that say the same. */
const identityOf = ({ ingredient }: FormulaLine) =>
  typeof ingredient === 'string' ? ingredient : JSON.stringify(ingredient)

/**
 * Puts the lines of formulas beside each other by ingredient, in the order of the first formula; what only a later
 * one has stands after the line that it follows there, or at the end when they have nothing in common. An
 * ingredient that has several lines is matched by the keys of the lines first, then in their order.
 */
export function alignLines(formulas: readonly Formula[]): readonly AlignedLine[] {
  const rows: Row[] = []
  formulas.forEach((formula, column) => placeColumn(rows, formula, column, formulas.length))
  return rows.flatMap(({ lines }) => {
    const some = lines.find((line) => line !== null)
    return some ? [{ ingredient: some.ingredient, lines }] : []
  })
}

function placeColumn(rows: Row[], { lines }: Formula, column: number, columns: number): void {
  const placed = new Map<FormulaLine, Row>()
  const place = (row: Row, line: FormulaLine) => {
    row.lines[column] = line
    placed.set(line, row)
  }
  const free = (line: FormulaLine, also: (row: Row) => boolean) =>
    rows.find((row) => row.lines[column] === null && row.identity === identityOf(line) && also(row))
  for (const line of lines) {
    const row = free(line, (candidate) => candidate.lines.some((other) => other?.key === line.key))
    if (row) place(row, line)
  }
  for (const line of lines.filter((other) => !placed.has(other))) {
    const row = free(line, () => true)
    if (row) place(row, line)
  }
  const first = lines.find((line) => placed.has(line))
  const firstRow = first && placed.get(first)
  let after = firstRow ? rows.indexOf(firstRow) - 1 : rows.length - 1
  for (const line of lines) {
    const row = placed.get(line)
    if (row) {
      after = rows.indexOf(row)
      continue
    }
    const added: Row = { identity: identityOf(line), lines: Array.from({ length: columns }, () => null) }
    place(added, line)
    after += 1
    rows.splice(after, 0, added)
  }
}
