/** One line of a pasted table: what stood in it, nothing guessed. */
export interface PastedLine {
  readonly name: string
  readonly amount: string
}

const mostRows = 1000
const longestCell = 10_000

/** True where a paste should become lines of the table and not text of one cell. */
export const isTable = (text: string) => /\t|\r|\n/.test(text.trim())

/**
 * Reads rows that were copied from a spreadsheet: name, then amount, parted by tabs. A heading row is known
 * by its words. Further columns are joined to the amount, so that "1" and "%" in two columns are "1 %".
 */
export function readPastedLines(text: string): readonly PastedLine[] {
  const rows = text
    .replace(/\r\n?/g, '\n')
    .split('\n')
    .map((row) => row.split('\t').map((cell) => cell.trim().slice(0, longestCell)))
    .filter((cells) => cells.some((cell) => cell !== ''))
  const first = rows[0]
  const body = first && isHeading(first) ? rows.slice(1) : rows
  return body.slice(0, mostRows).map(([name = '', ...rest]) => ({
    name,
    amount: rest.filter((cell) => cell !== '').join(' '),
  }))
}

const headings = /^(ingredients?|names?|substances?|components?|drugs?|solutes?)$/i

const isHeading = (cells: readonly string[]) => headings.test(cells[0] ?? '')
