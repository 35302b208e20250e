export const longestPaste = 1_000_000
const longestCell = 10_000

export type Separator = '\t' | ';' | ','

const quotedCells: Readonly<Record<Separator, RegExp>> = {
  '\t': /"((?:[^"]|"")*)"(?=\t|\n|$)/y,
  ';': /"((?:[^"]|"")*)"(?=;|\n|$)/y,
  ',': /"((?:[^"]|"")*)"(?=,|\n|$)/y,
}

const tidied = (cell: string) => cell.replace(/\s+/g, ' ').trim().slice(0, longestCell)

/** Rows of cells as a spreadsheet copies them: a cell with a break or a separator in it stands in quotes. */
export function cellsOf(text: string, separator: Separator): readonly (readonly string[])[] {
  const all = text.replace(/\r\n?/g, '\n')
  const plain = separator === '\t' ? /[^\t\n]*/y : separator === ';' ? /[^;\n]*/y : /[^,\n]*/y
  const quoted = quotedCells[separator]
  const rows: string[][] = [[]]
  let at = 0
  while (at <= all.length) {
    quoted.lastIndex = at
    const inQuotes = all[at] === '"' ? quoted.exec(all) : null
    plain.lastIndex = at
    const match = inQuotes ?? plain.exec(all)
    rows.at(-1)?.push(tidied(inQuotes ? (inQuotes[1] ?? '').replaceAll('""', '"') : (match?.[0] ?? '')))
    at += match?.[0].length ?? 0
    if (all[at] === '\n') rows.push([])
    at += 1
  }
  return rows.filter((cells) => cells.some((cell) => cell !== ''))
}
